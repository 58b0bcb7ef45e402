type XY = { readonly x: number; readonly y: number };

/** Row by row; the last entry is 1. */
export type Homography = readonly [number, number, number, number, number, number, number, number, number];

export type CornerPair = { readonly from: XY; readonly to: XY };

/** Solves the square system by elimination with row exchange; null where it has no single answer. */
function solveLinear(rows: number[][]): number[] | null {
  const count = rows.length;
  for (let column = 0; column < count; column += 1) {
    let best = column;
    for (let row = column + 1; row < count; row += 1) {
      if (Math.abs(rows[row]![column]!) > Math.abs(rows[best]![column]!)) best = row;
    }
    [rows[column], rows[best]] = [rows[best]!, rows[column]!];
    const pivot = rows[column]!;
    if (Math.abs(pivot[column]!) < 1e-10) return null;
    for (let row = 0; row < count; row += 1) {
      if (row === column) continue;
      const factor = rows[row]![column]! / pivot[column]!;
      for (let at = column; at <= count; at += 1) rows[row]![at]! -= factor * pivot[at]!;
    }
  }
  return rows.map((row, index) => row[count]! / row[index]!);
}

const turn = (a: XY, b: XY, c: XY) => (b.x - a.x) * (c.y - a.y) - (b.y - a.y) * (c.x - a.x);

/** Whether the four corners, in order, are those of a convex quadrilateral: what a flat sheet in front of a camera shows. */
function isConvex(corners: readonly XY[]): boolean {
  const turns = corners.map((a, i) => turn(a, corners[(i + 1) % 4]!, corners[(i + 2) % 4]!));
  const size = Math.max(...turns.map(Math.abs));
  return turns.every((one) => one > 1e-9 * size) || turns.every((one) => one < -1e-9 * size);
}

/** Moves the points to their middle and scales them to about 1, so that pixels and millimetres are solved alike well. */
function toUnit(points: readonly XY[]): { scale: number; x: number; y: number } {
  const x = points.reduce((sum, point) => sum + point.x, 0) / points.length;
  const y = points.reduce((sum, point) => sum + point.y, 0) / points.length;
  const reach = Math.max(...points.map((point) => Math.hypot(point.x - x, point.y - y)));
  return { scale: reach > 0 ? 1 / reach : 1, x, y };
}

const multiply = (a: readonly number[], b: readonly number[]) =>
  [0, 1, 2].flatMap((row) =>
    [0, 1, 2].map((column) => [0, 1, 2].reduce((sum, k) => sum + a[row * 3 + k]! * b[k * 3 + column]!, 0)),
  );

/**
 * The projective map of a flat sheet from its four corners, in order round the sheet (direct linear transform, R. Hartley and
 * A. Zisserman, "Multiple View Geometry in Computer Vision", 2004).
 * @returns null where the corners of either side do not make a convex quadrilateral.
 */
export function fitHomography(
  corners: readonly [CornerPair, CornerPair, CornerPair, CornerPair],
): Homography | null {
  const [from, to] = [corners.map((pair) => pair.from), corners.map((pair) => pair.to)];
  if (!isConvex(from) || !isConvex(to)) return null;
  const [f, t] = [toUnit(from), toUnit(to)];
  const rows = corners.flatMap((pair) => {
    const [x, y] = [(pair.from.x - f.x) * f.scale, (pair.from.y - f.y) * f.scale];
    const [u, v] = [(pair.to.x - t.x) * t.scale, (pair.to.y - t.y) * t.scale];
    return [
      [x, y, 1, 0, 0, 0, -u * x, -u * y, u],
      [0, 0, 0, x, y, 1, -v * x, -v * y, v],
    ];
  });
  const h = solveLinear(rows);
  if (h === null) return null;
  const fromUnit = [1 / t.scale, 0, t.x, 0, 1 / t.scale, t.y, 0, 0, 1];
  const intoUnit = [f.scale, 0, -f.scale * f.x, 0, f.scale, -f.scale * f.y, 0, 0, 1];
  const whole = multiply(multiply(fromUnit, [...h, 1]), intoUnit);
  const last = whole[8]!;
  return Math.abs(last) < 1e-12 ? null : (whole.map((one) => one / last) as unknown as Homography);
}

/** Where the map carries a point; null on the line that it carries to infinity. */
export function applyHomography(h: Homography, { x, y }: XY): { x: number; y: number } | null {
  const w = h[6] * x + h[7] * y + h[8];
  if (Math.abs(w) < 1e-12) return null;
  return { x: (h[0] * x + h[1] * y + h[2]) / w, y: (h[3] * x + h[4] * y + h[5]) / w };
}
