type XY = { readonly x: number; readonly y: number };

/** x′ = a·x − b·y + tx, y′ = b·x + a·y + ty: a turn, one scale for both axes and a shift. It never reflects. */
export type Similarity = { readonly a: number; readonly b: number; readonly tx: number; readonly ty: number };

export type PointPair = { readonly from: XY; readonly to: XY };

export type SimilarityFit = {
  readonly map: Similarity;
  readonly scale: number;
  /** Turn in degrees, −180 to 180, from the x axis toward the y axis. */
  readonly turnDeg: number;
  /** Root of the mean squared distance between the mapped and the wanted points. */
  readonly rms: number;
};

export function applySimilarity({ a, b, tx, ty }: Similarity, { x, y }: XY): { x: number; y: number } {
  return { x: a * x - b * y + tx, y: b * x + a * y + ty };
}

/** The map that undoes this one; a similarity from `fitSimilarity` always has one. */
export function invertSimilarity({ a, b, tx, ty }: Similarity): Similarity {
  const size = a * a + b * b;
  const [ia, ib] = [a / size, -b / size];
  return { a: ia, b: ib, tx: -(ia * tx - ib * ty), ty: -(ib * tx + ia * ty) };
}

function centre(points: readonly XY[]): XY {
  const sum = points.reduce((total, { x, y }) => ({ x: total.x + x, y: total.y + y }), { x: 0, y: 0 });
  return { x: sum.x / points.length, y: sum.y / points.length };
}

/**
 * The least-squares similarity that carries each `from` to its `to` (S. Umeyama, "Least-squares estimation of
 * transformation parameters between two point patterns", 1991). In the plane his singular value decomposition, with its
 * guard against reflections, comes to the angle of the summed dot and cross products.
 * @returns null for fewer than two pairs, or where all points of one side coincide.
 */
export function fitSimilarity(pairs: readonly PointPair[]): SimilarityFit | null {
  if (pairs.length < 2) return null;
  const [fromCentre, toCentre] = [centre(pairs.map(({ from }) => from)), centre(pairs.map(({ to }) => to))];
  let [dot, cross, spread, reach] = [0, 0, 0, 0];
  for (const { from, to } of pairs) {
    const [fx, fy] = [from.x - fromCentre.x, from.y - fromCentre.y];
    const [gx, gy] = [to.x - toCentre.x, to.y - toCentre.y];
    dot += fx * gx + fy * gy;
    cross += fx * gy - fy * gx;
    spread += fx * fx + fy * fy;
    reach = Math.max(reach, Math.hypot(from.x, from.y), Math.hypot(to.x, to.y));
  }
  const strength = Math.hypot(dot, cross);
  const least = (1e-9 * Math.max(reach, 1e-300)) ** 2;
  if (spread <= least || strength <= least) return null;
  const [a, b] = [dot / spread, cross / spread];
  const map = {
    a,
    b,
    tx: toCentre.x - a * fromCentre.x + b * fromCentre.y,
    ty: toCentre.y - b * fromCentre.x - a * fromCentre.y,
  };
  const squared = pairs.reduce((sum, { from, to }) => {
    const at = applySimilarity(map, from);
    return sum + (at.x - to.x) ** 2 + (at.y - to.y) ** 2;
  }, 0);
  return {
    map,
    scale: Math.hypot(a, b),
    turnDeg: (Math.atan2(b, a) * 180) / Math.PI,
    rms: Math.sqrt(squared / pairs.length),
  };
}
