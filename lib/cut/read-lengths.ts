import 'server-only';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { readAmount } from '@/lib/request/read-amount';

/** Lengths by name, each read as it was typed; a 422 names the one that could not be. */
export function readLengths(
  typed: Partial<Record<string, { typed: string; unit: LengthUnit }>>,
): Record<string, { mm: number; typed: string }> {
  return Object.fromEntries(
    Object.entries(typed).flatMap(([key, amount]) => (amount ? [[key, readAmount(amount, key)]] : [])),
  );
}
