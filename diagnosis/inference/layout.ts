import type { Case, Measured, RoundEvidence, Side } from '../case-schema';
import type { Knowledge } from '../garments/schema';
import { indexOf } from '../knowledge-index';
import type { KnowledgeIndex } from '../knowledge-index';
import { sizeFactors } from '../size';

export type Variable = { kind: 'need'; dimension: number; side: Side } | { kind: 'cause'; cause: number };

/** Which variables a case has: a sided need is one until anything one-sided is known about it, then left and right. */
export interface Layout {
  index: KnowledgeIndex;
  variables: Variable[];
  /** Variables of each dimension: one, or left and right. */
  ofDimension: number[][];
  ofCause: number[];
  /** Millimetres of one z, and of the tolerance, per dimension at this body. */
  scaleMm: number[];
  toleranceMm: number[];
  factors: ReturnType<typeof sizeFactors>;
  muslin: Case['muslin'];
}

/** Lays out the variables of a case. */
export function layoutOf(knowledge: Knowledge, fitting: Case): Layout {
  const index = indexOf(knowledge);
  const split = splitDimensions(index, fitting);
  const factors = sizeFactors(fitting.body);
  const variables: Variable[] = [];
  const ofDimension = knowledge.dimensions.map((_, dimension) => {
    const sides: Side[] = split.has(dimension) ? ['left', 'right'] : ['both'];
    return sides.map((side) => variables.push({ kind: 'need', dimension, side }) - 1);
  });
  const ofCause = knowledge.causes.map((_, cause) => variables.push({ kind: 'cause', cause }) - 1);
  return {
    index,
    variables,
    ofDimension,
    ofCause,
    scaleMm: knowledge.dimensions.map(({ scaleMm, sizeLevel }) => scaleMm * factors[sizeLevel]),
    toleranceMm: knowledge.dimensions.map(({ toleranceMm, sizeLevel }) => toleranceMm * factors[sizeLevel]),
    factors,
    muslin: fitting.muslin,
  };
}

function splitDimensions(index: KnowledgeIndex, fitting: Case): Set<number> {
  const { knowledge } = index;
  const split = new Set<number>();
  const touch = (ids: Iterable<string>) => {
    for (const id of ids) {
      const dimension = index.dimensions.get(id);
      if (dimension !== undefined && knowledge.dimensions[dimension]!.sided) split.add(dimension);
    }
  };
  for (const round of [fitting, ...fitting.history]) touch(oneSidedIn(index, round));
  for (const { changes } of fitting.history)
    for (const { correction, side } of changes)
      if (side !== 'both')
        touch(
          knowledge.corrections[index.corrections.get(correction)!]!.vector.map(({ dimension }) => dimension),
        );
  for (const id of fitting.shape)
    touch(knowledge.shape[index.shape.get(id)!]!.leans.filter(({ side }) => side).map(({ to }) => to));
  return split;
}

function* oneSidedIn({ knowledge, ...index }: KnowledgeIndex, round: RoundEvidence): Iterable<string> {
  for (const { sign, side } of [...round.signs, ...round.absent])
    if (side !== 'both') yield* knowledge.signs[index.signs.get(sign)!]!.links.map(({ to }) => to);
  for (const { check, side } of round.tests) {
    if (side === 'both') continue;
    const { outcomes, amountTo } = knowledge.checks[index.checks.get(check)!]!;
    for (const { links } of outcomes) yield* links.map(({ to }) => to);
    if (amountTo) yield amountTo.dimension;
  }
  for (const measured of round.measured) yield* oneSidedTerms(measured);
}

function* oneSidedTerms({ terms }: Measured): Iterable<string> {
  for (const { dimension, side } of terms) if (side !== 'both') yield dimension;
}

/** The variables of a dimension that evidence on a side speaks about: all of them for `both`. */
export function variablesFor(layout: Layout, dimension: number, side: Side, opposite = false): number[] {
  const variables = layout.ofDimension[dimension]!;
  if (side === 'both' || variables.length === 1) return variables;
  return [variables[(side === 'left') !== opposite ? 0 : 1]!];
}
