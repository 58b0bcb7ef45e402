import { garmentPolygon } from '@/diagnosis/figure/figure';
import { figurePoint, type FigurePoint } from '@/diagnosis/figure/point';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';
import type { Measure } from '@/diagnosis/measuring/measures';

const CROTCH_LINE = 1;

/** Where a level crosses the outline of the drawn garment, left to right in figure coordinates. */
function crossings(view: Measure['view'], level: number): number[] {
  const outline = garmentPolygon(view, REFERENCE_PROPORTIONS);
  return outline
    .flatMap((from, at) => {
      const to = outline[(at + 1) % outline.length]!;
      if (from.y > level === to.y > level) return [];
      return [from.x + ((level - from.y) / (to.y - from.y)) * (to.x - from.x)];
    })
    .sort((a, b) => a - b);
}

/**
 * The line of a measure on the figure: round the body, or one leg, at its level; along the body between two levels.
 * Lengths that follow the crotch run down the middle; the others beside the body.
 */
export function measureLine({ run, view, level, id }: Measure): FigurePoint[] {
  const edges = crossings(view, Math.max(0.02, Math.min(3.6, level.from)));
  const [left, right] = [edges[0] ?? -0.4, edges.at(-1) ?? 0.4];
  if (run === 'round') {
    const inner = level.from > CROTCH_LINE && view !== 'left' ? (edges.at(-2) ?? left) : left;
    return [figurePoint(inner, level.from), figurePoint(right, level.from)];
  }
  const isMiddle = id.includes('crotch-length') || id === 'inseam';
  const x = isMiddle ? (view === 'left' ? (left + right) / 2 : 0) : right + 0.08;
  return [figurePoint(x, level.from), figurePoint(x, level.to)];
}
