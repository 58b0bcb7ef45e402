import type { Case, Side } from './case-schema';
import type { Knowledge } from './garments/schema';
import { prepare, solveRound, tailsOf } from './inference/beliefs';
import { GRID_SIZE, zAt } from './inference/grid';
import { STRENGTHS } from './inference/strengths';
import { outlookOf } from './planning/outlook';
import { POSSIBLE_FROM, wordOf } from './planning/words';
import type { Word } from './reading';

/** What was believed of one need after one round. */
export interface SettledRound {
  /** Share of the belief on each place of `atMm`, greatest 1. */
  ridge: number[];
  word: Word | 'fits';
  /** What the need says of body and draft; null where it fits. */
  says: string | null;
}

/** One need over the rounds of a journal, oldest first. */
export interface SettlingRow {
  dimension: string;
  name: string;
  side: Side;
  /** Millimetres of need, + the body wants more; the ends mean "at least". */
  atMm: number[];
  toleranceMm: number;
  rounds: SettledRound[];
}

/**
 * How the needs of a journal settled: those that were possible in some round, the least settled last round first.
 * @param cases one for each round, oldest first, each with the rounds before it as its history
 */
export function settlingOf(knowledge: Knowledge, cases: readonly Case[]): SettlingRow[] {
  const rows = new Map<string, SettlingRow & { most: number; last: number }>();
  cases.forEach((fitting, round) => {
    const ready = prepare(knowledge, fitting, STRENGTHS);
    const { layout } = ready;
    const { marginals } = solveRound(layout, ready.tables, ready.start, fitting);
    const { marksAlone, evidence } = outlookOf(layout, fitting, marginals);
    if (!evidence) return;
    layout.variables.forEach((variable, at) => {
      if (variable.kind === 'cause') return;
      const { dimension: place, side } = variable;
      const dimension = knowledge.dimensions[place]!;
      const { id, name } = dimension;
      const belief = marginals[at]!;
      const tails = tailsOf(layout, place, belief);
      const direction = tails.more >= tails.less ? 'more' : 'less';
      const probability = tails[direction];
      const isOpen = probability >= POSSIBLE_FROM;
      const key = `${id} ${side}`;
      const row = rows.get(key) ?? {
        dimension: id,
        name,
        side,
        atMm: Array.from({ length: GRID_SIZE }, (_, bin) => zAt(bin) * layout.scaleMm[place]!),
        toleranceMm: layout.toleranceMm[place]!,
        rounds: [],
        most: 0,
        last: 0,
      };
      row.most = Math.max(row.most, probability);
      row.last = probability;
      row.rounds[round] = {
        ridge: ridgeOf(belief),
        word: isOpen ? wordOf(probability, marksAlone) : 'fits',
        says: isOpen ? dimension[direction].says : null,
      };
      rows.set(key, row);
    });
  });
  return [...rows.values()]
    .filter(({ most }) => most >= POSSIBLE_FROM)
    .sort((a, b) => b.last - a.last || b.most - a.most || (a.dimension < b.dimension ? -1 : 1))
    .map(({ most: _most, last: _last, ...row }) => row);
}

function ridgeOf(belief: Float64Array): number[] {
  const most = belief.reduce((greatest, weight) => Math.max(greatest, weight), 0);
  return Array.from(belief, (weight) => weight / most);
}
