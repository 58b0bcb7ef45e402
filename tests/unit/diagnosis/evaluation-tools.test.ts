import { describe, expect, it } from 'vitest';
import { calibrate } from '@/diagnosis/evaluation/calibration';
import { closedLoop } from '@/diagnosis/evaluation/closed-loop';
import { fitStrengths, meanReciprocalPlace } from '@/diagnosis/evaluation/fit';
import {
  naiveBayesRanker,
  overlapRanker,
  parsedCase,
  readingRanker,
  scoreRanker,
} from '@/diagnosis/evaluation/published';
import type { PublishedCase } from '@/diagnosis/evaluation/published';
import { STRENGTHS } from '@/diagnosis/inference/strengths';
import { GRADES } from '@/diagnosis/garments/schema';
import { small } from '@/tests/support/small-knowledge';

/** Cases of the invented garment, mapped as printed ones are. */
const cases: PublishedCase[] = [
  {
    id: 'trousers:TC001',
    source: 'trousers:S01',
    tuning: true,
    case: { garment: 'smock', signs: [{ sign: 'seat-lines', severity: 2 }] },
    accept: ['add-seat'],
    why: 'lines across the seat',
  },
  {
    id: 'trousers:TC002',
    source: 'trousers:S02',
    tuning: true,
    case: {
      garment: 'smock',
      signs: [{ sign: 'fork-lines', severity: 2 }],
      causes: { absent: ['untrimmed'] },
    },
    accept: ['add-depth'],
    why: 'the weaker of two links',
  },
];

describe('scoring of published cases', { timeout: 60_000 }, () => {
  it('counts a place, and shares a tie', () => {
    const fixed = (scores: Record<string, number>) => () =>
      Object.entries(scores).map(([id, score]) => ({ id, score }));
    const one = cases.slice(0, 1);
    expect(scoreRanker(small, one, fixed({ 'add-seat': 2, 'add-depth': 1 }))).toMatchObject({
      top1: 1,
      top3: 1,
    });
    expect(scoreRanker(small, one, fixed({ 'add-depth': 2, 'add-seat': 2 }))).toMatchObject({
      top1: 0.5,
      top3: 1,
    });
    expect(scoreRanker(small, one, fixed({ a: 4, b: 3, c: 2, 'add-seat': 1 }))).toMatchObject({
      top1: 0,
      top3: 0,
    });
    const four = { a: 1, b: 1, c: 1, 'add-seat': 1 };
    expect(scoreRanker(small, one, fixed(four)).top3).toBeCloseTo(0.75, 12);
  });

  it('names what was missed, and where it stood', () => {
    const { missed } = scoreRanker(small, cases, readingRanker(small, STRENGTHS));
    expect(missed).toEqual([{ id: 'trousers:TC002', place: 2, first: 'add-point' }]);
  });

  it('runs the simple rivals on the same evidence', () => {
    expect(overlapRanker(small)(parsedOf(0))[0]!.score).toBe(1);
    const [best] = naiveBayesRanker(small, STRENGTHS)(parsedOf(0));
    expect(best!.id).toBe('add-seat');
  });

  it('fits the common numbers within their order and range, and never to a worse place', () => {
    const fitted = fitStrengths(small, cases, STRENGTHS, 1);
    expect(meanReciprocalPlace(small, cases, fitted)).toBeGreaterThanOrEqual(
      meanReciprocalPlace(small, cases, STRENGTHS),
    );
    GRADES.slice(1).forEach((grade, i) =>
      expect(fitted.grade[GRADES[i]!]).toBeGreaterThan(fitted.grade[grade]),
    );
  });
});

function parsedOf(place: number) {
  return parsedCase(small, cases[place]!);
}

describe('hidden persons', { timeout: 60_000 }, () => {
  it('give calibrated beliefs on the invented garment', () => {
    const result = calibrate(small, STRENGTHS, 1, 300);
    expect(result.leastP).toBeGreaterThan(0.0004);
    expect(result.calibrationError).toBeLessThanOrEqual(0.03);
  });

  it('show a wrong model by their ranks', () => {
    const sure = {
      ...STRENGTHS,
      grade: { defining: 0.95, strong: 0.94, usual: 0.93, sometimes: 0.92, rare: 0.91 },
    };
    const right = calibrate(small, STRENGTHS, 2, 300);
    const wrong = calibrate(small, STRENGTHS, 2, 300, sure);
    expect(wrong.calibrationError).toBeGreaterThan(1.5 * right.calibrationError);
  });

  it('are the same for the same seed', () => {
    expect(closedLoop(small, 3, 5)).toEqual(closedLoop(small, 3, 5));
  });
});
