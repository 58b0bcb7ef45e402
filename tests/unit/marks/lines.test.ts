import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { HIT_PX, markAt } from '@/components/marks/model/hit-test';
import { changeKind, MARK_KINDS, moveMark, newMark, photoPoint } from '@/components/marks/model/mark';
import { markText } from '@/components/marks/model/mark-text';
import { distanceToChord, simplify } from '@/components/marks/model/simplify';
import { isTap, lineOf } from '@/components/marks/model/stroke';
import { KEY_AGAIN_PX, TAP_AGAIN_PX, tapAt } from '@/components/marks/model/taps';
import { POINTS_MAX } from '@/components/marks/mark-limits-schema';
import { anyMark, anyMarks, anyPoint } from '../../support/draw-marks';

const SIZE = { width: 300, height: 450 };
const anyPixels = fc.array(
  fc.record({
    x: fc.double({ min: 0, max: 300, noNaN: true }),
    y: fc.double({ min: 0, max: 450, noNaN: true }),
  }),
  { minLength: 2, maxLength: 300 },
);

describe('a drawn line', () => {
  it('keeps its ends, and every point left out lies within the tolerance of what stays', () => {
    fc.assert(
      fc.property(anyPixels, fc.double({ min: 0.5, max: 20, noNaN: true }), (pixels, tolerance) => {
        const kept = simplify(pixels, tolerance);
        expect([kept[0], kept.at(-1)]).toEqual([pixels[0], pixels.at(-1)]);
        for (const point of pixels) {
          const chords = kept.slice(1).map((end, i) => distanceToChord(point, kept[i]!, end));
          expect(Math.min(...chords)).toBeLessThanOrEqual(tolerance + 1e-9);
        }
      }),
    );
  });

  it('of any length has at most 400 points, all on the photo', () => {
    const zigzag = Array.from({ length: 5000 }, (_, i) => ({ x: (i % 2) * 300, y: (i / 5000) * 450 }));
    const started = performance.now();
    expect(lineOf(zigzag, SIZE).length).toBeLessThanOrEqual(POINTS_MAX);
    expect(performance.now() - started).toBeLessThan(2000);
    fc.assert(
      fc.property(anyPixels, (pixels) => {
        for (const { x, y } of lineOf(pixels, SIZE))
          expect(Math.min(x, y, 1 - x, 1 - y)).toBeGreaterThanOrEqual(0);
      }),
    );
  });

  it('that never leaves eight pixels is a tap', () => {
    expect(isTap([{ x: 10, y: 10 }, { x: 17, y: 10 }])).toBe(true); // prettier-ignore
    expect(isTap([{ x: 10, y: 10 }, { x: 19, y: 10 }])).toBe(false); // prettier-ignore
  });
});

describe('a line set by taps', () => {
  const at = (x: number, y: number) => photoPoint(x / SIZE.width, y / SIZE.height);

  it('ends where the last point is set again: near it for a finger, on it for keys', () => {
    const points = [at(10, 10), at(100, 100)];
    expect(tapAt(points, at(110, 100), 'tight', SIZE, TAP_AGAIN_PX)).toEqual({ points, isDone: true });
    expect(tapAt(points, at(110, 100), 'tight', SIZE, KEY_AGAIN_PX).points).toHaveLength(3);
  });

  it('of one point is whole for a pin, of two for a level, and not for a fold', () => {
    expect(tapAt([], at(1, 1), 'pin', SIZE, TAP_AGAIN_PX).isDone).toBe(true);
    expect(tapAt([at(1, 1)], at(90, 90), 'tilt', SIZE, TAP_AGAIN_PX).isDone).toBe(true);
    expect(tapAt([at(1, 1)], at(90, 90), 'slack', SIZE, TAP_AGAIN_PX).isDone).toBe(false);
  });
});

describe('a mark', () => {
  it('moves whole and stays on the photo', () => {
    fc.assert(
      fc.property(anyMark, fc.double({ min: -2, max: 2, noNaN: true }), fc.double({ min: -2, max: 2, noNaN: true }), (mark, dx, dy) => {
        const moved = moveMark(mark, dx, dy);
        const spans = (points: typeof mark.points) => points.map(({ x }) => x - points[0]!.x);
        spans(moved.points).forEach((span, i) => expect(span).toBeCloseTo(spans(mark.points)[i]!, 5));
        for (const { x, y } of moved.points) expect(Math.min(x, y, 1 - x, 1 - y)).toBeGreaterThanOrEqual(0);
      }), // prettier-ignore
    );
  });

  it('of any kind can be called any other and is still a mark of it', () => {
    fc.assert(
      fc.property(anyMark, fc.constantFrom(...MARK_KINDS), (mark, kind) => {
        const now = changeKind(mark, kind);
        expect(now.kind).toBe(kind);
        expect(kind === 'pin' ? now.points.length === 1 : now.points.length >= 2).toBe(true);
      }),
    );
  });

  it('is meant by a touch on it; the nearest wins, and far away nothing is', () => {
    fc.assert(
      fc.property(anyMarks, anyPoint, (marks, point) => {
        const found = markAt(marks, point, SIZE);
        const onIt = marks.filter((mark) => markAt([mark], point, SIZE) !== null);
        expect(found === null).toBe(onIt.length === 0);
        for (const mark of marks) expect(markAt([mark], mark.points[0]!, SIZE)).toBe(mark);
      }),
    );
    const mark = newMark('a', 'tight', 2, [photoPoint(0, 0), photoPoint(1, 0)]);
    expect(markAt([mark], photoPoint(0.5, (HIT_PX + 1) / SIZE.height), SIZE)).toBeNull();
  });

  it('reads as a sentence for ears, search and print', () => {
    const mark = {
      ...newMark('a', 'tight', 2, [photoPoint(0.5, 0.5), photoPoint(0.1, 0.1)]),
      side: 'left' as const,
    };
    expect(markText(mark)).toBe(
      'Tight line, clear, your left, from the middle to the upper left of the photo',
    );
    expect(markText(newMark('b', 'pin', 1, [photoPoint(0.9, 0.9)]))).toContain(
      'at the lower right of the photo',
    );
  });
});
