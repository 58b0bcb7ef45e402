import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { calibrate } from '../diagnosis/evaluation/calibration';
import { closedLoop, perturbed } from '../diagnosis/evaluation/closed-loop';
import { leaveSourcesOut } from '../diagnosis/evaluation/fit';
import {
  naiveBayesRanker,
  overlapRanker,
  readingRanker,
  scoreRanker,
  wronglySure,
} from '../diagnosis/evaluation/published';
import type { Ranker, RankScore } from '../diagnosis/evaluation/published';
import { Random } from '../diagnosis/evaluation/random';
import { timeReadings } from '../diagnosis/evaluation/speed';
import { trousers } from '../diagnosis/garments/trousers';
import { STRENGTHS, STRENGTHS_BEFORE } from '../diagnosis/inference/strengths';
import { engineVersion } from '../diagnosis/version';
import { publishedCases } from '../tests/reference/cases/published';
import { absorptionErrorOf, exactnessOf, longSumErrorOf } from '../tests/support/exactness';

/** `npm run evaluate [-- part ...]`: everything the diagnosis is held to, in full size, as tables and as data/evaluation.json. */

const FULL = { models: 10_000, sums: 200, absorptions: 50, fittings: 1000, persons: 500, drawings: 1000 };
const SEEDS = [1, 2, 3];

function heading(text: string): void {
  console.log(`\n${text}`);
}

function exactness() {
  heading('Exactness: greatest absolute error of any belief against enumeration');
  const random = new Random(2026);
  const exact = Math.max(...Array.from({ length: FULL.models }, () => exactnessOf(random, 0.01)));
  const sums = Array.from({ length: FULL.sums }, () => longSumErrorOf(random)).sort((a, b) => a - b);
  const absorbed = Array.from({ length: FULL.absorptions }, () => absorptionErrorOf(random))
    .filter((one) => one.absorbed)
    .map(({ error }) => error)
    .sort((a, b) => a - b);
  const rows = [
    { what: `${FULL.models} models, exact elimination`, worst: exact, median: exact, bar: 1e-12 },
    {
      what: `${FULL.sums} sums of three needs, messages`,
      worst: sums.at(-1),
      median: middle(sums),
      bar: 0.03,
    },
    {
      what: `${absorbed.length} crowded drawings, weakest absorbed`,
      worst: absorbed.at(-1),
      median: middle(absorbed),
    },
  ];
  console.table(rows);
  return rows;
}

function percent(share: number): string {
  return `${(100 * share).toFixed(1)} %`;
}

function middle(ascending: readonly number[]): number | undefined {
  return ascending[Math.floor(ascending.length / 2)];
}

function calibration() {
  heading('Calibration by simulation (tests the code, not the knowledge)');
  const results = SEEDS.map((seed) => calibrate(trousers, STRENGTHS, seed, FULL.fittings));
  console.table(
    results.map(({ rankP: _, curve: __, ...row }) => ({
      ...row,
      betterByNats: row.naiveBayesLossNats - row.lossNats,
    })),
  );
  return results;
}

function published() {
  heading('Published cases');
  const tuning = publishedCases.filter((one) => one.tuning);
  const rankers: [string, Ranker][] = [
    ['the reading', readingRanker(trousers, STRENGTHS)],
    ['overlap count', overlapRanker(trousers)],
    ['naive Bayes', naiveBayesRanker(trousers, STRENGTHS)],
  ];
  const scores = rankers.map(([ranker, rank]): { ranker: string } & RankScore => ({
    ranker,
    ...scoreRanker(trousers, tuning, rank),
  }));
  console.table(scores.map(({ missed: _, ...row }) => row));
  heading('Cases whose accepted change is not first in the reading');
  console.table(scores[0]!.missed);
  const left = leaveSourcesOut(trousers, tuning, STRENGTHS_BEFORE);
  heading(`Fitted without the source of the case (${left.sources} sources): first in ${percent(left.top1)}`);
  const sure = wronglySure(trousers, publishedCases, STRENGTHS);
  heading(`Doubtful cases read without doubt: ${sure.length === 0 ? 'none' : sure.join(', ')}`);
  return { scores, leaveOneSourceOut: left, sure };
}

function loop() {
  heading('Closed loop: mean rounds until every true need is within its tolerance');
  const results = [
    ['as fitted', closedLoop(trousers, 7, FULL.persons)] as const,
    ['strengths off by 30 %', closedLoop(trousers, 8, FULL.persons, perturbed(STRENGTHS, 0.3, 8))] as const,
  ];
  console.table(
    results.flatMap(([world, { reading, book, ratio }]) => [
      { world, by: 'the reading', ...reading, ratio },
      { world, by: 'the first thing in the book', ...book },
    ]),
  );
  return Object.fromEntries(results);
}

function speed() {
  heading('Speed, ms');
  const random = new Random(99);
  const zones = [...new Set(trousers.signs.map(({ zone }) => zone))].map((zone) =>
    trousers.signs.filter((sign) => sign.zone === zone),
  );
  const crowded = zones.reduce((most, zone) => (zone.length > most.length ? zone : most));
  const everywhere = () => trousers.signs;
  const rows = [
    ...[6, 12, 16].map((positives) => ({ name: 'spread', positives, from: everywhere, drawings: 200 })),
    {
      name: 'inside one zone',
      positives: crowded.length,
      from: (r: Random) => r.pick(zones),
      drawings: FULL.drawings,
    },
    { name: 'every sign there is', positives: trousers.signs.length, from: everywhere, drawings: 5 },
  ].map((row) => timeReadings(trousers, () => performance.now(), random, row.drawings, row));
  console.table(
    rows.map(({ drawing, positives, readMs, firstMs, finishMs }) => ({
      drawing,
      positives,
      read: readMs.median.toFixed(2),
      readWorst: readMs.worst.toFixed(1),
      first: firstMs.median.toFixed(2),
      firstWorst: firstMs.worst.toFixed(1),
      finish: finishMs.median.toFixed(1),
      finishWorst: finishMs.worst.toFixed(1),
    })),
  );
  return rows;
}

const PARTS = { exactness, calibration, published, loop, speed };
type Part = keyof typeof PARTS;

/** Parts named on the command line, or all of them. */
function chosenParts(named: readonly string[]): Part[] {
  const all = Object.keys(PARTS) as Part[];
  const unknown = named.filter((name) => !all.includes(name as Part));
  if (unknown.length > 0) {
    console.error(`no part called ${unknown.join(', ')}; there are: ${all.join(', ')}`);
    process.exit(2);
  }
  return named.length === 0 ? all : all.filter((part) => named.includes(part));
}

const parts = chosenParts(process.argv.slice(2));
const figures = Object.fromEntries(parts.map((part) => [part, PARTS[part]()]));
const folder = path.join(import.meta.dirname, '..', 'data');
mkdirSync(folder, { recursive: true });
writeFileSync(
  path.join(folder, 'evaluation.json'),
  `${JSON.stringify({ engine: engineVersion(trousers), ...figures }, null, 2)}\n`,
);
console.log(`\nWritten to ${path.join('data', 'evaluation.json')}`);
