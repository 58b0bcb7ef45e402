import { wovenEase } from '../ease/wearing-ease';
import type { Knowledge } from '../garments/schema';
import { measureOf, type MeasureId, type WaistPlace } from '../measuring/measures';
import { sumOf, type SumTerm } from './sums';

/** A measure of the body with its error, mm, and the waist that the string was tied at. */
export interface BodyLength {
  meanMm: number;
  sdMm: number;
  waist: WaistPlace;
}

/** What the pattern says at the size that is cut there, mm: the body it is for, and itself between seamlines. */
export interface PatternLength {
  bodyMm: number | null;
  garmentMm: number | null;
}

export interface FlatCheckInput {
  body: Readonly<Partial<Record<MeasureId, BodyLength>>>;
  pattern: Readonly<Partial<Record<MeasureId, PatternLength>>>;
  /** Where the pattern's waist seam is meant to sit; null where nobody said. */
  patternWaist: WaistPlace | null;
  cloth: 'woven' | 'stretch-woven' | 'knit';
  /** Ease chosen by hand, mm; it replaces the draft's. */
  easeMm?: Readonly<Partial<Record<MeasureId, number>>>;
}

export interface Difference {
  measure: MeasureId;
  name: string;
  /** + the body wants more than the pattern gives, ease and all; − cloth is spare. mm */
  needMm: number;
  /** One standard deviation: tape, paper and, where nobody knows it, the ease that was meant. mm */
  sdMm: number;
  easeFrom: 'draft' | 'chosen' | 'table';
  easeMm: number | null;
  /** The weighted needs it speaks about, never one of them alone. */
  terms: readonly SumTerm[];
  kind: 'within' | 'short' | 'spare';
}

export type NotCompared = { measure: MeasureId; name: string; why: string };

/** Measuring a flat pattern between seamlines, one standard deviation, mm (common practice). */
const PAPER_SD_MM = 3;
/** Smaller than this is no difference, whatever the errors say. */
const SMALL_MM = 4;

interface Ease {
  from: Difference['easeFrom'];
  mm: number | null;
  needMm: number;
  sdMm: number;
}

/** Body, ease and pattern of one measure; a sentence where the ease cannot be known. */
function easeOf(input: FlatCheckInput, measure: MeasureId, easeSdMm: number): Ease | string {
  const body = input.body[measure]!;
  const { bodyMm, garmentMm } = input.pattern[measure]!;
  const chosen = input.easeMm?.[measure];
  if (chosen !== undefined && garmentMm !== null)
    return { from: 'chosen', mm: chosen, needMm: body.meanMm + chosen - garmentMm, sdMm: 0 };
  // The draft's own ease stands on both sides: what is left is the body beside the body it was drawn for.
  if (bodyMm !== null)
    return { from: 'draft', mm: garmentMm === null ? null : garmentMm - bodyMm, needMm: body.meanMm - bodyMm, sdMm: 0 }; // prettier-ignore
  if (garmentMm === null) return 'The pattern does not say.';
  if (input.cloth !== 'woven')
    return 'In stretch cloth the ease cannot be guessed: give the body it is drafted for, or choose the ease.';
  const hipMm = input.body.hip?.meanMm ?? 1000;
  const range = wovenEase(measure, hipMm);
  if (!range) return 'No ease is known for it: choose one.';
  const mm = (range.leastMm + (range.mostMm ?? range.leastMm)) / 2;
  return { from: 'table', mm, needMm: body.meanMm + mm - garmentMm, sdMm: easeSdMm };
}

function whyNot(input: FlatCheckInput, measure: MeasureId): string | null {
  const { needsWaist } = measureOf(measure);
  if (needsWaist && input.patternWaist === null)
    return 'Say first where the waist of this pattern is to sit.';
  if (needsWaist && input.patternWaist !== input.body[measure]?.waist)
    return 'It was taken from another waist than the pattern’s: measure again from that string.';
  const { body } = input;
  return measure === 'crotch-length' && body['front-crotch-length'] && body['back-crotch-length']
    ? 'Front and back say more than the whole.'
    : null;
}

/**
 * Lays the body beside the flat pattern, allowances out and ease in. Each difference speaks about a sum of needs, with its
 * error; a whole crotch length leaves front and back apart open.
 * @param knowledge the garment, for its sums
 * @returns differences from the waist down, and what could not be compared, with why
 */
export function flatCheck(
  knowledge: Knowledge,
  input: FlatCheckInput,
): { differences: Difference[]; notCompared: NotCompared[] } {
  const differences: Difference[] = [];
  const notCompared: NotCompared[] = [];
  for (const measure of Object.keys(input.body) as MeasureId[]) {
    const sum = sumOf(knowledge, measure);
    const body = input.body[measure];
    const pattern = input.pattern[measure];
    if (!sum || !body || !pattern || (pattern.bodyMm === null && pattern.garmentMm === null)) continue;
    const { name } = measureOf(measure);
    const why = whyNot(input, measure);
    const ease = why ?? easeOf(input, measure, sum.easeSdMm);
    if (typeof ease === 'string') {
      notCompared.push({ measure, name, why: ease });
      continue;
    }
    const sdMm = Math.hypot(body.sdMm, PAPER_SD_MM, ease.sdMm);
    const { needMm } = ease;
    const isWithin = Math.abs(needMm) <= Math.max(sdMm, SMALL_MM);
    differences.push({ measure, name, needMm, sdMm, easeFrom: ease.from, easeMm: ease.mm, terms: sum.terms, kind: isWithin ? 'within' : needMm > 0 ? 'short' : 'spare' }); // prettier-ignore
  }
  return { differences, notCompared };
}
