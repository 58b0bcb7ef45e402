import type { MeasureId, WaistPlace } from '@/diagnosis/measuring/measures';
import { type Entry, type MeasureQuestion, questionsFor } from '@/diagnosis/measuring/questions';
import { type LengthUnit, parseAmount } from '@/diagnosis/units/parse-amount';

/** What was typed of each measure, a text for each take. */
export type Sitting = Partial<Record<MeasureId, string[]>>;

export const keptTakes = (takes: readonly string[] | undefined): string[] =>
  (takes ?? []).map((typed) => typed.trim()).filter((typed) => typed !== '');

/** The first take that cannot be read, as a sentence. */
export function unreadable(takes: readonly string[], unit: LengthUnit): string | null {
  for (const typed of takes) {
    const read = parseAmount(typed, unit);
    if (read.kind !== 'amount') return read.message;
  }
  return null;
}

/** A measure by the mean of the takes that can be read; a bare number has no unit written. */
function entryOf(takes: readonly string[], unit: LengthUnit): Entry | null {
  const read = takes.map((typed) => parseAmount(typed, unit));
  const lengths = read.flatMap((one) => (one.kind === 'amount' ? [one.mm] : []));
  if (lengths.length === 0) return null;
  const mm = lengths.reduce((sum, one) => sum + one, 0) / lengths.length;
  return { mm, isUnitWritten: takes.some((typed) => /[a-z"″”]/i.test(typed)) };
}

/** What is worth asking about a sitting, those that were answered left out. */
export function openQuestions(
  sitting: Sitting,
  unit: LengthUnit,
  waist: WaistPlace,
  answered: readonly string[],
): MeasureQuestion[] {
  const entries = Object.fromEntries(
    (Object.entries(sitting) as [MeasureId, string[]][]).flatMap(([id, takes]) => {
      const entry = entryOf(keptTakes(takes), unit);
      return entry ? [[id, entry] as const] : [];
    }),
  );
  return questionsFor(entries, unit, waist).filter(({ measure }) => !answered.includes(answerKey(measure, sitting))); // prettier-ignore
}

/** An answer holds for what was typed: another length is asked about anew. */
export const answerKey = (measure: MeasureId, sitting: Sitting): string =>
  `${measure} ${keptTakes(sitting[measure]).join(' ')}`;

/** The values to send, takes counted from 1. */
export const valuesOf = (sitting: Sitting): { measure: MeasureId; take: number; typed: string }[] =>
  (Object.entries(sitting) as [MeasureId, string[]][]).flatMap(([measure, takes]) =>
    keptTakes(takes).map((typed, at) => ({ measure, take: at + 1, typed })),
  );
