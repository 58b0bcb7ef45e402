import 'server-only';
import type { Millimetres } from '@/diagnosis/units/millimetres';
import { type LengthUnit, parseAmount } from '@/diagnosis/units/parse-amount';
import { Problem } from './problem';

/** The length that was typed, or a 422 that names the field. */
export function readAmount(
  amount: { typed: string; unit: LengthUnit },
  field: string,
): { mm: Millimetres; typed: string } {
  const parsed = parseAmount(amount.typed, amount.unit);
  if (parsed.kind === 'amount') return { mm: parsed.mm, typed: parsed.typed };
  throw new Problem(422, 'invalid', parsed.message, { fields: { [field]: [parsed.message] } });
}
