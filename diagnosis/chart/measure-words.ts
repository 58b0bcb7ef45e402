import type { LengthUnit } from '../units/parse-amount';
import type { MeasureId } from '../measuring/measures';

/** Words that charts print for a measure, longest first within a measure. Trade words of several countries. */
const WORDS: readonly (readonly [MeasureId, RegExp])[] = [
  ['waist-to-hip', /\bwaist to hip\b|\bhip depth\b/],
  ['high-hip', /\b(high|upper) hips?\b|\babdomen\b|\btummy\b/],
  [
    'front-crotch-length',
    /\bfront (rise|crotch( length| seam)?)\b|\b(rise|crotch( length| seam)?),? front\b/,
  ],
  ['back-crotch-length', /\bback (rise|crotch( length| seam)?)\b|\b(rise|crotch( length| seam)?),? back\b/],
  ['crotch-length', /\b(total |full |whole )?crotch length\b|\bu rise\b/],
  ['seated-depth', /\b(crotch depth|body rise|depth of crotch|seated depth)\b|^rise$/],
  ['inseam', /\b(inseam|inside leg|inner leg|inleg)\b/],
  ['outseam', /\b(outseam|outside leg|outer leg|side length|side seam)\b/],
  ['thigh', /\bthighs?\b|\bupper leg\b/],
  ['knee', /\bknees?\b/],
  ['calf', /\bcal(f|ves)\b/],
  ['ankle', /\bankles?\b/],
  ['instep', /\binstep\b/],
  ['height', /\b(height|stature)\b/],
  ['hip', /\b(full )?hips?\b|\bseat\b/],
  ['waist', /\bwaist\b/],
];

const plainWords = (text: string): string =>
  text
    .toLowerCase()
    .normalize('NFKC')
    .replace(/\([^)]*\)|\[[^\]]*\]/g, ' ')
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();

/** The measure that a heading names, or null. `Hips (cm)`, `Inside leg`, `Front rise`; a name of Ruckle's own always. */
export function measureNamed(text: string): MeasureId | null {
  const words = plainWords(text);
  if (words === '' || words.length > 60) return null;
  return WORDS.find(([, pattern]) => pattern.test(words))?.[0] ?? null;
}

/** The unit that a heading or a title states, or null: `Waist (in)`, `cm`, `all in inches`. */
export function unitNamed(text: string): LengthUnit | null {
  const words = text.toLowerCase();
  const isCm = /\b(cm|centimet(er|re)s?)\b/.test(words);
  const isInch = /\b(inch(es)?)\b|[([]\s*(in\.?|")\s*[)\]]|(^|[\s,/])in\.?$/.test(words);
  if (isCm === isInch) return null;
  return isCm ? 'cm' : 'in';
}

/** A heading for the sizes themselves. */
export const isSizeWord = (text: string): boolean => /^(sizes?|label|name|uk|us|eu|fr|de|it)?$/.test(plainWords(text)); // prettier-ignore
