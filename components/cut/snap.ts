import { tickMm } from '@/diagnosis/units/print-amount';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';

/** To the tick of the reader's tape: cloth that is added goes up, cloth that is taken down, for it can be taken again. */
export function snapMm(mm: number, unit: LengthUnit, isAdded: boolean): number {
  const tick = tickMm(unit, mm);
  // A hair of tolerance, so that a whole tick that went through a division stays one.
  return (isAdded ? Math.ceil(mm / tick - 1e-9) : Math.floor(mm / tick + 1e-9)) * tick;
}
