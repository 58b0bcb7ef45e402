import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  markPaths,
  offsetPolyline,
  type MarkKind,
  type MarkStrength,
} from '@/components/marks-shapes/mark-paths';

const KINDS: MarkKind[] = ['tight', 'slack', 'gap', 'pooling', 'tilt', 'pin'];
const STRENGTHS: MarkStrength[] = ['faint', 'clear', 'pulling'];
const LINE = [
  { x: 10, y: 50 },
  { x: 60, y: 50 },
  { x: 110, y: 50 },
];
const shapeOf = (kind: MarkKind, strength: MarkStrength) => JSON.stringify(markPaths(kind, LINE, strength));

describe('the shapes of marks', () => {
  it('differ by kind without colour, and by strength within a kind', () => {
    const shapes = KINDS.flatMap((kind) => STRENGTHS.map((strength) => shapeOf(kind, strength)));
    expect(new Set(shapes).size).toBe(KINDS.length * STRENGTHS.length);
  });

  it('make only a slack fold dashed and double', () => {
    for (const kind of KINDS) {
      const dashed = markPaths(kind, LINE, 'clear').filter(({ dash }) => dash !== null).length;
      expect(dashed).toBe(kind === 'slack' ? 2 : 0);
    }
  });

  it('give a tight line its drawn course and a tick across each end, two when pulling', () => {
    const [course, first, last] = markPaths('tight', LINE, 'clear');
    expect(course!.d).toBe('M10 50L60 50L110 50');
    expect(first!.d).toBe('M10 42.5L10 57.5');
    expect(last!.d).toBe('M110 42.5L110 57.5');
    expect(markPaths('tight', LINE, 'pulling')).toHaveLength(5);
  });

  it('open the bracket of a gap on one side only', () => {
    expect(markPaths('gap', LINE, 'clear')[0]!.d).toBe('M10 61.2L10 50L60 50L110 50L110 61.2');
  });

  it('let the bubble of a tilt rise to the higher end', () => {
    const bubbleX = (leftY: number, rightY: number) => {
      const paths = markPaths('tilt', [{ x: 0, y: leftY }, { x: 100, y: rightY }], 'clear'); // prettier-ignore
      return Number(/M(-?[\d.]+)/.exec(paths.find(({ isFilled }) => isFilled)!.d)![1]);
    };
    const level = bubbleX(50, 50);
    expect(bubbleX(60, 40)).toBeGreaterThan(level + 5);
    expect(bubbleX(40, 60)).toBeLessThan(level - 5);
  });

  it('move a line sideways by exactly the distance asked', () => {
    const place = fc.record({ x: fc.integer({ min: 0, max: 999 }), y: fc.integer({ min: 0, max: 999 }) });
    fc.assert(
      fc.property(place, place, fc.double({ min: -20, max: 20, noNaN: true }), (a, b, by) => {
        fc.pre(a.x !== b.x || a.y !== b.y);
        const [moved] = offsetPolyline([a, b], by);
        expect(Math.hypot(moved!.x - a.x, moved!.y - a.y)).toBeCloseTo(Math.abs(by), 9);
        const length = Math.hypot(b.x - a.x, b.y - a.y);
        const sideways = ((b.x - a.x) * (moved!.y - a.y) - (b.y - a.y) * (moved!.x - a.x)) / length;
        expect(sideways).toBeCloseTo(by, 6);
      }),
    );
  });

  it('draw nothing for a single point, and only numbers for any stroke', () => {
    const place = fc.record({ x: fc.double({ min: -5, max: 2000, noNaN: true }), y: fc.double({ min: -5, max: 2000, noNaN: true }) }); // prettier-ignore
    fc.assert(
      fc.property(fc.array(place, { minLength: 2, maxLength: 8 }), (points) => {
        for (const kind of KINDS) {
          expect(markPaths(kind, points.slice(0, 1), 'clear')).toEqual([]);
          for (const { d } of markPaths(kind, points, 'clear')) expect(d).not.toMatch(/NaN|Infinity|e-/);
        }
      }),
    );
  });
});
