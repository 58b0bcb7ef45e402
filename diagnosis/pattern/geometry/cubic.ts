import { between, distance, minus, plus, times, xy, type XY } from './xy';

/** One cubic Bézier. A straight line is the cubic whose handles lie on its thirds. */
export interface Cubic {
  readonly from: XY;
  readonly control1: XY;
  readonly control2: XY;
  readonly to: XY;
}

export const straight = (from: XY, to: XY): Cubic => ({
  from,
  control1: between(from, to, 1 / 3),
  control2: between(from, to, 2 / 3),
  to,
});

export const mapCubic = (cubic: Cubic, place: (point: XY) => XY): Cubic => ({
  from: place(cubic.from),
  control1: place(cubic.control1),
  control2: place(cubic.control2),
  to: place(cubic.to),
});

/** The point at `t` (0–1). */
export function pointAt({ from, control1, control2, to }: Cubic, t: number): XY {
  const s = 1 - t;
  const [a, b, c, d] = [s * s * s, 3 * s * s * t, 3 * s * t * t, t * t * t];
  return xy(
    a * from.x + b * control1.x + c * control2.x + d * to.x,
    a * from.y + b * control1.y + c * control2.y + d * to.y,
  );
}

/** The derivative by `t` at `t` (0–1). */
export function velocityAt({ from, control1, control2, to }: Cubic, t: number): XY {
  const s = 1 - t;
  return plus(
    plus(times(minus(control1, from), 3 * s * s), times(minus(control2, control1), 6 * s * t)),
    times(minus(to, control2), 3 * t * t),
  );
}

/** Abscissas and weights of 16-point Gauss–Legendre quadrature on −1…1 (Abramowitz & Stegun 1964, table 25.4). */
const GAUSS = [
  [0.0950125098376374, 0.1894506104550685], [0.2816035507792589, 0.1826034150449236],
  [0.4580167776572274, 0.1691565193950025], [0.6178762444026438, 0.1495959888165767],
  [0.755404408355003, 0.1246289712555339], [0.8656312023878318, 0.0951585116824928],
  [0.9445750230732326, 0.0622535239386479], [0.9894009349916499, 0.0271524594117541],
] as const; // prettier-ignore

function quadrature(cubic: Cubic, t0: number, t1: number): number {
  const [half, middle] = [(t1 - t0) / 2, (t0 + t1) / 2];
  let sum = 0;
  for (const [abscissa, weight] of GAUSS)
    for (const t of [middle - half * abscissa, middle + half * abscissa]) {
      const { x, y } = velocityAt(cubic, t);
      sum += weight * Math.hypot(x, y);
    }
  return sum * half;
}

const DEPTH = 12;
function refine(cubic: Cubic, t0: number, t1: number, whole: number, depth: number): number {
  const middle = (t0 + t1) / 2;
  const [left, right] = [quadrature(cubic, t0, middle), quadrature(cubic, middle, t1)];
  // A quarter of a nanometre: far below paper, so that sums of many parts still agree to a millionth.
  if (depth === 0 || Math.abs(left + right - whole) < 1e-9) return left + right;
  return refine(cubic, t0, middle, left, depth - 1) + refine(cubic, middle, t1, right, depth - 1);
}

/** Length of the cubic between two parameters, mm, by adaptive Gauss–Legendre quadrature (to about 1e-9 mm). */
export function lengthOf(cubic: Cubic, t0 = 0, t1 = 1): number {
  if (isStraight(cubic)) return distance(pointAt(cubic, t0), pointAt(cubic, t1));
  return refine(cubic, t0, t1, quadrature(cubic, t0, t1), DEPTH);
}

/** Whether the handles lie on the thirds of the chord, so that it is a line drawn at even speed. */
export function isStraight({ from, control1, control2, to }: Cubic): boolean {
  return (
    distance(control1, between(from, to, 1 / 3)) < 1e-9 && distance(control2, between(from, to, 2 / 3)) < 1e-9
  );
}

/** Both parts of a cubic cut at `t` (de Casteljau 1959). */
export function splitCubic({ from, control1, control2, to }: Cubic, t: number): [Cubic, Cubic] {
  const [a, b, c] = [between(from, control1, t), between(control1, control2, t), between(control2, to, t)];
  const [d, e] = [between(a, b, t), between(b, c, t)];
  const middle = between(d, e, t);
  return [
    { from, control1: a, control2: d, to: middle },
    { from: middle, control1: e, control2: c, to },
  ];
}

/** The parameter at which `mm` of the cubic have been walked (Newton's method held inside a bisection). */
export function parameterAtLength(cubic: Cubic, mm: number, whole = lengthOf(cubic)): number {
  if (mm <= 0) return 0;
  if (mm >= whole) return 1;
  if (isStraight(cubic)) return mm / whole;
  return solve((t) => lengthOf(cubic, 0, t) - mm, 0, 1, mm / whole);
}

/** A root is found when the function is this small: far below what is measured, whatever its unit. */
const CLOSE = 1e-11;

/** A root of a function that changes sign between `low` and `high`, by false position held inside a bisection. */
export function solve(f: (t: number) => number, low: number, high: number, guess = (low + high) / 2): number {
  let [a, b, t] = [low, high, guess];
  let [fa, fb] = [f(a), f(b)];
  if (fa === 0) return a;
  if (fb === 0) return b;
  const rises = fb > fa;
  for (let step = 0; step < 100; step++) {
    const ft = f(t);
    if (Math.abs(ft) < CLOSE || b - a < 1e-14 * Math.max(1, Math.abs(t))) return t;
    if (ft > 0 === rises) [b, fb] = [t, ft];
    else [a, fa] = [t, ft];
    const secant = a - (fa * (b - a)) / (fb - fa);
    // Every third step halves the bracket, so that a flat end cannot stall the search.
    t = step % 3 === 2 || !(secant > a && secant < b) ? (a + b) / 2 : secant;
  }
  return t;
}

/** Arguments (rising, 0–1) at which `f` is zero, found between evenly spaced samples. */
export function rootsOf(f: (t: number) => number, samples = 8): number[] {
  const found: number[] = [];
  let before = f(0);
  for (let index = 0; index < samples; index++) {
    const [t0, t1] = [index / samples, (index + 1) / samples];
    const after = f(t1);
    if (Math.abs(before) < 1e-9) found.push(t0);
    else if (before * after < 0 && Math.abs(after) >= 1e-9) found.push(solve(f, t0, t1));
    before = after;
  }
  if (Math.abs(before) < 1e-9) found.push(1);
  return found;
}

/** Parameters (rising) at which `height(point)` is zero. */
export function zerosOf(cubic: Cubic, height: (point: XY) => number): number[] {
  const ends = [cubic.from, cubic.control1, cubic.control2, cubic.to].map(height);
  // A cubic lies within its handles' hull: most parts are passed over at once.
  if (Math.min(...ends) > 1e-9 || Math.max(...ends) < -1e-9) return [];
  return rootsOf((t) => height(pointAt(cubic, t)));
}
