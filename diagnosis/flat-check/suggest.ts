import type { Body } from '../case-schema';
import type { Basis, Knowledge } from '../garments/schema';
import { sizeFactors } from '../size';
import type { Difference } from './flat-check';
import { type Remedy, REMEDIES } from './remedies';

export interface Suggestion {
  correction: string;
  name: string;
  /** On one piece, edge … as `basis` says, mm. */
  amountMm: number;
  basis: Basis;
  /** Own-basis millimetres per millimetre of another basis, as the correction has them. */
  conversions: Partial<Record<Basis, number>>;
  /** The difference it meets, mm: times its effect it is the amount. */
  meetsMm: number;
}

export type Advice =
  | { kind: 'leave' }
  | { kind: 'change'; suggestions: Suggestion[] }
  | { kind: 'another-size'; message: string }
  | { kind: 'open'; message: string };

/** What is met on paper before the first muslin; the rest is the muslin's to show (fitting: two thirds of the estimate). */
const MET = 2 / 3;

/** Widths that are spare by less stay in the first muslin: surplus is taken out last, and cloth can be taken in (order of work). */
const SPARE_LEFT_MM = 30;
const WIDTHS: readonly string[] = ['waist', 'hip', 'thigh', 'knee', 'calf'];

interface Measured {
  suggestion: Suggestion;
  isPastCap: boolean;
}

function suggestionOf(
  knowledge: Knowledge,
  { needMm, terms }: Difference,
  { correction: id, share }: Remedy,
  factors: ReturnType<typeof sizeFactors>,
): Measured | null {
  const correction = knowledge.corrections.find((one) => one.id === id);
  if (!correction?.amounts) return null;
  const { basis, conversions, capRoundMm, capTotalMm, sizeLevel } = correction.amounts;
  const weight = new Map(terms.map((term) => [term.dimension, term.weight]));
  const perMm = correction.vector.reduce(
    (sum, { dimension, perMm, coupling }) => sum + (coupling ? 0 : perMm * (weight.get(dimension) ?? 0)),
    0,
  );
  const wanted = (needMm * share * MET) / perMm;
  if (!(wanted > 0)) return null;
  const amountMm = Math.min(wanted, capRoundMm * factors[sizeLevel]);
  const suggestion = {
    correction: id,
    name: correction.name,
    amountMm,
    basis,
    conversions,
    meetsMm: amountMm * perMm,
  };
  return { suggestion, isPastCap: wanted > capTotalMm * factors[sizeLevel] };
}

/**
 * What to do about a difference before the first muslin, and by how much. Within its error: nothing. Past what a draft can be
 * bent: another size, or another draft. A sum that cannot be divided, and a little spare width, is left open.
 * @param body sizes caps and amounts
 */
export function adviseOn(knowledge: Knowledge, difference: Difference, body: Body): Advice {
  if (difference.kind === 'within') return { kind: 'leave' };
  if (WIDTHS.includes(difference.measure) && difference.needMm < 0 && difference.needMm > -SPARE_LEFT_MM)
    return { kind: 'open', message: 'Leave it in: spare width is taken in once the muslin hangs.' };
  const remedies = REMEDIES[difference.measure]?.[difference.kind === 'short' ? 'more' : 'less'] ?? [];
  const factors = sizeFactors(body);
  const found = remedies.flatMap((remedy) => suggestionOf(knowledge, difference, remedy, factors) ?? []);
  if (found.length === 0)
    return {
      kind: 'open',
      message: 'It does not say where: the muslin, or the halves measured apart, will.',
    };
  if (found.some(({ isPastCap }) => isPastCap))
    return { kind: 'another-size', message: `That is more than this draft can be bent by at the ${difference.name.toLowerCase()}. Take another size there, or another draft.` }; // prettier-ignore
  return { kind: 'change', suggestions: found.map(({ suggestion }) => suggestion) };
}
