import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { applyHomography, fitHomography, type CornerPair } from '@/diagnosis/photo/homography';
import { meetingPoint, type Line } from '@/diagnosis/photo/meeting-point';

type Place = [x: number, y: number];
const line = ([x, y]: Place, [dx, dy]: Place): Line => ({ at: { x, y }, along: { x: dx, y: dy } });
const corners = (from: Place[], to: Place[]) =>
  from.map(([x, y], i): CornerPair => ({ from: { x, y }, to: { x: to[i]![0], y: to[i]![1] } })) as [CornerPair, CornerPair, CornerPair, CornerPair]; // prettier-ignore

describe('the map of a flat sheet from its four corners', () => {
  // Constructed; computed with a well-known vision library (standards:P03).
  it('carries the unit square to a trapezium', () => {
    const h = fitHomography(corners([[0, 0], [1, 0], [1, 1], [0, 1]], [[0, 0], [4, 0], [3, 2], [1, 2]]))!; // prettier-ignore
    [4, 2, 0, 0, 4, 0, 0, 1, 1].forEach((value, i) => expect(h[i]).toBeCloseTo(value, 9));
    const centre = applyHomography(h, { x: 0.5, y: 0.5 })!;
    expect(centre.x).toBeCloseTo(2, 9);
    expect(centre.y).toBeCloseTo(4 / 3, 9);
  });

  // Constructed; two independent libraries agree to 1e-5 (standards:P04).
  const SHEET: Place[] = [[0, 0], [210, 0], [210, 297], [0, 297]]; // prettier-ignore
  const PIXELS: Place[] = [[100, 120], [520, 140], [500, 700], [90, 680]]; // prettier-ignore

  it('finds the centre of a tilted A4 sheet, and the millimetres under a pixel', () => {
    const onto = fitHomography(corners(SHEET, PIXELS))!;
    const centre = applyHomography(onto, { x: 105, y: 148.5 })!;
    expect(centre.x).toBeCloseTo(302.320584, 5);
    expect(centre.y).toBeCloseTo(413.364847, 5);
    const back = fitHomography(corners(PIXELS, SHEET))!;
    const mm = applyHomography(back, { x: 300, y: 400 })!;
    expect(mm.x).toBeCloseTo(103.646943, 4);
    expect(mm.y).toBeCloseTo(141.483187, 4);
  });

  it('puts the centre of the sheet where its diagonals cross, which needs no map', () => {
    const [a, b, c, d] = PIXELS as [Place, Place, Place, Place];
    const t = ((b[0] - a[0]) * (d[1] - b[1]) - (b[1] - a[1]) * (d[0] - b[0])) / ((c[0] - a[0]) * (d[1] - b[1]) - (c[1] - a[1]) * (d[0] - b[0])); // prettier-ignore
    const centre = applyHomography(fitHomography(corners(SHEET, PIXELS))!, { x: 105, y: 148.5 })!;
    expect(centre.x).toBeCloseTo(a[0] + t * (c[0] - a[0]), 9);
    expect(centre.y).toBeCloseTo(a[1] + t * (c[1] - a[1]), 9);
  });

  it('refuses corners that are on one line, or tapped crosswise', () => {
    expect(fitHomography(corners(SHEET, [[0, 0], [1, 1], [2, 2], [3, 3]]))).toBeNull(); // prettier-ignore
    expect(fitHomography(corners(SHEET, [[100, 120], [500, 700], [520, 140], [90, 680]]))).toBeNull(); // prettier-ignore
  });
});

describe('where lines meet', () => {
  const met = (lines: Line[], robust = false) => {
    const meeting = meetingPoint(lines, { robust });
    if (meeting.kind === 'refused') throw new Error(meeting.why);
    return meeting;
  };

  // Constructed: the exact case, the inexact one with its residuals, and the refusal (standards:P06).
  it('finds the point that two lines share', () => {
    expect(met([line([0, 0], [1, 1]), line([4, 0], [-1, 1])]).point).toEqual({ x: 2, y: 2 });
  });

  const INEXACT = [line([0, 0], [1, 1]), line([4, 0], [-1, 1]), line([0, 1.4], [1, 0.2])];

  it('finds the least-squares point of three that miss one another', () => {
    const { point, residuals, rms, condition } = met(INEXACT);
    expect(point.x).toBeCloseTo(2.019231, 6);
    expect(point.y).toBeCloseTo(1.903846, 6);
    [0.081589, 0.054393, 0.098058].forEach((away, i) => expect(Math.abs(residuals[i]!)).toBeCloseTo(away, 6));
    expect(rms).toBeCloseTo(0.080064, 6);
    expect(condition).toBeCloseTo(2, 6);
  });

  it('agrees with a search over the whole neighbourhood', () => {
    const cost = (x: number, y: number) =>
      INEXACT.reduce((sum, { at, along }) => {
        const size = Math.hypot(along.x, along.y);
        return sum + ((-along.y * (x - at.x) + along.x * (y - at.y)) / size) ** 2;
      }, 0);
    let best = { x: 0, y: 0, cost: Infinity };
    for (let x = 1.5; x <= 2.5; x += 0.002)
      for (let y = 1.5; y <= 2.5; y += 0.002) if (cost(x, y) < best.cost) best = { x, y, cost: cost(x, y) };
    const { point } = met(INEXACT);
    expect(Math.hypot(point.x - best.x, point.y - best.y)).toBeLessThan(0.003);
  });

  it('refuses three nearly parallel lines, one line, and none', () => {
    const parallel = [line([0, 0], [1, 0]), line([0, 1], [1, 0.01]), line([0, 2], [1, -0.01])];
    expect(meetingPoint(parallel)).toEqual({ kind: 'refused', why: 'near-parallel' });
    expect(meetingPoint(INEXACT.slice(0, 1))).toEqual({ kind: 'refused', why: 'too-few' });
    expect(meetingPoint([])).toEqual({ kind: 'refused', why: 'too-few' });
  });

  it('is not carried away by one stray among five that meet', () => {
    const fan = [-40, -20, 5, 25, 45].map((deg, i): Line => {
      const along = { x: Math.sin((deg * Math.PI) / 180), y: Math.cos((deg * Math.PI) / 180) };
      return { at: { x: 3 + along.x + 0.005 * (i - 2), y: 1 + along.y }, along };
    });
    const all = [...fan, line([5, 3], [1, -0.3])];
    const { point, weights } = met(all, true);
    const plain = met(all).point;
    expect(Math.hypot(point.x - 3, point.y - 1)).toBeLessThan(0.15);
    expect(Math.hypot(plain.x - 3, plain.y - 1)).toBeGreaterThan(0.3);
    expect(Math.min(...weights.slice(0, 5))).toBeGreaterThan(weights[5]!);
  });

  it('moves with the lines: turned, shifted and scaled', () => {
    const amount = fc.double({ min: -3, max: 3, noNaN: true });
    fc.assert(
      fc.property(amount, amount, fc.double({ min: 0.2, max: 4, noNaN: true }), amount, (tx, ty, scale, turn) => {
        const [c, s] = [scale * Math.cos(turn), scale * Math.sin(turn)];
        const moved = INEXACT.map(({ at, along }) => ({
          at: { x: c * at.x - s * at.y + tx, y: s * at.x + c * at.y + ty },
          along: { x: c * along.x - s * along.y, y: s * along.x + c * along.y },
        }));
        const [point, was] = [met(moved).point, met(INEXACT).point];
        expect(point.x).toBeCloseTo(c * was.x - s * was.y + tx, 8);
        expect(point.y).toBeCloseTo(s * was.x + c * was.y + ty, 8);
      }),
    ); // prettier-ignore
  });
});
