import type { ChartCell, ChartKind } from '@/diagnosis/chart/chart';
import { MEASURES } from '@/diagnosis/measuring/measures';
import { amountText } from '@/diagnosis/units/print-amount';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';

/** A bare number may have been typed under another unit than the reader's: then the length is written out. */
const cellText = ({ typed, valueMm, untilMm }: ChartCell, unit: LengthUnit): string =>
  /[a-z"″”]/i.test(typed)
    ? typed
    : [valueMm, ...(untilMm === null ? [] : [untilMm])].map((mm) => amountText(mm, unit)).join(' – ');

/** A kept table as text again, to be changed: a row for each size, tabs between. Empty where there is none. */
export function keptText(
  cells: readonly (ChartCell & { kind: ChartKind })[],
  kind: ChartKind,
  unit: LengthUnit,
): string {
  const own = cells.filter((cell) => cell.kind === kind);
  if (own.length === 0) return '';
  const measures = MEASURES.filter(({ id }) => own.some(({ measure }) => measure === id));
  const rows = [...new Set(own.map(({ size }) => size))].map((size) => [
    size,
    ...measures.map(({ id }) => {
      const cell = own.find((one) => one.size === size && one.measure === id);
      return cell ? cellText(cell, unit) : '';
    }),
  ]);
  return [['Size', ...measures.map(({ name }) => name)], ...rows].map((row) => row.join('\t')).join('\n');
}
