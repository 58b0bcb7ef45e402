import type { Measured } from '../case-schema';
import type { Difference } from './flat-check';

/** A difference as evidence of a reading: the same sum of needs, its length and its error, with its label. */
export function measuredOf({ name, needMm, sdMm, terms }: Difference): { label: string } & Measured {
  return { label: name, needMm, sdMm, terms: terms.map((term) => ({ ...term })) };
}
