import { type LengthUnit, MM_PER_INCH } from './parse-amount';

/** An amount as it is set in type: a whole, a fraction in lowest terms, or a decimal, and the unit's short name. */
export interface PrintedAmount {
  whole: string;
  fraction: { top: number; bottom: number } | null;
  unit: 'mm' | 'cm' | 'in';
  isNegative: boolean;
}

export type Rounding = 'nearest' | 'up' | 'down';

const ROUND: Record<Rounding, (x: number) => number> = {
  nearest: Math.round,
  // A hair of tolerance, so that 12.7 mm taken through a division is still four eighths.
  up: (x) => Math.ceil(x - 1e-9),
  down: (x) => Math.floor(x + 1e-9),
};

const divisor = (a: number, b: number): number => (b === 0 ? a : divisor(b, a % b));

/** The marks on the tape: a sixteenth of an inch below 2 in, an eighth above; a millimetre. */
export const tickMm = (unit: LengthUnit, mm: number): number =>
  unit === 'cm' ? 1 : MM_PER_INCH / (Math.abs(mm) < MM_PER_INCH * 2 ? 16 : 8);

/**
 * @param mm a finite length in millimetres
 * @param unit the reader's unit; metric amounts below 100 mm are set in mm, longer ones in cm
 * @param rounding to the tick: needs for cloth go up, takings go down (cloth can be taken in, not let out)
 */
export function printAmount(mm: number, unit: LengthUnit, rounding: Rounding = 'nearest'): PrintedAmount {
  const isNegative = mm < 0;
  const size = Math.abs(mm);
  const ticks = ROUND[rounding](size / tickMm(unit, mm));
  if (unit === 'cm') {
    const isLong = size >= 100;
    return {
      whole: isLong ? (ticks / 10).toFixed(1).replace(/\.0$/, '') : String(ticks),
      fraction: null,
      unit: isLong ? 'cm' : 'mm',
      isNegative: isNegative && ticks > 0,
    };
  }
  const perInch = Math.round(MM_PER_INCH / tickMm(unit, mm));
  const whole = Math.floor(ticks / perInch);
  const rest = ticks - whole * perInch;
  const common = divisor(rest, perInch);
  return {
    whole: whole === 0 && rest > 0 ? '' : String(whole),
    fraction: rest === 0 ? null : { top: rest / common, bottom: perInch / common },
    unit: 'in',
    isNegative: isNegative && ticks > 0,
  };
}

/** The same in one plain string: `1 3/8 in`, `12 mm`, `37.5 cm`. For titles, CSV and screen readers. */
export function amountText(mm: number, unit: LengthUnit, rounding: Rounding = 'nearest'): string {
  const { whole, fraction, unit: set, isNegative } = printAmount(mm, unit, rounding);
  const parts = [whole, fraction ? `${fraction.top}/${fraction.bottom}` : ''].filter(Boolean).join(' ');
  return `${isNegative ? '−' : ''}${parts} ${set}`;
}
