import type { NeedRow } from '../reading';
import { tailsIn } from './outlook';
import type { Outlook } from './outlook';
import { POSSIBLE_FROM, wordOf } from './words';

const ROWS_MIN = 5;

/** A row per dimension, side and direction, most probable first: all that are possible, and at least five. */
export function needRows(outlook: Outlook): NeedRow[] {
  const { dimensions } = outlook.layout.index.knowledge;
  return tailsIn(outlook)
    .sort((a, b) => b.probability - a.probability)
    .filter(({ probability }, place) => place < ROWS_MIN || probability >= POSSIBLE_FROM)
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
