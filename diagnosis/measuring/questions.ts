import type { LengthUnit } from '../units/parse-amount';
import { measureOf, type MeasureId, type WaistPlace } from './measures';
import { RELATIONS, usualSpan } from './relations';

export type MeasureQuestion =
  | { kind: 'other-unit'; measure: MeasureId; unit: LengthUnit; otherMm: number; message: string }
  | { kind: 'unusual'; measure: MeasureId; beside: MeasureId; message: string }
  | { kind: 'far-out'; measure: MeasureId; message: string };

export interface Entry {
  mm: number;
  /** Whether a unit was written beside the number; then it is never taken for another. */
  isUnitWritten: boolean;
}

const CM_PER_INCH = 2.54;
const within = (mm: number, { from, to }: { from: number; to: number }) => mm >= from && mm <= to;

/** A bare number that only makes sense in the other unit: 40 in a centimetre field, 102 in an inch field. */
function unitQuestion(measure: MeasureId, entry: Entry, unit: LengthUnit): MeasureQuestion | null {
  if (entry.isUnitWritten) return null;
  const { name, usualMm } = measureOf(measure);
  const otherMm = unit === 'cm' ? entry.mm * CM_PER_INCH : entry.mm / CM_PER_INCH;
  if (within(entry.mm, usualMm) || !within(otherMm, usualMm)) return null;
  const [typed, other] = unit === 'cm' ? ['centimetres', 'inches'] : ['inches', 'centimetres'];
  const asked: LengthUnit = unit === 'cm' ? 'in' : 'cm';
  return { kind: 'other-unit', measure, unit: asked, otherMm, message: `${name}: is this in ${other}? The field takes ${typed}.` }; // prettier-ignore
}

/**
 * What is worth asking once about a set of measures. Nothing is refused and nothing is changed: the answer keeps what was
 * typed, and a second take stands beside the first. Rises are never questioned by girths.
 * @param unit the unit that bare numbers took
 */
export function questionsFor(
  entries: Readonly<Partial<Record<MeasureId, Entry>>>,
  unit: LengthUnit,
  waist: WaistPlace,
): MeasureQuestion[] {
  const questions: MeasureQuestion[] = [];
  const asked = new Set<MeasureId>();
  const ask = (question: MeasureQuestion) => {
    if (asked.has(question.measure)) return;
    asked.add(question.measure);
    questions.push(question);
  };
  for (const [id, entry] of Object.entries(entries) as [MeasureId, Entry][]) {
    const question = unitQuestion(id, entry, unit);
    const { name, usualMm } = measureOf(id);
    if (question) ask(question);
    else if (!within(entry.mm, usualMm))
      ask({ kind: 'far-out', measure: id, message: `${name}: look once more, the tape may have slipped.` });
  }
  for (const relation of RELATIONS) {
    const [one, other] = [entries[relation.of], entries[relation.from]];
    if (!one || !other || asked.has(relation.from)) continue;
    if (relation.waist && relation.waist !== waist) continue;
    const span = usualSpan(relation, other.mm);
    if (one.mm >= span.fromMm && one.mm <= span.toMm) continue;
    const beside = measureOf(relation.from).name.toLowerCase();
    ask({ kind: 'unusual', measure: relation.of, beside: relation.from, message: `${measureOf(relation.of).name} is rare beside this ${beside}. Bodies are, now and then; measure both once more.` }); // prettier-ignore
  }
  return questions;
}
