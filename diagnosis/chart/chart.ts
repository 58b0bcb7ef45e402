import type { MeasureId } from '../measuring/measures';

/** What a table of a pattern says: the body it is for, the garment finished, or the paper between seamlines. */
export const CHART_KINDS = ['body', 'finished', 'paper'] as const;
export type ChartKind = (typeof CHART_KINDS)[number];

export interface ChartCell {
  size: string;
  measure: MeasureId;
  valueMm: number;
  /** Upper end of a range, mm. */
  untilMm: number | null;
  typed: string;
}

export interface Chart {
  /** Smallest to greatest, whatever the order of the rows was. */
  sizes: readonly string[];
  cells: readonly ChartCell[];
}

/** The one length that a range stands for: its middle, mm. */
export const middleMm = ({ valueMm, untilMm }: Pick<ChartCell, 'valueMm' | 'untilMm'>): number =>
  untilMm === null ? valueMm : (valueMm + untilMm) / 2;

/** What a measure says of the order of sizes, best first. */
const RANKING: readonly MeasureId[] = ['hip', 'waist', 'high-hip', 'thigh'];

function meansOf(cells: readonly ChartCell[], measure: MeasureId): Map<string, number> {
  return new Map(
    cells.filter((cell) => cell.measure === measure).map((cell) => [cell.size, middleMm(cell)] as const),
  );
}

/** What the primary measure of a size would be, from a line through the sizes that have both. */
function guessFrom(primary: Map<string, number>, other: Map<string, number>, at: number): number | null {
  const both = [...primary].flatMap(([size, y]) => (other.has(size) ? [[other.get(size)!, y] as const] : []));
  if (both.length < 2) return null;
  const meanX = both.reduce((sum, [x]) => sum + x, 0) / both.length;
  const meanY = both.reduce((sum, [, y]) => sum + y, 0) / both.length;
  const xx = both.reduce((sum, [x]) => sum + (x - meanX) ** 2, 0);
  if (xx === 0) return null;
  return meanY + (both.reduce((sum, [x, y]) => sum + (x - meanX) * (y - meanY), 0) / xx) * (at - meanX);
}

/**
 * Sizes from smallest to greatest, by the measure that most sizes have (hip before waist); a size without it is placed by what
 * it has. The order in which rows were pasted plays no part; ties go by name.
 */
export function orderSizes(cells: readonly ChartCell[]): string[] {
  const sizes = [...new Set(cells.map(({ size }) => size))].sort((a, b) =>
    a.localeCompare(b, 'en', { numeric: true }),
  );
  const measures = [...new Set([...RANKING, ...cells.map(({ measure }) => measure).sort()])];
  const means = measures.map((measure) => meansOf(cells, measure)).filter((map) => map.size > 0);
  const primary = means.reduce((best, map) => (map.size > best.size ? map : best), means[0] ?? new Map());
  const scoreOf = (size: string): number => {
    const own = primary.get(size);
    if (own !== undefined) return own;
    const guesses = means.flatMap((map) => {
      const at = map.get(size);
      const guess = at === undefined ? null : guessFrom(primary, map, at);
      return guess === null ? [] : [guess];
    });
    return guesses.length === 0 ? Infinity : guesses.reduce((sum, one) => sum + one, 0) / guesses.length;
  };
  const score = new Map(sizes.map((size) => [size, scoreOf(size)]));
  // Infinity − Infinity is no number: two sizes that nothing places stay in the order of their names.
  return sizes.sort((a, b) => (score.get(a) === score.get(b) ? 0 : score.get(a)! - score.get(b)!));
}

/** A chart of cells in any order. */
export const chartOf = (cells: readonly ChartCell[]): Chart => ({ sizes: orderSizes(cells), cells });
