type XY = { readonly x: number; readonly y: number };

/** A line through `at` along `along`; the length of `along` says nothing. */
export type Line = { readonly at: XY; readonly along: XY };

export type Meeting =
  | {
      readonly kind: 'met';
      readonly point: XY;
      /** Signed distance of each line from the point, in the units of the lines. */
      readonly residuals: readonly number[];
      readonly rms: number;
      /** Ratio of the eigenvalues, 1 (lines from all around) … `CONDITION_MAX`. */
      readonly condition: number;
      /** Share that each line had in the answer, 0–1: below 1 it was held for a stray. */
      readonly weights: readonly number[];
    }
  | { readonly kind: 'refused'; readonly why: 'too-few' | 'near-parallel' };

/** Lines within about 16 degrees of one direction meet anywhere: a degree of the hand moves the point by its own distance. */
export const CONDITION_MAX = 50;
const ROUNDS_MAX = 40;
const HUBER = 1.345;
/** Median absolute deviation to standard deviation of normal errors. */
const MAD_TO_SD = 1.4826;

type Normal = { readonly nx: number; readonly ny: number; readonly c: number };

function normalOf({ at, along }: Line): Normal | null {
  const length = Math.hypot(along.x, along.y);
  if (!(length > 0)) return null;
  const [nx, ny] = [-along.y / length, along.x / length];
  return { nx, ny, c: nx * at.x + ny * at.y };
}

function solve(
  normals: readonly Normal[],
  weights: readonly number[],
): { point: XY; condition: number } | null {
  let [xx, xy, yy, bx, by] = [0, 0, 0, 0, 0];
  normals.forEach(({ nx, ny, c }, index) => {
    const w = weights[index]!;
    xx += w * nx * nx;
    xy += w * nx * ny;
    yy += w * ny * ny;
    bx += w * nx * c;
    by += w * ny * c;
  });
  const [mean, half] = [(xx + yy) / 2, Math.hypot((xx - yy) / 2, xy)];
  if (!(mean > 0)) return null;
  const condition = mean - half > 0 ? (mean + half) / (mean - half) : Infinity;
  const determinant = xx * yy - xy * xy;
  if (!(determinant > 0)) return null;
  return { point: { x: (yy * bx - xy * by) / determinant, y: (xx * by - xy * bx) / determinant }, condition };
}

function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 === 1 ? sorted[middle]! : (sorted[middle - 1]! + sorted[middle]!) / 2;
}

/**
 * The point that lies nearest to several lines: the sum of n·nᵀ·x = n·nᵀ·p over their unit normals. With `robust`, lines
 * far from the others lose weight (P. J. Huber, "Robust estimation of a location parameter", 1964), so that one stray mark
 * does not carry the point away; four lines are needed for that to mean anything.
 * @returns refused for fewer than two lines, and where they are so nearly parallel that no point is meant.
 */
export function meetingPoint(lines: readonly Line[], { robust = false }: { robust?: boolean } = {}): Meeting {
  const normals = lines.map(normalOf).filter((normal) => normal !== null);
  if (normals.length < 2) return { kind: 'refused', why: 'too-few' };
  let weights = normals.map(() => 1);
  const all = solve(normals, weights);
  if (all === null || all.condition > CONDITION_MAX) return { kind: 'refused', why: 'near-parallel' };
  let found = all;
  for (let round = 0; robust && normals.length >= 4 && round < ROUNDS_MAX; round += 1) {
    const away = normals.map(({ nx, ny, c }) => Math.abs(nx * found.point.x + ny * found.point.y - c));
    const sd = MAD_TO_SD * median(away);
    if (!(sd > 1e-12)) break;
    weights = away.map((distance) => Math.min(1, (HUBER * sd) / Math.max(distance, 1e-300)));
    const next = solve(normals, weights);
    if (next === null || next.condition > CONDITION_MAX) return { kind: 'refused', why: 'near-parallel' };
    const moved = Math.hypot(next.point.x - found.point.x, next.point.y - found.point.y);
    found = next;
    if (moved < 1e-9) break;
  }
  const residuals = normals.map(({ nx, ny, c }) => nx * found.point.x + ny * found.point.y - c);
  const rms = Math.sqrt(residuals.reduce((sum, r) => sum + r * r, 0) / residuals.length);
  return { kind: 'met', point: found.point, residuals, rms, condition: found.condition, weights };
}
