import { type Millimetres, toMillimetres } from './millimetres';

export type LengthUnit = 'cm' | 'in';

export const MM_PER_INCH = 25.4; // exact: international inch, 1959
const MM_PER: Record<string, number> = { mm: 1, cm: 10, m: 1000, in: MM_PER_INCH, ft: 12 * MM_PER_INCH };
const TYPED_MAX = 24;

export type ParsedAmount =
  | { kind: 'amount'; mm: Millimetres; typed: string; unit: 'mm' | 'cm' | 'm' | 'in' | 'ft' }
  | { kind: 'two-readings'; message: string }
  | { kind: 'unreadable'; message: string };

const GLYPHS: Record<string, string> = {
  '¼': '1/4', '½': '1/2', '¾': '3/4', '⅛': '1/8', '⅜': '3/8', '⅝': '5/8', '⅞': '7/8',
  '⅓': '1/3', '⅔': '2/3', '⅙': '1/6', '⅚': '5/6', '⅕': '1/5', '⅖': '2/5', '⅗': '3/5', '⅘': '4/5',
}; // prettier-ignore

const UNIT_WORDS: Record<string, 'mm' | 'cm' | 'm' | 'in' | 'ft'> = {
  mm: 'mm', millimetre: 'mm', millimetres: 'mm', millimeter: 'mm', millimeters: 'mm',
  cm: 'cm', centimetre: 'cm', centimetres: 'cm', centimeter: 'cm', centimeters: 'cm',
  m: 'm', metre: 'm', metres: 'm', meter: 'm', meters: 'm',
  in: 'in', inch: 'in', inches: 'in', '"': 'in', ft: 'ft', foot: 'ft', feet: 'ft', "'": 'ft',
}; // prettier-ignore

/** Quotes of every keyboard, the fraction slash, the minus sign and fraction glyphs, brought to plain characters. */
function plain(text: string): string {
  return text
    .normalize('NFC')
    .replace(/[¼½¾⅛⅜⅝⅞⅓⅔⅙⅚⅕⅖⅗⅘]/g, (glyph) => ` ${GLYPHS[glyph]}`)
    .replace(/[″”“]|''/g, '"')
    .replace(/[′’‘]/g, "'")
    .replace(/[⁄∕]/g, '/')
    .replace(/[−–—]/g, '-')
    .replace(/[\s\u00a0\u202f]+/g, ' ')
    .trim()
    .toLowerCase();
}

const NUMBER = /^(?:(\d+)(?: |-|(?=\d+\/)))?(\d+)\/(\d+)$|^\d+(?:[.,]\d+)?$|^[.,]\d+$/;
const TWO_SEPARATORS = /\d[.,]\d{3}[.,]\d|\d[.,]\d{3}[.,]\d{3}/;

function numberOf(text: string): number | null {
  const found = NUMBER.exec(text);
  if (!found) return null;
  const [, whole, top, bottom] = found;
  if (top && bottom) return Number(bottom) === 0 ? null : Number(whole ?? 0) + Number(top) / Number(bottom);
  return Number(text.replace(',', '.'));
}

/**
 * Reads an amount as a person types it: `1 3/8`, `1⅜"`, `3,5 cm`, `35mm`, `.5`, `1-3/8 in`.
 * @param text what was typed, at most 24 characters
 * @param unit the unit a bare number takes; nothing is ever converted on suspicion
 * @returns millimetres ≥ 0 with what was typed, or a sentence that says what could not be read
 */
export function parseAmount(text: string, unit: LengthUnit): ParsedAmount {
  const typed = text.trim();
  if (typed === '') return { kind: 'unreadable', message: 'Type a length, for example 12 mm or 1/2 in.' };
  if (typed.length > TYPED_MAX)
    return { kind: 'unreadable', message: `A length has at most ${TYPED_MAX} characters.` };
  const read = plain(typed);
  if (TWO_SEPARATORS.test(read)) {
    return {
      kind: 'two-readings',
      message: `“${typed}” can be read in two ways. Leave out the mark between thousands: 1234.5 or 1234,5.`,
    };
  }
  if (read.startsWith('-')) return { kind: 'unreadable', message: 'A length is not below zero.' };
  const parts = /^([\d\s./,-]+?) ?([a-z]+|"|')?\.?$/.exec(read);
  const value = parts?.[1] === undefined ? null : numberOf(parts[1].trim());
  const named = parts?.[2];
  const known = named === undefined ? unit : UNIT_WORDS[named];
  if (value === null || !known) {
    return {
      kind: 'unreadable',
      message: `“${typed}” is not a length. Write it like 12 mm, 3.5 cm or 1 3/8 in.`,
    };
  }
  const mm = value * (MM_PER[known] ?? 1);
  if (mm > 9999) return { kind: 'unreadable', message: 'That is longer than anything on a pattern piece.' };
  return { kind: 'amount', mm: toMillimetres(mm), typed, unit: known };
}
