import type { CauseRow } from '../reading';
import type { Scored } from './corrections';
import type { Outlook } from './outlook';
import { wordOf } from './words';

/** A cause that is no length ranks above any correction while it is more probable than this. */
export const CAUSE_FIRST_FROM = 0.35;

/** All causes that are no lengths, most probable first. */
export function causeRows({ layout, marginals, marksAlone }: Outlook): CauseRow[] {
  return layout.index.knowledge.causes
    .map(({ id, action }, cause) => {
      const probability = marginals[layout.ofCause[cause]!]![1]!;
      return {
        cause: id,
        probability,
        word: wordOf(probability, marksAlone),
        action,
        because: [],
        against: [],
      };
    })
    .sort((a, b) => b.probability - a.probability || (a.cause < b.cause ? -1 : 1));
}

/**
 * The cause, by name, that has to be settled before a correction: one that ranks first and could itself make a sign, seen
 * in this round, that speaks for the correction.
 */
export function settleBefore({ layout, fitting }: Outlook, causes: readonly CauseRow[]) {
  const { index } = layout;
  const seen = fitting.signs
    .filter(({ severity }) => severity > 0)
    .map(({ sign }) => index.knowledge.signs[index.signs.get(sign)!]!);
  const first = causes.filter(({ probability }) => probability > CAUSE_FIRST_FROM);
  return ({ serves }: Scored): string | undefined => {
    const served = new Set(serves.map(({ dimension }) => index.knowledge.dimensions[dimension]!.id));
    const row = first.find(({ cause }) =>
      seen.some(
        ({ links }) => links.some(({ to }) => to === cause) && links.some(({ to }) => served.has(to)),
      ),
    );
    return row && index.knowledge.causes[index.causes.get(row.cause)!]!.name.toLowerCase();
  };
}
