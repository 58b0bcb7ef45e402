import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { curveReader, curveSegments, pointOnCubic } from '@/diagnosis/figure/curve';
import {
  figureGarment,
  figureZones,
  garmentPolygon,
  landmarks,
  type FigureView,
} from '@/diagnosis/figure/figure';
import { mirrorPoint, type FigurePoint } from '@/diagnosis/figure/point';
import { crossesItself, polygonArea, polygonHolds } from '@/diagnosis/figure/polygon';
import { mirrorProportions } from '@/diagnosis/figure/proportions';
import { sideSeamCurve } from '@/diagnosis/figure/standing';
import { buildZones } from '@/diagnosis/figure/mesh';
import { anyProportions } from './arbitrary';

const VIEWS: FigureView[] = ['front', 'back', 'left', 'right', 'seated'];
const RUNS = { numRuns: 1000, seed: 20 };
const TIMEOUT_MS = 60_000;

function boxOf(polygon: readonly FigurePoint[]) {
  const [xs, ys] = [polygon.map(({ x }) => x), polygon.map(({ y }) => y)];
  return { left: Math.min(...xs), right: Math.max(...xs), top: Math.min(...ys), bottom: Math.max(...ys) };
}

describe.each(VIEWS)('the zones of the %s view', (view) => {
  it(
    'tile the garment: their areas add up to its area, and a point of it lies in exactly one',
    () => {
      const share = fc.double({ min: 0, max: 1, noNaN: true });
      const shares = fc.array(fc.tuple(share, share), { minLength: 12, maxLength: 12 });
      fc.assert(
        fc.property(anyProportions, shares, (proportions, places) => {
          const { zones, outline: garment } = buildZones(figureGarment(view, proportions).sheets);
          const whole = polygonArea(garment);
          const sum = zones.reduce((total, { polygon }) => total + polygonArea(polygon), 0);
          expect(Math.abs(sum - whole) / whole).toBeLessThan(1e-6);
          const box = boxOf(garment);
          for (const [across, down] of places) {
            const point = {
              x: box.left + (box.right - box.left) * across,
              y: box.top + (box.bottom - box.top) * down,
            };
            const holders = zones.filter(({ polygon }) => polygonHolds(polygon, point)).length;
            if (holders !== (polygonHolds(garment, point) ? 1 : 0)) expect({ point, holders }).toBeNull();
          }
        }),
        RUNS,
      );
    },
    TIMEOUT_MS,
  );

  it(
    'have outlines that never cross themselves, nor does the garment',
    () => {
      fc.assert(
        fc.property(anyProportions, (proportions) => {
          expect(crossesItself(garmentPolygon(view, proportions))).toBe(false);
        }),
        RUNS,
      );
      fc.assert(
        fc.property(anyProportions, (proportions) => {
          for (const { polygon } of figureZones(view, proportions))
            expect(crossesItself(polygon)).toBe(false);
        }),
        { numRuns: 60, seed: 21 },
      );
    },
    TIMEOUT_MS,
  );

  it('come from a garment whose named edges run once round it without a gap', () => {
    fc.assert(
      fc.property(anyProportions, (proportions) => {
        const segments = figureGarment(view, proportions).edges.flatMap((edge) => edge.segments);
        segments.forEach((segment, index) => {
          const next = segments[(index + 1) % segments.length]!;
          expect(segment.to.x).toBeCloseTo(next.from.x, 12);
          expect(segment.to.y).toBeCloseTo(next.from.y, 12);
        });
        const fine = segments.flatMap((segment) =>
          Array.from({ length: 40 }, (_, step) => pointOnCubic(segment, step / 40)),
        );
        const drawn = polygonArea(fine);
        expect(Math.abs(drawn - polygonArea(garmentPolygon(view, proportions))) / drawn).toBeLessThan(2e-3);
      }),
      { numRuns: 200, seed: 22 },
    );
  });
});

describe('the figure', () => {
  it.each(['front', 'back'] as const)(
    'mirrors exactly from the %s when the higher hip changes side',
    (view) => {
      fc.assert(
        fc.property(anyProportions, (proportions) => {
          const own = figureZones(view, proportions);
          const other = figureZones(view, mirrorProportions(proportions));
          for (const { zone, side, polygon } of own) {
            const opposite = side === null ? null : side === 'left' ? 'right' : 'left';
            const twins = other.filter((twin) => twin.zone === zone && twin.side === opposite);
            const corners = new Set(
              twins.flatMap((twin) => twin.polygon.map((point) => `${point.x},${point.y}`)),
            );
            const lost = polygon.map(mirrorPoint).filter((point) => !corners.has(`${point.x},${point.y}`));
            expect(lost).toEqual([]);
          }
          const places = new Map(
            landmarks(view, mirrorProportions(proportions)).map(({ id, at }) => [id, at] as const),
          );
          for (const { name, side, at } of landmarks(view, proportions)) {
            const id = side === null ? name : `${name}-${side === 'left' ? 'right' : 'left'}`;
            expect(places.get(id)).toEqual(mirrorPoint(at));
          }
        }),
        RUNS,
      );
    },
    TIMEOUT_MS,
  );

  it.each(['front', 'back', 'left', 'right'] as const)(
    'keeps the landmarks of the %s view in order from waist to ankle, the left ones on the left',
    (view) => {
      const order = ['waist', 'high-hip', 'hip', 'thigh', 'calf', 'ankle'];
      fc.assert(
        fc.property(anyProportions, (proportions) => {
          const found = landmarks(view, proportions);
          for (const side of ['left', 'right', null]) {
            const heights = order.flatMap((name) =>
              found.filter((one) => one.name === name && one.side === side).map(({ at }) => at.y),
            );
            for (let i = 1; i < heights.length; i += 1) expect(heights[i]).toBeGreaterThan(heights[i - 1]!);
          }
          for (const { side, at } of found) {
            if (side === 'left') expect(at.x).toBeGreaterThan(0);
            if (side === 'right') expect(at.x).toBeLessThan(0);
          }
        }),
        RUNS,
      );
    },
  );

  it('puts the seat behind, the abdomen in front, and the knee of a seated figure ahead of the hip', () => {
    fc.assert(
      fc.property(anyProportions, (proportions) => {
        const at = (view: FigureView, name: string) =>
          landmarks(view, proportions).find((one) => one.name === name)!.at;
        for (const view of ['left', 'right', 'seated'] as const) {
          expect(at(view, 'abdomen').x).toBeGreaterThan(at(view, 'seat').x + 0.4);
          expect(at(view, 'waist-front').x).toBeGreaterThan(at(view, 'waist-back').x);
        }
        expect(at('seated', 'knee').x).toBeGreaterThan(at('seated', 'hip').x + 0.8);
        expect(at('seated', 'hem').y).toBeGreaterThan(at('seated', 'knee').y);
      }),
      RUNS,
    );
  });

  it('evaluates a curve where its Béziers run', () => {
    fc.assert(
      fc.property(anyProportions, fc.double({ min: 0, max: 1, noNaN: true }), (proportions, t) => {
        const curve = sideSeamCurve('left', proportions);
        curveSegments(curve).forEach((segment, index) => {
          const [from, to] = [curve.knots[index]!.v, curve.knots[index + 1]!.v];
          const [drawn, asked] = [pointOnCubic(segment, t), curveReader(curve)(from + (to - from) * t)];
          expect(asked.x).toBeCloseTo(drawn.x, 9);
          expect(asked.y).toBeCloseTo(drawn.y, 9);
        });
      }),
    );
  });
});
