import { describe, expect, it } from 'vitest';
import {
  naiveBayesRanker,
  overlapRanker,
  readingRanker,
  scoreRanker,
  wronglySure,
} from '@/diagnosis/evaluation/published';
import { trousers } from '@/diagnosis/garments/trousers';
import { STRENGTHS } from '@/diagnosis/inference/strengths';
import { publishedCases } from './cases/published';

const tuning = publishedCases.filter((one) => one.tuning);
const reading = scoreRanker(trousers, tuning, readingRanker(trousers, STRENGTHS));

describe('published cases', { timeout: 60_000 }, () => {
  // Two miss the first three: 061, which print left as it was, and 080, where print names length for lines that most print
  // reads as a short point. Neither is mended by other common numbers.
  it('have a correction that print accepts first in at least 80 %, among the first three in 94 %', () => {
    expect(reading.top1).toBeGreaterThanOrEqual(0.8);
    expect(reading.top3).toBeGreaterThanOrEqual(0.94);
  });

  it('are ranked at least 15 points better than by counting overlaps, and no worse than by naive Bayes', () => {
    const overlap = scoreRanker(trousers, tuning, overlapRanker(trousers));
    const bayes = scoreRanker(trousers, tuning, naiveBayesRanker(trousers, STRENGTHS));
    expect(reading.top1 - overlap.top1).toBeGreaterThanOrEqual(0.15);
    expect(reading.top1).toBeGreaterThanOrEqual(bayes.top1);
  });

  it('that print leaves open come out as doubt or with a check to do first', () => {
    expect(wronglySure(trousers, publishedCases, STRENGTHS)).toEqual([]);
  });
});
