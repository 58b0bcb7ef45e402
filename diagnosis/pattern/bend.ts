import type { Cubic } from './geometry/cubic';
import { plus, times, type XY } from './geometry/xy';
import { cutAt } from './cut';
import { walkFrom, type Part, type Piece, type Station } from './piece';

/**
 * A stretch of outline that is moved: `weights` at its two ends (0 stays, 1 moves by the whole vector), running between
 * them in a smooth S or in a line, by length along the edge or by height.
 */
export interface Stretch {
  readonly from: Station;
  readonly to: Station;
  readonly weights: readonly [number, number];
  readonly shape: 'smooth' | 'line';
  readonly by: 'length' | 'height';
}

/** Weight and its slope at `u` (0–1). The S is the smoothstep 3u² − 2u³: level at both ends, so that no corner appears. */
function weigh({ weights: [start, end], shape }: Stretch, u: number): { at: number; slope: number } {
  const rise = end - start;
  if (shape === 'line') return { at: start + rise * u, slope: rise };
  return { at: start + rise * u * u * (3 - 2 * u), slope: rise * 6 * u * (1 - u) };
}

function bendCubic(cubic: Cubic, stretch: Stretch, [u0, u1]: readonly [number, number], by: XY): Cubic {
  const [first, last] = [weigh(stretch, u0), weigh(stretch, u1)];
  const third = (u1 - u0) / 3;
  const moved = (point: XY, weight: number) => plus(point, times(by, weight));
  return {
    from: moved(cubic.from, first.at),
    // The handles follow the weight's slope, so that parts that met smoothly still do.
    control1: moved(cubic.control1, first.at + first.slope * third),
    control2: moved(cubic.control2, last.at - last.slope * third),
    to: moved(cubic.to, last.at),
  };
}

/** How far along the stretch each joint lies, 0–1: by rest length or by height. */
function positions(parts: readonly Part[], by: Stretch['by']): number[] {
  if (by === 'height') {
    const [top, foot] = [parts[0]!.cubic.from.y, parts.at(-1)!.cubic.to.y];
    return [0, ...parts.map(({ cubic }) => (cubic.to.y - top) / (foot - top))];
  }
  const total = parts.reduce((length, { restMm }) => length + restMm, 0);
  let walked = 0;
  return [0, ...parts.map(({ restMm }) => (walked += restMm) / total)];
}

/** The piece with one stretch of its outline moved by a vector, mm. The rest keeps its place; give each neighbour its own stretch. */
export function bend(piece: Piece, stretch: Stretch, by: XY): Piece {
  const once = cutAt(piece, stretch.from);
  const twice = cutAt(once.piece, stretch.to);
  const start = cutAt(twice.piece, stretch.from).index;
  const indices = walkFrom(twice.piece, start, twice.index);
  const along = positions(
    indices.map((index) => twice.piece.parts[index]!),
    stretch.by,
  );
  const parts = [...twice.piece.parts];
  for (const [step, index] of indices.entries()) {
    const one = parts[index]!;
    parts[index] = { ...one, cubic: bendCubic(one.cubic, stretch, [along[step]!, along[step + 1]!], by) };
  }
  return { ...twice.piece, parts };
}

/** Several stretches moved by the same vector, one after the other. */
export const bendAll = (piece: Piece, stretches: readonly Stretch[], by: XY): Piece =>
  stretches.reduce((bent, stretch) => bend(bent, stretch, by), piece);
