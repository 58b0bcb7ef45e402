import { isMeasureId } from '@/diagnosis/measuring/measures';
import { amountText } from '@/diagnosis/units/print-amount';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import type { Sitting } from './sitting';

/** A kept sitting as it can be copied: what was typed, its unit written out where it was bare, takes in order. */
export function sittingOf(
  values: readonly { measure: string; take: number; valueMm: number; typed: string }[],
  unit: LengthUnit,
): Sitting {
  const sitting: Sitting = {};
  for (const { measure, typed, valueMm } of values.toSorted((a, b) => a.take - b.take)) {
    if (!isMeasureId(measure)) continue;
    // A bare number may have been typed in the other unit: the length itself is what is copied.
    const text = /[a-z"″”]/i.test(typed) ? typed : amountText(valueMm, unit);
    sitting[measure] = [...(sitting[measure] ?? []), text];
  }
  return sitting;
}
