import type { Word } from '../reading';

export const LIKELY_FROM = 0.7;
export const POSSIBLE_FROM = 0.35;

/** Words, not false precision. Without a check or a measurement nothing is called more than possible. */
export function wordOf(probability: number, capped: boolean): Word {
  if (probability >= LIKELY_FROM && !capped) return 'likely';
  return probability >= POSSIBLE_FROM ? 'possible' : 'less likely';
}
