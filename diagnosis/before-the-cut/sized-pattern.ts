import { type Chart, chartOf, type ChartCell, type ChartKind } from '../chart/chart';
import type { PatternLength } from '../flat-check/flat-check';
import { MEASURE_IDS, type MeasureId } from '../measuring/measures';
import { named } from '../sizing/blend';
import { gradeOf, lengthAt } from '../sizing/grade';
import { type SizeRef, sizeAt } from '../sizing/levels';
import { chooseSize, type Choice } from '../sizing/propose';

export type PatternCell = ChartCell & { kind: ChartKind };

export interface Charts {
  /** Bodies that the sizes are for. */
  body: Chart;
  /** The garment between seamlines: measured on paper where it was, printed otherwise. */
  garment: Chart;
}

/** The tables of a pattern under one order of sizes. A paper measure replaces the printed finished one of its size. */
export function chartsOf(cells: readonly PatternCell[]): Charts {
  const of = (kind: ChartKind) => cells.filter((cell) => cell.kind === kind);
  const paper = of('paper');
  const isMeasured = (cell: ChartCell) =>
    paper.some(({ size, measure }) => size === cell.size && measure === cell.measure);
  const garment = [...paper, ...of('finished').filter((cell) => !isMeasured(cell))];
  const body = chartOf(of('body'));
  if (body.sizes.length === 0) return { body, garment: chartOf(garment) };
  return { body, garment: named({ sizes: [], cells: garment }, body) };
}

export type KeptSizes = Readonly<Record<string, { size: string; steps: number }>>;

/** Which size is cut at each place. */
export interface CutSizes {
  choice: Choice;
  /** The size whose paper is cut; null while the pattern has no sizes. */
  base: SizeRef | null;
  /** The size at a measure: kept by hand, else the proposal's for its level, else the size that is cut. */
  at: (measure: MeasureId) => SizeRef | null;
}

/** @param kept sizes chosen by hand; one that the chart no longer has is passed over */
export function cutSizes(
  charts: Charts,
  body: Readonly<Partial<Record<MeasureId, number>>>,
  kept: KeptSizes,
): CutSizes {
  const order = charts.body.sizes.length > 0 ? charts.body : charts.garment;
  const choice = chooseSize(charts.body, charts.garment, body);
  const keptAt = (key: string): SizeRef | null => {
    const one = kept[key];
    const place = one ? order.sizes.indexOf(one.size) : -1;
    return one && place >= 0 ? sizeAt(order, place + one.steps) : null;
  };
  const first = order.sizes.length > 0 ? sizeAt(order, 0) : null;
  const base = keptAt('base') ?? choice.proposals[0]?.base ?? first;
  const levelAt = (measure: MeasureId) => choice.levels.find((level) => level.measure === measure)?.chosen;
  return { choice, base, at: (measure) => keptAt(measure) ?? levelAt(measure) ?? base };
}

/** What the pattern says of each measure at the size that is cut there, mm. */
export function patternAt(charts: Charts, sizes: CutSizes): Partial<Record<MeasureId, PatternLength>> {
  return Object.fromEntries(
    MEASURE_IDS.flatMap((measure) => {
      const size = sizes.at(measure);
      const read = (chart: Chart) => {
        const grade = size ? gradeOf(chart, measure) : null;
        return grade && size ? lengthAt(grade, size.ordinal) : null;
      };
      const [bodyMm, garmentMm] = [read(charts.body), read(charts.garment)];
      return bodyMm === null && garmentMm === null ? [] : [[measure, { bodyMm, garmentMm }] as const];
    }),
  );
}
