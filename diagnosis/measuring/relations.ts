import type { MeasureId, WaistPlace } from './measures';

/** A straight line between two measures, mm: `y = slope · x + intercept`, with what is left over. */
interface Line {
  slope: number;
  interceptMm: number;
  residualSdMm: number;
}

export interface Relation {
  of: MeasureId;
  from: MeasureId;
  /** One line for each sample. A value near either is usual: nobody is asked which they are. */
  lines: readonly [Line, Line];
  /** Mean of `from` in the samples, mm: beyond it the residual grows in proportion. */
  centreMm: number;
  /** Holds for a waist taken at the navel only. */
  waist?: WaistPlace;
  source: string;
}

/** From means, standard deviations and a correlation, as published, to the least-squares line. */
function lineOf(r: number, y: { mean: number; sd: number }, x: { mean: number; sd: number }): Line {
  const slope = (r * y.sd) / x.sd;
  return { slope, interceptMm: y.mean - slope * x.mean, residualSdMm: y.sd * Math.sqrt(1 - r * r) };
}

const HIP = [{ mean: 1021.2477, sd: 75.8947 }, { mean: 1019.5189, sd: 76.6811 }] as const; // prettier-ignore
const CALF = [{ mean: 373.2578, sd: 28.5152 }, { mean: 392.2607, sd: 29.7088 }] as const; // prettier-ignore
const FRONT = [{ mean: 278.9824, sd: 29.5454 }, { mean: 266.4263, sd: 34.9707 }] as const; // prettier-ignore
const BACK = [{ mean: 341.858, sd: 28.6182 }, { mean: 355.9174, sd: 29.4957 }] as const; // prettier-ignore

/**
 * ANSUR II (2012 survey, 1,986 women and 4,082 men): the hip tells much about the thigh, something about crotch lengths, and
 * hardly anything about the rise, so no rise is ever questioned by a hip. Lines of B25, or made from B03, B06, B11, B14, B24.
 */
export const RELATIONS: readonly Relation[] = [
  { of: 'thigh', from: 'hip', centreMm: 1020, source: 'standards:B25', lines: [{ slope: 0.69092, interceptMm: -89.45, residualSdMm: 19.114 }, { slope: 0.71885, interceptMm: -107.739, residualSdMm: 19.45 }] },
  { of: 'crotch-length', from: 'hip', centreMm: 1020, waist: 'navel', source: 'standards:B25', lines: [{ slope: 0.35703, interceptMm: 256.226, residualSdMm: 32.658 }, { slope: 0.434, interceptMm: 179.877, residualSdMm: 32.734 }] },
  { of: 'hip', from: 'waist', centreMm: 914, waist: 'navel', source: 'standards:B25', lines: [{ slope: 0.60949, interceptMm: 496.538, residualSdMm: 45.292 }, { slope: 0.60117, interceptMm: 454.071, residualSdMm: 37.022 }] },
  { of: 'inseam', from: 'height', centreMm: 1690, source: 'standards:B25', lines: [{ slope: 0.59038, interceptMm: -179.096, residualSdMm: 23.583 }, { slope: 0.58208, interceptMm: -176.319, residualSdMm: 23.878 }] },
  { of: 'calf', from: 'hip', centreMm: 1020, source: 'standards:B11', lines: [lineOf(0.7367, CALF[0], HIP[0]), lineOf(0.7927, CALF[1], HIP[1])] },
  { of: 'front-crotch-length', from: 'hip', centreMm: 1020, waist: 'navel', source: 'standards:B14', lines: [lineOf(0.5296, FRONT[0], HIP[0]), lineOf(0.6431, FRONT[1], HIP[1])] },
  { of: 'back-crotch-length', from: 'hip', centreMm: 1020, waist: 'navel', source: 'standards:B06', lines: [lineOf(0.4001, BACK[0], HIP[0]), lineOf(0.3658, BACK[1], HIP[1])] },
]; // prettier-ignore

/** Beyond this many residual standard deviations of both lines a second look is worth a minute (B25). */
const FAR = 3;

/** The span that is usual for one measure, given another, mm. */
export function usualSpan(relation: Relation, fromMm: number): { fromMm: number; toMm: number } {
  const grown = Math.max(1, fromMm / relation.centreMm);
  const spans = relation.lines.map(({ slope, interceptMm, residualSdMm }) => {
    const centre = slope * fromMm + interceptMm;
    return [centre - FAR * residualSdMm * grown, centre + FAR * residualSdMm * grown] as const;
  });
  return {
    fromMm: Math.min(...spans.map(([low]) => low)),
    toMm: Math.max(...spans.map(([, high]) => high)),
  };
}
