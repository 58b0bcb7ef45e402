import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { amountText, printAmount, type Rounding } from '@/diagnosis/units/print-amount';

interface Props {
  mm: number;
  unit: LengthUnit;
  rounding?: Rounding;
}

/** A length in the reader's unit, fractions set as fractions, read aloud as plain words. */
export function Amount({ mm, unit, rounding = 'nearest' }: Props) {
  const { whole, fraction, unit: set, isNegative } = printAmount(mm, unit, rounding);
  return (
    <span className="whitespace-nowrap">
      <span className="sr-only">{amountText(mm, unit, rounding)}</span>
      <span aria-hidden>
        {isNegative ? '−' : ''}
        {whole}
        {fraction ? (
          <span className="fraction ml-0.5">
            <span>{fraction.top}</span>⁄<span>{fraction.bottom}</span>
          </span>
        ) : null}{' '}
        {set}
      </span>
    </span>
  );
}
