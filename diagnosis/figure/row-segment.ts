import type { CubicSegment } from './curve';
import { between, figurePoint, type FigurePoint } from './point';

/** A row between two fractions as one cubic: exact, because a row is linear in x and quadratic in y. */
export function rowSegment(at: (fraction: number) => FigurePoint, from: number, to: number): CubicSegment {
  const [a, b, middle] = [at(from), at(to), at((from + to) / 2)];
  const pull = figurePoint(2 * middle.x - (a.x + b.x) / 2, 2 * middle.y - (a.y + b.y) / 2);
  return { from: a, control1: between(a, pull, 2 / 3), control2: between(b, pull, 2 / 3), to: b };
}
