import type { Case, PastRound } from '../case-schema';
import { startReading } from '../diagnose';
import type { Correction, Grade, Knowledge } from '../garments/schema';
import { variablesFor } from '../inference/layout';
import type { Layout } from '../inference/layout';
import { STRENGTHS } from '../inference/strengths';
import type { Strengths } from '../inference/strengths';
import { emptyCase } from './calibration';
import { drawNeeds, lookAtSigns, stateOf, worldOf } from './person';
import type { World } from './person';
import { Random } from './random';

const ROUNDS_MAX = 20;
const NOTICED = 0.8;
const CUTTING_SD_MM = 2;

export interface LoopResult {
  persons: number;
  /** Mean rounds until every true need is within its tolerance (those never reached count the most rounds). */
  meanRounds: number;
  unsolvedShare: number;
  /** Mean number of needs left beyond their tolerance that were not so at first, or on the other side. */
  overCorrected: number;
}

/** A change that is proposed for a round: the correction and its amount in its own basis, mm. */
interface Proposal {
  correction: Correction;
  amountMm: number;
}

interface Answer {
  proposals: Proposal[];
  /** Causes that are no lengths and rank first: the person sees to them, and finds that they were not it. */
  settled: string[];
}

type Fitter = (fitting: Case) => Answer;

/** Hidden persons are fitted round after round by the reading's plan and by the first thing in the book, from the same starts. */
export function closedLoop(
  knowledge: Knowledge,
  seed: number,
  persons: number,
  truth: Strengths = STRENGTHS,
): { reading: LoopResult; book: LoopResult; ratio: number } {
  const reading = runLoop(knowledge, seed, persons, truth, planFitter(knowledge));
  const book = runLoop(knowledge, seed, persons, truth, bookFitter(knowledge));
  return { reading, book, ratio: reading.meanRounds / book.meanRounds };
}

/** Strengths with every grade moved by up to a share of itself. */
export function perturbed(strengths: Strengths, share: number, seed: number): Strengths {
  const random = new Random(seed);
  const grade = Object.fromEntries(
    Object.entries(strengths.grade).map(([name, q]) => [
      name,
      Math.min(0.98, q * (1 + share * random.between(-1, 1))),
    ]),
  ) as Record<Grade, number>;
  return { ...strengths, grade };
}

function runLoop(
  knowledge: Knowledge,
  seed: number,
  persons: number,
  truth: Strengths,
  fitter: Fitter,
): LoopResult {
  const rounds: number[] = [];
  let unsolved = 0;
  let over = 0;
  for (let person = 0; person < persons; person++) {
    // Each person has random numbers of their own, so that both fitters meet the same people.
    const random = new Random(seed * 100_003 + person);
    const world = worldOf(knowledge, emptyCase(knowledge), truth);
    const start = drawNeeds(random, world, 1 + random.below(4));
    const { taken, end } = fitOne(random, world, start, fitter);
    rounds.push(taken);
    if (taken >= ROUNDS_MAX) unsolved++;
    over += end.filter((z, v) => isBeyond(world.layout, v, z) && !(z * start[v]! > 0)).length;
  }
  return {
    persons,
    meanRounds: rounds.reduce((a, b) => a + b, 0) / persons,
    unsolvedShare: unsolved / persons,
    overCorrected: over / persons,
  };
}

function fitOne(random: Random, world: World, start: readonly number[], fitter: Fitter) {
  const { layout } = world;
  const zs = [...start];
  const empty = emptyCase(layout.index.knowledge);
  const history: PastRound[] = [];
  const toSolve = start.flatMap((z, v) => (z !== 0 ? [v] : []));
  const absent: string[] = [];
  let taken = 0;
  while (taken < ROUNDS_MAX && toSolve.some((v) => isBeyond(layout, v, zs[v]!))) {
    const states = zs.map((z, v) => (layout.variables[v]!.kind === 'need' ? stateOf(z) : 0));
    const signs = lookAtSigns(random, world, states, NOTICED);
    const { proposals, settled } = fitter({ ...empty, signs, history, causes: { present: [], absent } });
    absent.push(...settled);
    const changes = proposals.map(({ correction, amountMm }) => {
      const madeMm = Math.max(0.5, amountMm + CUTTING_SD_MM * random.normal());
      apply(layout, zs, correction, madeMm);
      return { correction: correction.id, side: 'both' as const, amountMm, basis: null };
    });
    history.push({ signs, absent: [], measured: [], tests: [], changes, next: 're-baste' });
    taken++;
  }
  return { taken, end: zs };
}

function isBeyond(layout: Layout, variable: number, z: number): boolean {
  const own = layout.variables[variable]!;
  if (own.kind === 'cause') return false;
  return Math.abs(z) * layout.scaleMm[own.dimension]! > layout.toleranceMm[own.dimension]!;
}

function apply(layout: Layout, zs: number[], { vector }: Correction, amountMm: number): void {
  for (const { dimension, perMm } of vector) {
    const at = layout.index.dimensions.get(dimension)!;
    for (const variable of variablesFor(layout, at, 'both'))
      zs[variable]! -= (perMm * amountMm) / layout.scaleMm[at]!;
  }
}

/** Does what the reading plans. */
function planFitter(knowledge: Knowledge): Fitter {
  return (fitting) => {
    const { plan, ranked } = startReading(knowledge, fitting).first;
    const proposals = plan.flatMap(({ correction, amountMm }) =>
      amountMm === null
        ? []
        : [{ correction: knowledge.corrections.find(({ id }) => id === correction)!, amountMm }],
    );
    return { proposals, settled: ranked.filter(({ kind }) => kind === 'cause').map(({ id }) => id) };
  };
}

const GRADE_RANK: Record<Grade, number> = { defining: 0, strong: 1, usual: 2, sometimes: 3, rare: 4 };

/** The first thing in the book: the strongest sign, its best link, the table's first amount; ties by table order. */
function bookFitter(knowledge: Knowledge): Fitter {
  return ({ signs, history }) => {
    const seen = signs.filter(({ severity }) => severity > 0).sort((a, b) => b.severity - a.severity);
    for (const { sign } of seen) {
      const { links } = knowledge.signs.find(({ id }) => id === sign)!;
      const best = links
        .filter(({ direction }) => direction !== undefined)
        .sort((a, b) => GRADE_RANK[a.grade] - GRADE_RANK[b.grade])[0];
      const correction =
        best && knowledge.corrections.find((one) => serves(one, best.to, best.direction === 'more'));
      const amounts = correction?.amounts;
      if (!amounts) continue;
      const madeMm = history
        .flatMap(({ changes }) => changes)
        .filter((change) => change.correction === correction.id)
        .reduce((sum, { amountMm }) => sum + (amountMm ?? 0), 0);
      const amountMm = Math.min(amounts.firstMm, amounts.capTotalMm - madeMm);
      if (amountMm > 0) return { proposals: [{ correction, amountMm }], settled: [] };
    }
    return { proposals: [], settled: [] };
  };
}

function serves({ vector, amounts }: Correction, dimension: string, more: boolean): boolean {
  return (
    amounts !== null &&
    vector.some((entry) => !entry.coupling && entry.dimension === dimension && entry.perMm > 0 === more)
  );
}
