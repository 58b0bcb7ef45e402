import type { Knowledge } from '../garments/schema';
import type { MeasureId } from '../measuring/measures';

export interface SumTerm {
  dimension: string;
  weight: number;
  side: 'both';
}

/** The sum of a garment's knowledge that a measure speaks about. */
const SUM_OF: Partial<Record<MeasureId, string>> = {
  waist: 'waist-girth',
  hip: 'hip-girth',
  'seated-depth': 'seated-depth',
  'front-crotch-length': 'front-crotch-length',
  'back-crotch-length': 'back-crotch-length',
  thigh: 'thigh-girth',
  knee: 'knee-round',
  calf: 'calf-round',
  inseam: 'inseam-length',
};

const both = (terms: readonly { dimension: string; weight: number }[]): SumTerm[] =>
  terms.map(({ dimension, weight }) => ({ dimension, weight, side: 'both' }));

/** Two sums laid end to end: what both speak about counts by the sum of its weights. */
function joined(terms: readonly SumTerm[]): SumTerm[] {
  const weights = new Map<string, number>();
  for (const { dimension, weight } of terms) weights.set(dimension, (weights.get(dimension) ?? 0) + weight);
  return [...weights].map(([dimension, weight]) => ({ dimension, weight, side: 'both' }));
}

/** The needs that a measure speaks about and the error of an unknown ease, mm; null where the garment has no such sum. */
export function sumOf(
  { sums }: Pick<Knowledge, 'sums'>,
  measure: MeasureId,
): { terms: SumTerm[]; easeSdMm: number } | null {
  const find = (id: string | undefined) => sums.find((sum) => sum.id === id);
  if (measure !== 'crotch-length') {
    const sum = find(SUM_OF[measure]);
    return sum ? { terms: both(sum.terms), easeSdMm: sum.easeSdMm } : null;
  }
  const [front, back] = [find('front-crotch-length'), find('back-crotch-length')];
  if (!front || !back) return null;
  return { terms: joined(both([...front.terms, ...back.terms])), easeSdMm: Math.hypot(front.easeSdMm, back.easeSdMm) }; // prettier-ignore
}
