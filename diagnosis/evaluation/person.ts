import type { Case, SignSeen, TestResult } from '../case-schema';
import type { Check, Knowledge } from '../garments/schema';
import { OUTCOME_LEAK } from '../inference/checks';
import { GRID_FIT, zAt } from '../inference/grid';
import { layoutOf } from '../inference/layout';
import type { Layout } from '../inference/layout';
import { priorBeliefs } from '../inference/prior';
import { sourcesOf, tablesOf } from '../inference/sources';
import type { Tables } from '../inference/sources';
import type { Strengths } from '../inference/strengths';
import type { Random } from './random';

/** Somebody invented, whose needs are known: a state per variable, drawn for calibration and for the closed loop. */
export interface World {
  layout: Layout;
  tables: Tables;
  prior: Float64Array[];
}

/** The world of a case without evidence, with the strengths by which its signs really show. */
export function worldOf(knowledge: Knowledge, fitting: Case, strengths: Strengths): World {
  const layout = layoutOf(knowledge, fitting);
  return { layout, tables: tablesOf(strengths), prior: priorBeliefs(layout, fitting, strengths) };
}

/** A state per variable, drawn from the prior. */
export function drawStates(random: Random, { prior }: World): number[] {
  return prior.map((weights) => random.index(weights));
}

/** A need in one direction that shows somewhere and that some correction meets, with the most that it may be, z. */
interface Curable {
  variable: number;
  sign: 1 | -1;
  mostZ: number;
}

const NEED_MIN_Z = 0.8;
const NEED_MAX_Z = 2.5;

/** No cause, up to `count` needs well beyond their tolerance and within the reach of a correction's caps, all others 0; z per variable. */
export function drawNeeds(random: Random, { layout }: World, count: number): number[] {
  const zs = layout.variables.map(() => 0);
  const used = new Set<number>();
  for (const { variable, sign, mostZ } of random.shuffle(curableNeeds(layout))) {
    if (used.size === count) break;
    if (used.has(variable)) continue;
    used.add(variable);
    zs[variable] = sign * random.between(Math.min(NEED_MIN_Z, mostZ), mostZ);
  }
  return zs;
}

function curableNeeds({ index, ofDimension, scaleMm, toleranceMm }: Layout): Curable[] {
  const { knowledge } = index;
  return knowledge.dimensions.flatMap(({ id }, dimension) =>
    ([1, -1] as const).flatMap((sign): Curable[] => {
      const direction = sign > 0 ? 'more' : 'less';
      const shows = knowledge.signs.some(({ links }) =>
        links.some((link) => link.to === id && link.direction === direction),
      );
      const reachMm = Math.max(
        0,
        ...knowledge.corrections.flatMap(({ amounts, vector }) =>
          vector
            .filter((entry) => entry.dimension === id && !entry.coupling && entry.perMm * sign > 0)
            .map(({ perMm }) => (amounts ? amounts.capTotalMm * Math.abs(perMm) : 0)),
        ),
      );
      const mostZ = Math.min(NEED_MAX_Z, reachMm / scaleMm[dimension]!);
      const beyond = mostZ * scaleMm[dimension]! > 1.2 * toleranceMm[dimension]!;
      return shows && beyond ? [{ variable: ofDimension[dimension]![0]!, sign, mostZ }] : [];
    }),
  );
}

/** The nearest state of a need's grid. */
export function stateOf(z: number): number {
  return Math.min(2 * GRID_FIT, Math.max(0, Math.round(z / (zAt(1) - zAt(0))) + GRID_FIT));
}

/** Severity that a sign shows at the given states, 0 … 3: the greatest of its sources' and its leak's. */
export function showSign(
  random: Random,
  { layout, tables }: World,
  sign: number,
  states: readonly number[],
): number {
  const { links, leak } = layout.index.knowledge.signs[sign]!;
  const above = tables.strengths.leak[leak];
  let severity = severityAt(random, (k) => 1 - (above[k] ?? 0));
  for (const { variable, cumulative } of sourcesOf(layout, tables, links, 'both', 1))
    severity = Math.max(
      severity,
      severityAt(random, (k) => cumulative[k]![states[variable]!]!),
    );
  return severity;
}

function severityAt(random: Random, upTo: (k: number) => number): number {
  const drawn = random.next();
  return [0, 1, 2].find((k) => drawn < upTo(k)) ?? 3;
}

/** Every sign looked at with a probability, with the severity it shows. */
export function lookAtSigns(
  random: Random,
  world: World,
  states: readonly number[],
  noticed: number,
): SignSeen[] {
  return world.layout.index.knowledge.signs.flatMap(({ id }, sign) => {
    const severity = showSign(random, world, sign, states);
    return random.chance(noticed) ? [{ sign: id, severity, side: 'both' as const, reliability: 1 }] : [];
  });
}

/** Whether a check's outcomes add up to 1, which a remainder that leans does not. */
export function isComplete({ outcomes }: Check): boolean {
  return outcomes.at(-1)!.links.length === 0;
}

/** What a check shows at the given states. */
export function doCheck(
  random: Random,
  { layout, tables }: World,
  check: Check,
  states: readonly number[],
): TestResult {
  const came = check.outcomes.slice(0, -1).find(({ links }) => {
    const away = sourcesOf(layout, tables, links, 'both', 1).reduce(
      (product, { variable, cumulative }) => product * cumulative[0]![states[variable]!]!,
      1 - OUTCOME_LEAK,
    );
    return random.chance(1 - away);
  });
  const outcome = (came ?? check.outcomes.at(-1)!).id;
  return { check: check.id, outcome, side: 'both', amountMm: null, basis: null, places: 1 };
}
