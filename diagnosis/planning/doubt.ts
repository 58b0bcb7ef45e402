import type { Case } from '../case-schema';
import type { Layout } from '../inference/layout';
import { notesOf } from '../inference/signs';
import { sourcesOf } from '../inference/sources';
import type { Tables } from '../inference/sources';
import type { Doubt } from '../reading';
import type { Outlook } from './outlook';
import { LIKELY_FROM, POSSIBLE_FROM } from './words';

/** A seen sign is explained when its sources would show it at least this often. */
const EXPLAINED_FROM = 0.3;

/** How far the marks agree: nothing likely, or a sign that nothing explains, is said plainly. */
export function doubtOf(
  layout: Layout,
  tables: Tables,
  fitting: Case,
  marginals: readonly Float64Array[],
  probabilities: readonly number[],
  { evidence, marksAlone }: Outlook,
): Doubt {
  if (!evidence) return { level: 'high', why: 'Nothing has been recorded yet.' };
  const unexplained = unexplainedSigns(layout, tables, fitting, marginals);
  const most = Math.max(0, ...probabilities);
  if (unexplained.length > 0 && most < LIKELY_FROM)
    return {
      level: 'high',
      why: `These marks do not agree yet; look again at “${unexplained[0]!}”, or ask a fitter.`,
    };
  if (unexplained.length > 0)
    return { level: 'some', why: `Nothing here explains “${unexplained[0]!}”; look at it again.` };
  if (most >= LIKELY_FROM)
    return marksAlone
      ? { level: 'some', why: 'The marks agree, but marks alone are not enough; one check would settle it.' }
      : { level: 'none', why: 'What was recorded agrees.' };
  const rivals = probabilities.filter((probability) => probability >= POSSIBLE_FROM).length;
  if (rivals === 0)
    return { level: 'high', why: 'Several things could look like this; a check would tell them apart.' };
  return {
    level: 'some',
    why:
      rivals > 1
        ? 'More than one thing could look like this; a check would tell them apart.'
        : 'One thing is possible, none is likely yet.',
  };
}

/** Names of seen signs that the beliefs would hardly show, the strongest first. */
function unexplainedSigns(
  layout: Layout,
  tables: Tables,
  fitting: Case,
  marginals: readonly Float64Array[],
): string[] {
  return notesOf(layout, fitting.signs, [])
    .flatMap(({ sign, both, left, right }) => {
      const { name, links, needsFullLength } = layout.index.knowledge.signs[sign]!;
      if (needsFullLength && layout.muslin === 'shorts') return [];
      const severity = Math.max(...[both, left, right].map((noted) => noted?.severity ?? 0));
      if (severity === 0) return [];
      const side = both ? 'both' : left ? 'left' : 'right';
      const below = sourcesOf(layout, tables, links, side, 1).reduce((product, { variable, cumulative }) => {
        const belief = marginals[variable]!;
        return product * belief.reduce((sum, p, state) => sum + p * cumulative[severity - 1]![state]!, 0);
      }, 1);
      return 1 - below < EXPLAINED_FROM * explainable(severity) ? [{ name, severity }] : [];
    })
    .sort((a, b) => b.severity - a.severity)
    .map(({ name }) => name);
}

/** Few sources pull surely at the highest severity, so that less is asked there. */
function explainable(severity: number): number {
  return severity === 3 ? 0.6 : 1;
}
