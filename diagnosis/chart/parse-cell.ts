import { type LengthUnit, parseAmount } from '../units/parse-amount';
import { measureOf, type MeasureId } from '../measuring/measures';

export interface CellValue {
  valueMm: number;
  /** The upper end of a range, mm; null for one length. */
  untilMm: number | null;
}

export type ReadCell =
  { kind: 'value'; value: CellValue } | { kind: 'empty' } | { kind: 'problem'; message: string };

const CELL_MAX = 48;
const RANGE = /^(.+?)\s*(?:-|–|—|\bto\b|\.\.|…)\s*(.+)$/;
/** `26-1/2` is a mixed number, not a range. */
const MIXED = /^\d+-\d+\/\d+(\s*("|in|inch|inches)\.?)?$/i;
const EMPTY = new Set(['', '-', '–', '—', 'n/a', 'na', '/', '.', '?']);
const UNIT_AT_END = /("|″|”|\b(?:mm|cm|in|inch|inches)\.?)$/i;

const problem = (message: string): ReadCell => ({ kind: 'problem', message });

/** The two ends as texts, a unit that stands only at the end carried to both: `64–68 cm`. */
function endsOf(text: string): [string, string] | null {
  if (MIXED.test(text)) return null;
  const found = RANGE.exec(text);
  const [, from, to] = found ?? [];
  if (!from || !to || !/\d|[¼½¾⅛⅜⅝⅞⅓⅔]/.test(from)) return null;
  const unit = UNIT_AT_END.exec(to)?.[0];
  return [unit && !UNIT_AT_END.test(from) && !/[a-z]$/i.test(from) ? `${from} ${unit}` : from, to];
}

/** A number without a unit that fits no body in this unit and fits one in the other: asked, never converted. */
function otherUnitProblem(text: string, mm: number, measure: MeasureId, unit: LengthUnit): string | null {
  if (/[a-z"″”]/i.test(text)) return null;
  const { usualMm, name } = measureOf(measure);
  const otherMm = unit === 'cm' ? mm * 2.54 : mm / 2.54;
  const isUsual = (value: number) => value >= usualMm.from && value <= usualMm.to;
  if (isUsual(mm) || !isUsual(otherMm)) return null;
  const [now, other] = unit === 'cm' ? ['centimetres', 'in'] : ['inches', 'cm'];
  return `“${text}” is no ${name.toLowerCase()} in ${now}. If it is in the other unit, write “${text} ${other}”.`;
}

function readOne(text: string, measure: MeasureId, unit: LengthUnit): { mm: number } | { message: string } {
  const read = parseAmount(text, unit);
  if (read.kind !== 'amount') return { message: read.message };
  if (read.mm <= 0) return { message: 'A length of a chart is above 0.' };
  const asked = otherUnitProblem(text, read.mm, measure, unit);
  return asked ? { message: asked } : { mm: read.mm };
}

/**
 * Reads one cell of a size chart: a length, a range, or nothing.
 * @param unit the unit that a bare number takes
 * @returns the lengths in mm, or a sentence that says what could not be read; what was typed is the caller's to keep
 */
export function readCell(typed: string, measure: MeasureId, unit: LengthUnit): ReadCell {
  const text = typed.trim();
  if (EMPTY.has(text.toLowerCase())) return { kind: 'empty' };
  if (text.startsWith('=') || text.startsWith('#'))
    return problem('This is a formula, or its error. Paste the values instead.');
  if (text.length > CELL_MAX) return problem(`A cell has at most ${CELL_MAX} characters.`);
  const ends = endsOf(text);
  if (!ends) {
    const one = readOne(text, measure, unit);
    return 'message' in one ? problem(one.message) : { kind: 'value', value: { valueMm: one.mm, untilMm: null } };
  } // prettier-ignore
  const [from, to] = [readOne(ends[0], measure, unit), readOne(ends[1], measure, unit)];
  if ('message' in from) return problem(from.message);
  if ('message' in to) return problem(to.message);
  if (to.mm < from.mm) return problem('A range goes from the smaller to the greater length.');
  return { kind: 'value', value: { valueMm: from.mm, untilMm: to.mm === from.mm ? null : to.mm } };
}
