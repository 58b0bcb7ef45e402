import type { MeasureId } from '../measuring/measures';
import { type Chart, middleMm } from '../chart/chart';

/** One size at one level: its place in the chart and the span of bodies it is for, mm. */
interface Point {
  ordinal: number;
  lowMm: number;
  highMm: number;
}

/** A level of a chart, with gaps filled between sizes that have it and the last step continued beyond its ends. */
export interface Grade {
  measure: MeasureId;
  /** Never empty, growing in both; a cell that shrinks is passed over. */
  points: readonly Point[];
  /** Step per size below the first and above the last, mm; null where one size alone has the level. */
  stepBelowMm: number | null;
  stepAboveMm: number | null;
}

const middle = ({ lowMm, highMm }: Point) => (lowMm + highMm) / 2;

const stepBetween = (a: Point | undefined, b: Point | undefined): number | null =>
  a && b ? (middle(b) - middle(a)) / (b.ordinal - a.ordinal) : null;

/** The grade of a level, or null where the chart does not have it. */
export function gradeOf(chart: Chart, measure: MeasureId): Grade | null {
  const own = new Map(
    chart.cells.filter((cell) => cell.measure === measure).map((cell) => [cell.size, cell]),
  );
  const points: Point[] = [];
  chart.sizes.forEach((size, ordinal) => {
    const cell = own.get(size);
    const before = points.at(-1);
    if (!cell || (before && middleMm(cell) <= middle(before))) return;
    // Ranges may touch or overlap; the next one begins where the last has ended.
    const lowMm = Math.max(cell.valueMm, before?.highMm ?? cell.valueMm);
    points.push({ ordinal, lowMm, highMm: Math.max(lowMm, cell.untilMm ?? cell.valueMm) });
  });
  if (points.length === 0) return null;
  return {
    measure,
    points,
    stepBelowMm: stepBetween(points[0], points[1]),
    stepAboveMm: stepBetween(points.at(-2), points.at(-1)),
  };
}

/**
 * Where a body stands between sizes: 2 is the third size, 2.5 half-way to the fourth; below 0 or above the last where the chart
 * stops. Grows with the body. A single size says nothing of its neighbours: every body is at it.
 */
export function positionOf(grade: Grade, bodyMm: number): number {
  const first = grade.points[0]!;
  const last = grade.points.at(-1)!;
  if (bodyMm < first.lowMm)
    return first.ordinal - (grade.stepBelowMm ? (first.lowMm - bodyMm) / grade.stepBelowMm : 0);
  if (bodyMm > last.highMm)
    return last.ordinal + (grade.stepAboveMm ? (bodyMm - last.highMm) / grade.stepAboveMm : 0);
  const at = grade.points.findLastIndex(({ lowMm }) => lowMm <= bodyMm);
  const here = grade.points[at]!;
  const next = grade.points[at + 1];
  if (bodyMm <= here.highMm || !next) return here.ordinal;
  const part = (bodyMm - here.highMm) / (next.lowMm - here.highMm);
  return here.ordinal + part * (next.ordinal - here.ordinal);
}

/** The length of a size at a level, mm: the chart's, between two of its sizes, or its last step continued. */
export function lengthAt(grade: Grade, ordinal: number): number {
  const first = grade.points[0]!;
  const last = grade.points.at(-1)!;
  if (ordinal <= first.ordinal) return middle(first) - (first.ordinal - ordinal) * (grade.stepBelowMm ?? 0);
  if (ordinal >= last.ordinal) return middle(last) + (ordinal - last.ordinal) * (grade.stepAboveMm ?? 0);
  const at = grade.points.findLastIndex((point) => point.ordinal <= ordinal);
  const [here, next] = [grade.points[at]!, grade.points[at + 1]!];
  const part = (ordinal - here.ordinal) / (next.ordinal - here.ordinal);
  return middle(here) + part * (middle(next) - middle(here));
}
