import type { z } from 'zod';
import { shapeFault } from './case-fault';
import type { CaseFault } from './case-fault';
import { caseSchema } from './case-schema';
import type {
  Case,
  Change,
  Measured,
  PastRound,
  RoundEvidence,
  Side,
  SignAbsent,
  TestResult,
} from './case-schema';
import type { Knowledge } from './garments/schema';
import { termsKey } from './inference/measured';
import { indexOf } from './knowledge-index';
import type { KnowledgeIndex } from './knowledge-index';
import { nearestOf } from './nearest';

export type CaseResult = { ok: true; value: Case } | { ok: false; fault: CaseFault };

/** Carries the first fault out of the nested checks; never leaves `parseCase`. */
class Refused extends Error {
  constructor(readonly fault: CaseFault) {
    super(fault.message);
  }
}

function refuse(field: string, message: string): never {
  throw new Refused({ field, message });
}

/**
 * Reads a case for a garment: strict keys, finite numbers, known ids, every (id, side) once a list.
 * The first fault is returned as a value, with the nearest valid id where one was mistyped.
 */
export function parseCase(knowledge: Knowledge, input: unknown): CaseResult {
  const parsed = caseSchema.safeParse(input);
  if (!parsed.success) return { ok: false, fault: shapeFault(parsed.error) };
  try {
    return { ok: true, value: resolve(indexOf(knowledge), parsed.data) };
  } catch (error) {
    if (error instanceof Refused) return { ok: false, fault: error.fault };
    throw error;
  }
}

type Parsed = z.output<typeof caseSchema>;

function resolve(index: KnowledgeIndex, data: Parsed): Case {
  const { garment } = index.knowledge;
  if (data.garment !== garment)
    refuse('garment', `unknown garment "${data.garment}"; nearest is "${garment}"`);
  const causes = {
    present: data.causes.present.map((id, i) => idIn(index, 'causes', id, `causes.present[${i}]`)),
    absent: data.causes.absent.map((id, i) => idIn(index, 'causes', id, `causes.absent[${i}]`)),
  };
  refuseRepeats([...causes.present], 'causes.present');
  refuseRepeats([...causes.present, ...causes.absent], 'causes.absent', causes.present.length);
  const shape = data.shape.map((id, i) => idIn(index, 'shape', id, `shape[${i}]`));
  refuseRepeats(shape, 'shape');
  return {
    ...data,
    causes,
    shape,
    ...resolveEvidence(index, data, ''),
    history: data.history.map((round, i) => resolvePast(index, round, `history[${i}].`)),
  };
}

type Kind = 'dimensions' | 'causes' | 'signs' | 'checks' | 'corrections' | 'shape';

/** The id itself, or the one that it is an alias of; refused with the nearest otherwise. */
function idIn(index: KnowledgeIndex, kind: Kind, id: string, field: string): string {
  const place = index[kind].get(id);
  if (place !== undefined) return index.knowledge[kind][place]!.id;
  const near = nearestOf(id, index[kind].keys());
  return refuse(field, `unknown id "${id}"${near ? `; nearest is "${near}"` : ''}`);
}

/** Refuses the first key that was there before; `from` is where the named list starts within the keys. */
function refuseRepeats(keys: readonly string[], list: string, from = 0): void {
  const seen = new Set<string>();
  keys.forEach((key, i) => {
    if (seen.has(key)) refuse(`${list}[${i - from}]`, `"${key}" is there twice`);
    seen.add(key);
  });
}

function refuseSide(sided: boolean, side: Side, field: string, id: string): void {
  if (!sided && side !== 'both') refuse(field, `"${id}" has no sides; leave the side out or say "both"`);
}

function resolveEvidence(
  index: KnowledgeIndex,
  data: Parsed | Parsed['history'][number],
  at: string,
): RoundEvidence {
  const signs = data.signs.map((entry, i) => {
    const field = `${at}signs[${i}]`;
    const sign = idIn(index, 'signs', entry.sign, `${field}.sign`);
    refuseSide(index.knowledge.signs[index.signs.get(sign)!]!.sided, entry.side, `${field}.side`, sign);
    return { ...entry, sign };
  });
  const absent = data.absent.map((entry, i): SignAbsent => {
    const field = `${at}absent[${i}]`;
    const given = typeof entry === 'string' ? { sign: entry, side: 'both' as const } : entry;
    const sign = idIn(index, 'signs', given.sign, typeof entry === 'string' ? field : `${field}.sign`);
    refuseSide(index.knowledge.signs[index.signs.get(sign)!]!.sided, given.side, `${field}.side`, sign);
    return { sign, side: given.side };
  });
  const keys = [...signs, ...absent].map(({ sign, side }) => `${sign}, ${side}`);
  refuseRepeats(keys.slice(0, signs.length), `${at}signs`);
  refuseRepeats(keys, `${at}absent`, signs.length);
  const measured = data.measured.map((entry, i) => resolveMeasured(index, entry, `${at}measured[${i}]`));
  refuseRepeats(measured.map(termsKey), `${at}measured`);
  const tests = data.tests.map((entry, i) => resolveTest(index, entry, `${at}tests[${i}]`));
  refuseRepeats(
    tests.map(({ check, side }) => `${check}, ${side}`),
    `${at}tests`,
  );
  return { signs, absent, measured, tests };
}

function resolveMeasured(index: KnowledgeIndex, entry: Measured, field: string): Measured {
  const terms = entry.terms.map((term, i) => {
    const dimension = idIn(index, 'dimensions', term.dimension, `${field}.terms[${i}].dimension`);
    const { sided } = index.knowledge.dimensions[index.dimensions.get(dimension)!]!;
    refuseSide(sided, term.side, `${field}.terms[${i}].side`, dimension);
    if (term.weight === 0) refuse(`${field}.terms[${i}].weight`, 'a weight of 0 says nothing');
    return { ...term, dimension };
  });
  refuseRepeats(
    terms.map(({ dimension, side }) => `${dimension}, ${side}`),
    `${field}.terms`,
  );
  return { ...entry, terms };
}

function resolveTest(index: KnowledgeIndex, entry: TestResult, field: string): TestResult {
  const id = idIn(index, 'checks', entry.check, `${field}.check`);
  const check = index.knowledge.checks[index.checks.get(id)!]!;
  refuseSide(check.sided, entry.side, `${field}.side`, id);
  if (!check.outcomes.some((outcome) => outcome.id === entry.outcome)) {
    const near = nearestOf(
      entry.outcome,
      check.outcomes.map((outcome) => outcome.id),
    );
    refuse(`${field}.outcome`, `unknown outcome "${entry.outcome}" of "${id}"; nearest is "${near}"`);
  }
  if (entry.amountMm === null) return { ...entry, check: id };
  if (check.amount === 'none' || !check.amountTo) refuse(`${field}.amountMm`, `"${id}" carries no amount`);
  const dimension = index.knowledge.dimensions[index.dimensions.get(check.amountTo.dimension)!]!;
  if (entry.basis !== null && entry.basis !== dimension.basis && !dimension.conversions[entry.basis])
    refuse(
      `${field}.basis`,
      `"${dimension.id}" cannot convert "${entry.basis}"; its own is "${dimension.basis}"`,
    );
  return { ...entry, check: id };
}

function resolvePast(index: KnowledgeIndex, round: Parsed['history'][number], at: string): PastRound {
  const changes = round.changes.map((change, i) => resolveChange(index, change, `${at}changes[${i}]`));
  refuseRepeats(
    changes.map(({ correction, side }) => `${correction}, ${side}`),
    `${at}changes`,
  );
  return { ...resolveEvidence(index, round, at), changes, next: round.next };
}

function resolveChange(index: KnowledgeIndex, change: Change, field: string): Change {
  const id = idIn(index, 'corrections', change.correction, `${field}.correction`);
  const { amounts, sided } = index.knowledge.corrections[index.corrections.get(id)!]!;
  refuseSide(sided, change.side, `${field}.side`, id);
  if (!amounts && change.amountMm !== null) refuse(`${field}.amountMm`, `"${id}" is not a length`);
  if (amounts && change.amountMm === null)
    refuse(`${field}.amountMm`, `"${id}" needs the amount really made`);
  if (
    change.basis !== null &&
    (!amounts || (change.basis !== amounts.basis && !amounts.conversions[change.basis]))
  )
    refuse(`${field}.basis`, `"${id}" cannot convert "${change.basis}"`);
  return { ...change, correction: id };
}
