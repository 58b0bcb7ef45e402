import type { PastRound, RoundEvidence, Side } from '../case-schema';
import type { Beliefs } from './draft';
import type { Layout } from './layout';
import { changedVariables } from './replay';

/** What made a sign and was left as it was shows it again at the next try-on, so often (judgement, no source). */
const SHOWS_AGAIN = 0.8;

/**
 * What the next round tells of this one: a sign or an answer that went after a change was not made by what stayed as it was,
 * and hardly by nothing at all.
 */
export interface Hindsight {
  /** Of the chance that an observation came by itself, what is left where it went afterwards. */
  leftOfLeak: number;
  /** The same of the chance that it came from a variable: all of it where that was changed. */
  leftOf: (variable: number) => number;
  wentSign: (id: string, side: Side) => boolean;
  wentAnswer: (check: string, side: Side) => boolean;
  isChanged: (variable: number) => boolean;
}

/** Null where nothing went, or nothing was changed. */
export function hindsightOf(layout: Layout, round: PastRound, next: RoundEvidence): Hindsight | null {
  const changed = changedVariables(layout, round);
  if (changed.size === 0) return null;
  const clear = new Set([
    ...next.signs.filter(({ severity }) => severity === 0).map(keyOfSign),
    ...next.absent.map(keyOfSign),
  ]);
  const went = (key: (side: Side) => string, side: Side) =>
    clear.has(key(side)) ||
    clear.has(key('both')) ||
    (side === 'both' && clear.has(key('left')) && clear.has(key('right')));
  const seenGone = round.signs.some(
    ({ sign, side, severity }) => severity > 0 && went((at) => `${sign} ${at}`, side),
  );
  const answers = new Map(next.tests.map(({ check, side, outcome }) => [`${check} ${side}`, outcome]));
  const otherAnswer = new Set(
    round.tests
      .filter(({ check, side, outcome }) => {
        const now = answers.get(`${check} ${side}`);
        return now !== undefined && placeOf(layout, check, now) > placeOf(layout, check, outcome);
      })
      .map(({ check, side }) => `${check} ${side}`),
  );
  if (!seenGone && otherAnswer.size === 0) return null;
  return {
    leftOfLeak: 1 - SHOWS_AGAIN,
    leftOf: (variable) => (changed.has(variable) ? 1 : 1 - SHOWS_AGAIN),
    wentSign: (id, side) => went((at) => `${id} ${at}`, side),
    wentAnswer: (check, side) => otherAnswer.has(`${check} ${side}`),
    isChanged: (variable) => changed.has(variable),
  };
}

/** A variable's part in an observation, given what is left of the chance that it made it. */
export function seenWith<T extends { hit: Float64Array }>(slot: T, left = 1): T {
  return left === 1 ? slot : { ...slot, hit: slot.hit.map((weight) => weight * left) };
}

const keyOfSign = ({ sign, side }: { sign: string; side: Side }) => `${sign} ${side}`;

/** Outcomes are tried in order: one further on means that those before it did not come. */
function placeOf({ index }: Layout, check: string, outcome: string): number {
  return index.knowledge.checks[index.checks.get(check)!]!.outcomes.findIndex(({ id }) => id === outcome);
}

/** What was changed is believed with hindsight, what stayed without: the next round says of it what it says. */
export function believedAfter(foresight: Beliefs, hindsight: Beliefs, { isChanged }: Hindsight): Beliefs {
  return {
    marginals: foresight.marginals.map((belief, variable) =>
      isChanged(variable) ? hindsight.marginals[variable]! : belief,
    ),
    pairs: foresight.pairs.map((pair, i) =>
      isChanged(pair.first) || isChanged(pair.second) ? hindsight.pairs[i]! : pair,
    ),
  };
}
