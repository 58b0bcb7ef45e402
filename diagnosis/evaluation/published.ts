import { parseCase } from '../case';
import type { Case, CaseInput } from '../case-schema';
import { diagnose, rankCase } from '../diagnose';
import type { Correction, Knowledge } from '../garments/schema';
import type { Strengths } from '../inference/strengths';
import { POSSIBLE_FROM } from '../planning/words';
import { emptyCase } from './calibration';
import { naiveBayes } from './baselines';
import { worldOf } from './person';
import { tailsOf } from '../inference/beliefs';

/** A worked case from print, mapped to signs once, before anything was fitted. */
export interface PublishedCase {
  /** Id in the references, as `trousers:TC005`. */
  id: string;
  source: string;
  /** One of the cases that the strengths may be fitted on. */
  tuning: boolean;
  case: CaseInput;
  /** Ids of corrections and causes; any of them counts. */
  accept: string[];
  why: string;
  /** Unsolved or contradictory in print: it has to come out as doubt, or with a separating check. */
  doubtful?: boolean;
}

/** Ids of corrections and causes, best first; equal scores are ties. */
export type Ranker = (fitting: Case) => { id: string; score: number }[];

export interface RankScore {
  cases: number;
  top1: number;
  top3: number;
  missed: { id: string; place: number; first: string }[];
}

/** Shares of cases with an accepted id first, and among the first three, ties at their mean. */
export function scoreRanker(
  knowledge: Knowledge,
  cases: readonly PublishedCase[],
  ranker: Ranker,
): RankScore {
  let top1 = 0;
  let top3 = 0;
  const missed: RankScore['missed'] = [];
  for (const published of cases) {
    const ranked = ranker(parsedCase(knowledge, published));
    const [one, three] = [
      chanceWithin(ranked, published.accept, 1),
      chanceWithin(ranked, published.accept, 3),
    ];
    top1 += one;
    top3 += three;
    if (one < 1)
      missed.push({
        id: published.id,
        place: placeOf(ranked, published.accept),
        first: ranked[0]?.id ?? '-',
      });
  }
  return { cases: cases.length, top1: top1 / cases.length, top3: top3 / cases.length, missed };
}

export function parsedCase(knowledge: Knowledge, published: PublishedCase): Case {
  const result = parseCase(knowledge, published.case);
  if (!result.ok) throw new Error(`${published.id}: ${result.fault.field}: ${result.fault.message}`);
  return result.value;
}

/** Chance that an accepted id is among the first places when ties are broken at random. */
function chanceWithin(
  ranked: readonly { id: string; score: number }[],
  accept: readonly string[],
  places: number,
): number {
  let before = 0;
  while (before < places && before < ranked.length) {
    const { score } = ranked[before]!;
    const tied = ranked.slice(before).filter((other) => Math.abs(other.score - score) < 1e-9);
    const good = tied.filter(({ id }) => accept.includes(id)).length;
    if (good > 0) return 1 - missAll(tied.length, good, Math.min(tied.length, places - before));
    before += tied.length;
  }
  return 0;
}

/** Chance that `drawn` of `all` items hold none of the `good` ones. */
function missAll(all: number, good: number, drawn: number): number {
  let chance = 1;
  for (let i = 0; i < drawn; i++) chance *= Math.max(0, all - good - i) / (all - i);
  return chance;
}

/** Where the first accepted id stands, from 1; Infinity where none is ranked. */
export function placeOf(ranked: readonly { id: string }[], accept: readonly string[]): number {
  const place = ranked.findIndex(({ id }) => accept.includes(id));
  return place < 0 ? Infinity : place + 1;
}

/** The reading's own order. */
export function readingRanker(knowledge: Knowledge, strengths: Strengths): Ranker {
  return (fitting) => {
    return rankCase(knowledge, fitting, strengths).map(({ id }, place) => ({ id, score: -place }));
  };
}

/** Corrections and causes by how many of the seen signs link to what they serve. */
export function overlapRanker(knowledge: Knowledge): Ranker {
  return (fitting) => {
    const seen = fitting.signs
      .filter(({ severity }) => severity > 0)
      .map(({ sign }) => knowledge.signs.find(({ id }) => id === sign)!);
    const count = (to: string, direction?: string) =>
      seen.filter(({ links }) =>
        links.some((link) => link.to === to && (!direction || link.direction === direction)),
      ).length;
    return sorted([
      ...knowledge.causes.map(({ id }) => ({ id, score: count(id) })),
      ...knowledge.corrections.map((one) => ({
        id: one.id,
        score: Math.max(0, ...servedBy(one).map(({ dimension, direction }) => count(dimension, direction))),
      })),
    ]);
  };
}

/** Corrections and causes by what naive Bayes believes of what they serve. */
export function naiveBayesRanker(knowledge: Knowledge, strengths: Strengths): Ranker {
  return (fitting) => {
    const both = fitting.signs.map((seen) => ({ ...seen, side: 'both' as const }));
    const absent = fitting.absent.map(({ sign }) => ({
      sign,
      severity: 0,
      side: 'both' as const,
      reliability: 1,
    }));
    const plain = {
      ...emptyCase(knowledge),
      shape: fitting.shape,
      cloth: fitting.cloth,
      fittedFor: fitting.fittedFor,
    };
    const world = worldOf(knowledge, plain, strengths);
    const unique = new Map([...absent, ...both].map((seen) => [seen.sign, seen]));
    const beliefs = naiveBayes(world, [...unique.values()]);
    const { layout } = world;
    return sorted([
      ...knowledge.causes.map(({ id }, cause) => ({ id, score: beliefs[layout.ofCause[cause]!]![1]! })),
      ...knowledge.corrections.map((one) => ({
        id: one.id,
        score: Math.max(
          0,
          ...servedBy(one).map(({ dimension, direction }) => {
            const at = layout.index.dimensions.get(dimension)!;
            return tailsOf(layout, at, beliefs[layout.ofDimension[at]![0]!]!)[direction];
          }),
        ),
      })),
    ]);
  };
}

function servedBy({ vector }: Correction) {
  return vector
    .filter(({ coupling }) => !coupling)
    .map(({ dimension, perMm }) => ({
      dimension,
      direction: perMm > 0 ? ('more' as const) : ('less' as const),
    }));
}

function sorted(items: { id: string; score: number }[]): { id: string; score: number }[] {
  return items.sort((a, b) => b.score - a.score);
}

/** Doubtful cases that come out neither as doubt nor with a check to ask first. */
export function wronglySure(
  knowledge: Knowledge,
  cases: readonly PublishedCase[],
  strengths: Strengths,
): string[] {
  return cases
    .filter(({ doubtful }) => doubtful)
    .filter((published) => {
      const { doubt, checks, needs } = diagnose(knowledge, parsedCase(knowledge, published), strengths);
      return doubt.level === 'none' && checks.length === 0 && needs[0]!.probability >= POSSIBLE_FROM;
    })
    .map(({ id }) => id);
}
