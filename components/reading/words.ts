import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { amountText } from '@/diagnosis/units/print-amount';

export const sideWords = (side: 'left' | 'right' | 'both') => (side === 'both' ? '' : `, your ${side}`);

/** A range in plain words: "about 10 to 16 mm", each end on a mark of the tape; one number where the ends meet. */
export function rangeWords([low, high]: readonly [number, number], unit: LengthUnit): string {
  const from = amountText(Math.max(0, low), unit);
  const to = amountText(high, unit);
  if (from === to) return `about ${to}`;
  const [fromUnit, toUnit] = [from.split(' ').at(-1), to.split(' ').at(-1)];
  const bare = fromUnit === toUnit ? from.slice(0, from.lastIndexOf(' ')) : from;
  return `about ${bare} to ${to}`;
}
