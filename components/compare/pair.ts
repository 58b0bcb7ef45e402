import { z } from 'zod';

const number = z.coerce.number().int().positive();

/**
 * The two rounds to lay side by side, from the page's address: the earlier first; the last two where the address names none or
 * one that is not there. Null when there are not two rounds.
 */
export function pairOf<T extends { number: number }>(
  rounds: T[],
  query: Record<string, string | string[] | undefined>,
): { before: T; after: T } | null {
  const last = rounds.at(-1);
  const secondLast = rounds.at(-2);
  if (!last || !secondLast) return null;
  const find = (value: string | string[] | undefined) => {
    const parsed = number.safeParse(value);
    return parsed.success ? rounds.find((round) => round.number === parsed.data) : undefined;
  };
  const after = find(query.b) ?? last;
  const before = find(query.a) ?? (after === secondLast ? last : secondLast);
  if (before === after) return { before: secondLast, after: last };
  return before.number < after.number ? { before, after } : { before: after, after: before };
}
