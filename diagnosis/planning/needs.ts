import type { NeedRow } from '../reading';
import { tailsIn } from './outlook';
import type { Outlook } from './outlook';
import { POSSIBLE_FROM, wordOf } from './words';

const ROWS_MIN = 5;

/** A row per dimension, side and direction, most probable first: all that are possible, and at least five. */
export function needRows(outlook: Outlook): NeedRow[] {
  const { dimensions } = outlook.layout.index.knowledge;
  const tails = tailsIn(outlook).sort((a, b) => b.probability - a.probability);
  // Needs that tie with the last of the five are listed too, so that left and right never differ by their order.
  const least = Math.min(POSSIBLE_FROM, (tails[ROWS_MIN - 1]?.probability ?? 0) - 1e-9);
  return tails
    .filter(({ probability }) => probability >= least)
    .map(({ dimension, side, direction, probability, rangeMm: [low, high] }) => ({
      dimension: dimensions[dimension]!.id,
      side,
      direction,
      probability,
      word: wordOf(probability, outlook.marksAlone),
      rangeMm: direction === 'more' ? [low, high] : [-high, -low],
      basis: dimensions[dimension]!.basis,
    }));
}
