import type { Chart } from '../chart/chart';
import type { MeasureId } from '../measuring/measures';

/** How many seam allowances lie in a measure taken across the paper's edges: round the garment, round one leg, or along a seam. */
const ALLOWANCES: Partial<Record<MeasureId, number>> = {
  waist: 8, 'high-hip': 8, hip: 8, // two fronts and two backs, an edge on either side of each
  thigh: 4, knee: 4, calf: 4, // one front and one back of a leg
  'front-crotch-length': 2, 'back-crotch-length': 2, // at the waist and at the inseam
  'crotch-length': 4, 'seated-depth': 1, inseam: 1, outseam: 1, // at the waist or at the fork; a hem is no allowance
}; // prettier-ignore

/** The length between seamlines of a measure that was taken over the allowances, mm. */
export const betweenSeamlinesMm = (measure: MeasureId, overEdgesMm: number, allowanceMm: number): number =>
  overEdgesMm - (ALLOWANCES[measure] ?? 0) * allowanceMm;

/**
 * A table of paper measures that were taken over the allowances, as between seamlines.
 * @param allowanceMm of each edge, mm
 * @returns null where an allowance is wider than a measure
 */
export function withoutAllowances(chart: Chart, allowanceMm: number): Chart | null {
  const cells = chart.cells.map((cell) => ({
    ...cell,
    // What was typed is over the edges: it is no longer this length, and is written out anew.
    typed: '',
    valueMm: betweenSeamlinesMm(cell.measure, cell.valueMm, allowanceMm),
    untilMm: cell.untilMm === null ? null : betweenSeamlinesMm(cell.measure, cell.untilMm, allowanceMm),
  }));
  return cells.some(({ valueMm }) => valueMm <= 0) ? null : { ...chart, cells };
}
