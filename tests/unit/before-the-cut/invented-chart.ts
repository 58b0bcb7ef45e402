import { type Chart, chartOf, type ChartCell } from '@/diagnosis/chart/chart';
import type { MeasureId } from '@/diagnosis/measuring/measures';

/** A made-up draft: sizes named by their hip in centimetres, 80 to 132, with the ratios of no maker. */
const HIPS_CM = Array.from({ length: 14 }, (_, i) => 80 + 4 * i);

const EASE_MM: Partial<Record<MeasureId, number>> = { waist: 20, hip: 65, thigh: 40, calf: 60 };

function cellsOf(add: (measure: MeasureId) => number): ChartCell[] {
  return HIPS_CM.flatMap((hipCm) => {
    const hip = hipCm * 10;
    const body: Partial<Record<MeasureId, number>> = {
      waist: hip * 0.9 - 40,
      hip,
      thigh: 0.705 * hip - 98,
      calf: 90 + 0.29 * hip,
      'front-crotch-length': 90 + 0.18 * hip,
      'back-crotch-length': 210 + 0.138 * hip,
      inseam: 815,
    };
    return Object.entries(body).map(([measure, mm]) => {
      const valueMm = mm + add(measure as MeasureId);
      return { size: String(hipCm), measure: measure as MeasureId, valueMm, untilMm: null, typed: `${valueMm} mm` }; // prettier-ignore
    });
  });
}

export const bodyChart: Chart = chartOf(cellsOf(() => 0));
export const finishedChart: Chart = chartOf(cellsOf((measure) => EASE_MM[measure] ?? 0));
