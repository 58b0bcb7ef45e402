import { garmentPolygon } from '@/diagnosis/figure/figure';
import { figurePoint, type FigurePoint } from '@/diagnosis/figure/point';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';
import type { Measure } from '@/diagnosis/measuring/measures';

const CROTCH_LINE = 1;
/** Below it the drawn leg has no edges of its own: the width of the hem is taken. */
const LOWEST = 3.3;
/** Clear of the drawn hand. */
const BESIDE_THE_ARM = 1.06;

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

/** The line of a measure on the figure: round the body, or one leg, at its level; along the body between two levels. */
export function measureLine({ run, view, level, id }: Measure): FigurePoint[] {
  const edges = crossings(view, Math.max(0.02, Math.min(LOWEST, level.from)));
  const [left, right] = [edges[0] ?? -0.4, edges.at(-1) ?? 0.4];
  if (run === 'round') {
    const inner = level.from > CROTCH_LINE && view !== 'left' ? (edges.at(-2) ?? left) : left;
    return [figurePoint(inner, level.from), figurePoint(right, level.from)];
  }
  const x = alongX(id, view, left, right);
  return [figurePoint(x, level.from), figurePoint(x, level.to)];
}

/** Seen from the side a length runs down the side of the body; from the front down its middle, or beside it. */
function alongX(id: Measure['id'], view: Measure['view'], left: number, right: number): number {
  if (view === 'left' || view === 'seated') return (left + right) / 2;
  return id === 'height' ? BESIDE_THE_ARM : 0;
}
