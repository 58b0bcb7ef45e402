import type { Direction, Link } from '../garments/schema';
import type { Outlook } from './outlook';

/** Whether anything that was found speaks for a need in a direction. */
export type Support = (dimension: number, direction: Direction) => boolean;

/**
 * What somebody saw, tried, measured or noted of the body, in any round, and what an earlier change is known to draw along.
 * Doubt about a change that was made is no reason to take it back: that wants a sign of the other direction.
 */
export function supportOf({ layout: { index }, fitting }: Outlook): Support {
  const { knowledge } = index;
  const found = new Set<string>();
  const add = (id: string, direction: Direction) =>
    void found.add(`${index.dimensions.get(id)} ${direction}`);
  const addLinks = (links: readonly Link[]) => {
    for (const { to, direction } of links) if (direction) add(to, direction);
  };
  for (const { signs, tests, measured } of [fitting, ...fitting.history]) {
    for (const { sign, severity } of signs)
      if (severity > 0) addLinks(knowledge.signs[index.signs.get(sign)!]!.links);
    for (const { check, outcome } of tests)
      addLinks(knowledge.checks[index.checks.get(check)!]!.outcomes.find(({ id }) => id === outcome)!.links);
    for (const { terms, needMm } of measured)
      for (const { dimension, weight } of terms) add(dimension, needMm * weight > 0 ? 'more' : 'less');
  }
  for (const { changes } of fitting.history)
    for (const { correction } of changes)
      for (const { dimension, perMm, coupling } of knowledge.corrections[index.corrections.get(correction)!]!
        .vector)
        if (coupling) add(dimension, perMm > 0 ? 'less' : 'more');
  for (const id of fitting.shape)
    for (const { to, direction } of knowledge.shape[index.shape.get(id)!]!.leans) add(to, direction);
  return (dimension, direction) => found.has(`${dimension} ${direction}`);
}
