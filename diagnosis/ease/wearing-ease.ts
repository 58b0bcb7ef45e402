import type { MeasureId } from '../measuring/measures';

/** Wearing ease of woven trousers, mm round (or long). Least and most as printed; `most` null where print gives a least only. */
export interface EaseRange {
  leastMm: number;
  mostMm: number | null;
  sources: readonly string[];
}

const INCH = 25.4;

/** F12, F13 with TM020 to TM027: leaflets and a costume text, in inches, together as the widest span that any of them prints. */
const WOVEN: Partial<Record<MeasureId, EaseRange>> = {
  waist: { leastMm: 0.5 * INCH, mostMm: 1 * INCH, sources: ['standards:F12', 'trousers:TM020'] },
  'high-hip': { leastMm: 0, mostMm: 2 * INCH, sources: ['trousers:TM021'] },
  hip: { leastMm: 2 * INCH, mostMm: 4 * INCH, sources: ['standards:F12', 'trousers:TM022'] },
  thigh: { leastMm: 1 * INCH, mostMm: 2 * INCH, sources: ['standards:F13', 'trousers:TM023'] },
  knee: { leastMm: 1 * INCH, mostMm: null, sources: ['standards:F13', 'trousers:TM024'] },
  calf: { leastMm: 1 * INCH, mostMm: null, sources: ['common practice'] },
  'front-crotch-length': { leastMm: 0, mostMm: 0.5 * INCH, sources: ['common practice'] },
  'back-crotch-length': { leastMm: 0, mostMm: 0.5 * INCH, sources: ['common practice'] },
  'crotch-length': { leastMm: 0, mostMm: 1 * INCH, sources: ['common practice'] },
  inseam: { leastMm: 0, mostMm: 0, sources: ['common practice'] },
};

/**
 * Ease of the crotch depth by hip, mm: ½ in below 36 in, ¾ in to 38 in, 1 in above (Measurements for Fitting Pants, c. 2003).
 * @param hipMm the body's hip, mm
 */
export function crotchDepthEaseMm(hipMm: number): number {
  if (hipMm < 36 * INCH) return 0.5 * INCH;
  return hipMm <= 38 * INCH ? 0.75 * INCH : INCH;
}

/** The wearing ease that print gives for a level in woven cloth, or null where none is known. */
export function wovenEase(measure: MeasureId, hipMm: number): EaseRange | null {
  if (measure !== 'seated-depth') return WOVEN[measure] ?? null;
  const mm = crotchDepthEaseMm(hipMm);
  return { leastMm: mm, mostMm: mm, sources: ['standards:F13', 'trousers:TM025'] };
}

export interface EaseSplit {
  totalMm: number;
  /** What the body needs to move; negative ease has none. */
  wearingMm: number;
  /** What the draft adds for its look. */
  designMm: number;
  isBelowLeast: boolean;
}

/** Finished measure less body, in wearing ease (up to the least that print gives) and design ease (the rest), mm. */
export function splitEase(bodyMm: number, finishedMm: number, range: EaseRange): EaseSplit {
  const totalMm = finishedMm - bodyMm;
  const wearingMm = Math.max(0, Math.min(totalMm, range.leastMm));
  return { totalMm, wearingMm, designMm: Math.max(0, totalMm - wearingMm), isBelowLeast: totalMm < range.leastMm };
} // prettier-ignore
