import type { Chart } from '../chart/chart';
import { gradeOf, lengthAt } from './grade';
import type { LevelSize, SizedLevel, SizeRef } from './levels';

/** Where a level leaves the line of the size that is cut, and by how much. */
export interface Blend {
  measure: SizedLevel;
  name: string;
  from: SizeRef;
  to: SizeRef;
  /** Whole difference, mm round (one leg for leg levels); − means smaller than the size that is cut. */
  roundMm: number;
  edges: number;
  /** On each edge, mm; times `edges` it is `roundMm`. */
  perEdgeMm: number;
  /** Which edges, in words. */
  where: string;
  /** From a level that the chart does not reach: its last step was continued. */
  isContinued: boolean;
}

const SIDES = 'front and back at both side seams';
const LEG = 'front and back of the leg, inseam and side seam';
const WHERE: Record<SizedLevel, string> = {
  waist: SIDES,
  'high-hip': SIDES,
  hip: SIDES,
  thigh: LEG,
  knee: LEG,
  calf: LEG,
};
/** Two side seams of two edges each, or two seams of one leg. */
const EDGES = 4;

/**
 * The lines to draw from the size that is cut to the size of each level that differs. The finished measures give the amount
 * where the pattern prints them; the body chart does otherwise.
 * @param base the size whose paper is cut
 */
export function blendsFrom(
  base: SizeRef,
  levels: readonly LevelSize[],
  bodyChart: Chart,
  finished: Chart,
): Blend[] {
  return levels.flatMap(({ measure, name, chosen }) => {
    if (chosen.ordinal === base.ordinal) return [];
    const grade = gradeOf(named(finished, bodyChart), measure) ?? gradeOf(bodyChart, measure);
    if (!grade) return [];
    const roundMm = lengthAt(grade, chosen.ordinal) - lengthAt(grade, base.ordinal);
    const isContinued = chosen.steps !== 0 || base.steps !== 0;
    return [{ measure, name, from: base, to: chosen, roundMm, edges: EDGES, perEdgeMm: roundMm / EDGES, where: WHERE[measure], isContinued }]; // prettier-ignore
  });
}

/** A chart's cells under the order of another's sizes, so that one place means one size in both. */
export const named = (chart: Chart, order: Chart): Chart => ({
  sizes: order.sizes,
  cells: chart.cells.filter(({ size }) => order.sizes.includes(size)),
});
