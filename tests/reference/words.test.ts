import { describe, expect, it } from 'vitest';
import { trousers } from '@/diagnosis/garments/trousers';
import { findSigns } from '@/diagnosis/words/search';
import { heldOut, tuned } from './cases/phrases';

const pairsOf = (phrases: typeof tuned) =>
  Object.entries(phrases).flatMap(([sign, said]) => said.map((phrase) => ({ sign, phrase })));

const isFound = ({ sign, phrase }: { sign: string; phrase: string }) =>
  findSigns(trousers, phrase)
    .slice(0, 3)
    .some((found) => found.sign === sign);

/** Two letters of the longest word change places: the commonest slip of a thumb. */
function slipped(phrase: string): string {
  const longest = phrase.split(' ').reduce((most, word) => (word.length > most.length ? word : most));
  const at = Math.floor(longest.length / 2);
  return phrase.replace(
    longest,
    longest.slice(0, at - 1) + longest[at] + longest[at - 1] + longest.slice(at + 1),
  );
}

describe('everyday words', () => {
  it('are 400 phrases and more, some for every sign', () => {
    expect(pairsOf(tuned).length + pairsOf(heldOut).length).toBeGreaterThanOrEqual(400);
    for (const { id } of trousers.signs)
      expect([...(tuned[id] ?? []), ...(heldOut[id] ?? [])], id).not.toEqual([]);
  });

  it.each([
    ['looked at when search was set', tuned],
    ['held out', heldOut],
  ] as const)('find the sign they mean among the first three in 95 %%: those %s', (_, phrases) => {
    const pairs = pairsOf(phrases);
    const missed = pairs.filter((pair) => !isFound(pair));
    expect(missed.length / pairs.length, JSON.stringify(missed)).toBeLessThanOrEqual(0.05);
  });

  it('find it in 90 % still when two letters have changed places', () => {
    const pairs = pairsOf(tuned).map(({ sign, phrase }) => ({ sign, phrase: slipped(phrase) }));
    expect(pairs.filter(isFound).length / pairs.length).toBeGreaterThanOrEqual(0.9);
  });

  it('never find anything for words that are not of sewing', () => {
    expect(findSigns(trousers, 'quarterly invoice 2026 xyzzy')).toEqual([]);
  });

  it('answer a long or empty phrase at once', () => {
    const started = performance.now();
    expect(findSigns(trousers, '')).toEqual([]);
    findSigns(trousers, 'pulling lines '.repeat(10_000));
    expect(performance.now() - started).toBeLessThan(200);
  });
});
