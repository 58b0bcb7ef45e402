import { mapCubic } from '../geometry/cubic';
import { between, type XY } from '../geometry/xy';
import type { Piece } from '../piece';

/** How much of the second size is taken at a height: 0 the first alone, 1 the second alone; between two heights an S. */
export interface BlendLevel {
  readonly y: number;
  readonly share: number;
}

/** Share at a height, running smoothly from each level to the next. Levels rise in `y`. */
function shareAt(levels: readonly BlendLevel[], y: number): number {
  const next = levels.findIndex((level) => level.y >= y);
  if (next === -1) return levels.at(-1)!.share;
  if (next === 0) return levels[0]!.share;
  const [above, below] = [levels[next - 1]!, levels[next]!];
  const u = (y - above.y) / (below.y - above.y);
  return above.share + (below.share - above.share) * u * u * (3 - 2 * u);
}

/**
 * One piece between two sizes of the same draft: at each height so much of the one and so much of the other. Both sizes must have
 * the same edges in the same order, as one draft gives them.
 * @throws RangeError when the pieces do not correspond or no level is given.
 */
export function blendSizes(smaller: Piece, larger: Piece, levels: readonly BlendLevel[]): Piece {
  const corresponds =
    levels.length > 0 &&
    smaller.parts.length === larger.parts.length &&
    smaller.parts.every(({ edge }, index) => edge === larger.parts[index]!.edge);
  if (!corresponds) throw new RangeError('the two sizes do not have the same edges');
  const mix = (a: XY, b: XY) => between(a, b, shareAt(levels, a.y));
  return {
    ...smaller,
    parts: smaller.parts.map((one, index) => {
      const other = larger.parts[index]!;
      const partner = new Map([
        [one.cubic.from, other.cubic.from],
        [one.cubic.control1, other.cubic.control1],
        [one.cubic.control2, other.cubic.control2],
        [one.cubic.to, other.cubic.to],
      ]);
      return {
        ...one,
        cubic: mapCubic(one.cubic, (point) => mix(point, partner.get(point)!)),
        restMm: one.restMm + (other.restMm - one.restMm) * shareAt(levels, one.cubic.from.y),
      };
    }),
    marks: Object.fromEntries(
      Object.entries(smaller.marks).map(([name, mark]) => [name, mix(mark, larger.marks[name] ?? mark)]),
    ),
  };
}
