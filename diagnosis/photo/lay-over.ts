import type { FigurePlacement } from '../figure/align';
import { pictureDirection } from '../figure/figure';
import { invertSimilarity } from '../figure/similarity';

/** x′ = a·x + c·y + e, y′ = b·x + d·y + f, as a drawing's `matrix(a b c d e f)` has it. */
export type Affine = readonly [a: number, b: number, c: number, d: number, e: number, f: number];

export const SAME_PLACE: Affine = [1, 0, 0, 1, 0, 0];

/** (outer ∘ inner): first the inner, then the outer. */
function compose(outer: Affine, inner: Affine): Affine {
  const [a, b, c, d, e, f] = outer;
  const [p, q, r, s, t, u] = inner;
  return [a * p + c * q, b * p + d * q, a * r + c * s, b * r + d * s, a * t + c * u + e, b * t + d * u + f];
}

const shownDirection = ({ frame: { view, mirrored } }: FigurePlacement) =>
  mirrored === (pictureDirection(view) === 1) ? -1 : 1;

/**
 * Lays one photo over another of the same view by the figure that lies on both, so that the waist comes on the waist and the
 * fork on the fork. A mirror photo is turned over where the other is none.
 * @returns the map from the one photo to the other, lengths in widths of each photo on both axes
 */
export function layOver(photo: FigurePlacement, onto: FigurePlacement): Affine {
  const back = invertSimilarity(photo.map);
  const turnOver = shownDirection(photo) * shownDirection(onto);
  const { a, b, tx, ty } = onto.map;
  return compose(
    [a, b, -b, a, tx, ty],
    compose([turnOver, 0, 0, 1, 0, 0], [back.a, back.b, -back.b, back.a, back.tx, back.ty]),
  );
}

export function applyAffine(
  [a, b, c, d, e, f]: Affine,
  { x, y }: { x: number; y: number },
): { x: number; y: number } {
  return { x: a * x + c * y + e, y: b * x + d * y + f };
}
