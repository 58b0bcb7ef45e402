import { describe, expect, it } from 'vitest';
import { sourceWords } from '@/content/source-words';
import { FACT_SOURCES, SOURCES } from '@/content/sources';
import { trousers } from '@/diagnosis/garments/trousers';

const { dimensions, causes, signs, checks, corrections, shape, sums } = trousers;
const cited = [
  ...[dimensions, causes, signs, checks, corrections, shape, sums].flat().flatMap(({ sources }) => sources),
  ...checks.flatMap(({ outcomes }) =>
    outcomes.flatMap(({ links }) => links.flatMap(({ sources }) => sources)),
  ),
  ...corrections.flatMap(({ amounts }) => amounts?.sources ?? []),
];

describe('the sources shown to people', () => {
  it('name what stands behind every citation of the knowledge, never an id', () => {
    const unnamed = [...new Set(cited)].filter((id) => sourceWords([id]).some((words) => words === id));
    expect(unnamed).toEqual([]);
    expect(
      Object.values(FACT_SOURCES)
        .flat()
        .filter((id) => !SOURCES[id]),
    ).toEqual([]);
  });

  it('have a title and a year, and no address', () => {
    for (const { title, author, year } of Object.values(SOURCES)) {
      expect(title).not.toBe('');
      expect(year).not.toBe('');
      expect(`${title} ${author}`).not.toMatch(/https?:|www\.|\.(com|org|net|ru)\b/i);
    }
  });

  it('say what is common practice, and each source once', () => {
    expect(sourceWords(['common practice'])).toEqual(['common practice, no source']);
    expect(sourceWords(['trousers:TF054', 'trousers:TC095'])).toHaveLength(1);
  });
});
