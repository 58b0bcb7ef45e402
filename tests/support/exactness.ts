import type { CaseInput } from '@/diagnosis/case-schema';
import type { Random } from '@/diagnosis/evaluation/random';
import type { Dimension, Knowledge } from '@/diagnosis/garments/schema';
import { prepare, solveRound } from '@/diagnosis/inference/beliefs';
import { CURRENT_ROUND } from '@/diagnosis/inference/solve';
import { STRENGTHS } from '@/diagnosis/inference/strengths';
import { byTheBook } from './by-the-book';
import { drawKnowledge } from './draw-knowledge';
import { parsed } from './read-case';

/** A drawn garment without sides, small enough to be walked state by state. */
function drawSmall(random: Random, dimensions: number, causes: number, signs: number): Knowledge {
  const drawn = drawKnowledge(random, { dimensions, causes, signs, checks: 0 });
  return { ...drawn, dimensions: drawn.dimensions.map((one) => ({ ...one, sided: false })) };
}

function differenceToBook(knowledge: Knowledge, input: Omit<CaseInput, 'garment'>): number {
  const fitting = parsed(knowledge, input);
  const { layout, tables, start } = prepare(knowledge, fitting, STRENGTHS);
  const { marginals } = solveRound(layout, tables, start, fitting);
  const book = byTheBook(knowledge, fitting, start.marginals, STRENGTHS);
  return Math.max(...book.flatMap((row, v) => row.map((p, state) => Math.abs(p - marginals[v]![state]!))));
}

/** Greatest absolute error of all beliefs in one drawn garment and case, against the definition walked state by state. */
export function exactnessOf(random: Random, threeNeedsShare = 0.06): number {
  const dimensions = random.chance(threeNeedsShare) ? 3 : 1 + random.below(2);
  const knowledge = drawSmall(random, dimensions, 3 - dimensions + random.below(2), 6);
  const noted = random.sample(knowledge.signs, 1 + random.below(6));
  const signs = noted.map(({ id }) => ({ sign: id, severity: random.below(4) }));
  const centre = random.pick(knowledge.dimensions);
  const others = knowledge.dimensions.filter((one) => one !== centre && random.chance(0.4));
  const measured = others.map((other) => sumOf(random, random.shuffle([centre, other])));
  return differenceToBook(knowledge, { signs, measured });
}

/** The same error where three needs are known by their sum: it is passed as messages. */
export function longSumErrorOf(random: Random): number {
  const knowledge = drawSmall(random, 3, 0, 5);
  const noted = random.sample(knowledge.signs, random.below(4));
  const signs = noted.map(({ id }) => ({ sign: id, severity: random.below(3) }));
  return differenceToBook(knowledge, { signs, measured: [sumOf(random, knowledge.dimensions)] });
}

function sumOf(random: Random, dimensions: readonly Dimension[]) {
  const terms = dimensions.map(({ id }) => ({ dimension: id, weight: random.between(0.5, 1) }));
  return { terms, needMm: random.between(-30, 30), sdMm: random.between(18, 30) };
}

/** Greatest error of all beliefs when findings beyond a width of 14 are absorbed, against keeping all of them. */
export function absorptionErrorOf(random: Random): { error: number; absorbed: boolean } {
  const knowledge = drawSmall(random, 8, 3, 24);
  const signs = random
    .sample(knowledge.signs, 18)
    .map(({ id }) => ({ sign: id, severity: 1 + random.below(3) }));
  const fitting = parsed(knowledge, { signs });
  const { layout, tables, start } = prepare(knowledge, fitting, STRENGTHS);
  const near = solveRound(layout, tables, start, fitting, { ...CURRENT_ROUND, widthMax: 12 });
  const whole = solveRound(layout, tables, start, fitting, { ...CURRENT_ROUND, widthMax: 18 });
  const error = Math.max(
    ...whole.marginals.flatMap((row, v) =>
      [...row].map((p, state) => Math.abs(p - near.marginals[v]![state]!)),
    ),
  );
  return { error, absorbed: !near.exact };
}
