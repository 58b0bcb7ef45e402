import type { Side, SignAbsent, SignSeen } from '../case-schema';
import type { Sign } from '../garments/schema';
import type { Draft, OpenFinding } from './draft';
import { type Hindsight, seenWith } from './hindsight';
import type { Layout } from './layout';
import { reaching, sourcesOf } from './sources';
import type { Source, Tables } from './sources';

/** What was noted of a sign on a side. */
interface Noted {
  severity: number;
  reliability: number;
}

export interface SignNotes {
  sign: number;
  both?: Noted;
  left?: Noted;
  right?: Noted;
}

/** Lower reliability of a seen sign raises its leak by this share of what is missing, at each severity. */
const UNRELIABLE_LEAK = [0.3, 0.18, 0.09] as const;

/** Gathers what a round says of each sign; severity 0 and "looked, not there" are the same. */
export function notesOf(
  layout: Layout,
  seen: readonly SignSeen[],
  absent: readonly SignAbsent[],
): SignNotes[] {
  const notes = new Map<number, SignNotes>();
  const note = (id: string, side: Side, noted: Noted) => {
    const sign = layout.index.signs.get(id)!;
    const own = notes.get(sign) ?? { sign };
    own[side] = noted;
    notes.set(sign, own);
  };
  for (const { sign, side, severity, reliability } of seen) note(sign, side, { severity, reliability });
  for (const { sign, side } of absent) note(sign, side, { severity: 0, reliability: 1 });
  return [...notes.values()].sort((a, b) => a.sign - b.sign);
}

/** How much "looked, not there" counts for a sign on a side, 0 … 1 (something may hide it). */
export type AbsenceWeight = (sign: number, side: Side) => number;

/** Adds a sign's observation to a draft: as one where its two sides say the same to every need, else side by side. */
export function addSign(
  draft: Draft,
  layout: Layout,
  tables: Tables,
  notes: SignNotes,
  weigh: AbsenceWeight,
  hindsight: Hindsight | null,
): void {
  const sign = layout.index.knowledge.signs[notes.sign]!;
  if (layout.muslin === 'shorts' && sign.needsFullLength) return;
  const left = notes.left ?? notes.both;
  const right = notes.right ?? notes.both;
  const alike = left && right && left.severity === right.severity && left.reliability === right.reliability;
  if (left && right && sign.sided && !(alike && !touchesSplit(layout, sign)))
    addTwoSided(draft, layout, tables, notes.sign, left, right, weigh);
  else {
    const side: Side = left && right ? 'both' : left ? 'left' : 'right';
    addOneSided(draft, layout, tables, notes.sign, side, (left ?? right)!, weigh, hindsight);
  }
}

function touchesSplit(layout: Layout, sign: Sign): boolean {
  return sign.links.some(({ to }) => {
    const dimension = layout.index.dimensions.get(to);
    return dimension !== undefined && layout.ofDimension[dimension]!.length > 1;
  });
}

function leakOf(tables: Tables, sign: Sign, reliability: number, share: number): number[] {
  const levels = tables.strengths.leak[sign.leak].map((above, k) => {
    const raised = 1 - (1 - above) * (1 - UNRELIABLE_LEAK[k]! * (1 - reliability));
    return raised * share;
  });
  return [1, ...levels, 0];
}

function addOneSided(
  draft: Draft,
  layout: Layout,
  tables: Tables,
  place: number,
  side: Side,
  noted: Noted,
  weigh: AbsenceWeight,
  hindsight: Hindsight | null,
): void {
  const sign = layout.index.knowledge.signs[place]!;
  const { severity, reliability } = noted;
  if (severity === 0) {
    const weight = weigh(place, side) * reliability;
    for (const source of sourcesOf(layout, tables, sign.links, side, 1)) addAbsence(draft, source, weight);
    return;
  }
  const went = hindsight?.wentSign(sign.id, side) ? hindsight : null;
  const above = leakOf(tables, sign, reliability, went?.leftOfLeak ?? 1);
  const slots = sourcesOf(layout, tables, sign.links, side, reliability).map((source) => ({
    variable: source.variable,
    ...seenWith(reaching(source, severity), went?.leftOf(source.variable)),
    parts: [0],
  }));
  const leak = Float64Array.of(1 - above[severity]!, above[severity]! - above[severity + 1]!);
  addFinding(draft, { slots, leak, weight: severity * reliability, key: `${sign.id} ${side}` });
}

/** Nothing seen: every source stayed at none. */
function addAbsence(draft: Draft, source: Source, weight: number): void {
  draft.temper(source.variable, (state) => Math.log(source.cumulative[0]![state]!), weight);
}

/** A finding that no variable can reach says nothing. */
function addFinding(draft: Draft, finding: OpenFinding): void {
  if (finding.slots.length > 0) draft.findings.push(finding);
}

/**
 * Left and right noted apart. A need of one leg fires on its own side; a need without sides fires once and shows on both,
 * so it cannot exceed the lesser of the two; a cause may act on each side by itself unless both show the same.
 */
function addTwoSided(
  draft: Draft,
  layout: Layout,
  tables: Tables,
  place: number,
  left: Noted,
  right: Noted,
  weigh: AbsenceWeight,
): void {
  const sign = layout.index.knowledge.signs[place]!;
  const noted = [left, right] as const;
  const low = Math.min(left.severity, right.severity);
  const seen = [0, 1].filter((part) => noted[part]!.severity > 0);
  const slots: OpenFinding['slots'] = [];
  const common = new Set<number>();
  noted.forEach((own, part) => {
    const side = part === 0 ? 'left' : 'right';
    for (const source of sourcesOf(
      layout,
      tables,
      sign.links,
      side,
      own.severity > 0 ? own.reliability : 1,
    )) {
      const shared = source.side === 'both' && !(source.cause && left.severity !== right.severity);
      if (shared && common.has(source.variable)) continue;
      if (shared) common.add(source.variable);
      const severity = shared ? low : own.severity;
      const weight = weigh(place, side) * own.reliability;
      if (severity === 0) addAbsence(draft, source, weight);
      else
        slots.push({
          variable: source.variable,
          ...reaching(source, severity),
          parts: partsOf(shared, part, noted, seen),
        });
    }
  });
  if (seen.length === 0) return;
  const leak = twoSidedLeak(tables, sign, left, right);
  addFinding(draft, {
    slots,
    leak,
    weight: Math.max(...noted.map(({ severity, reliability }) => severity * reliability)),
    key: `${sign.id} both sides`,
  });
}

/** Bits (within the finding) that a firing reaches: those of the seen sides that it shows on at their severity. */
function partsOf(
  shared: boolean,
  part: number,
  noted: readonly [Noted, Noted],
  seen: readonly number[],
): number[] {
  const sides = shared
    ? seen.filter((other) => noted[other]!.severity === Math.min(noted[0].severity, noted[1].severity))
    : [part];
  return sides.map((side) => seen.indexOf(side));
}

/** Half of the leak shows on both sides, half on each by itself; weights of the patterns of reached sides. */
function twoSidedLeak(tables: Tables, sign: Sign, left: Noted, right: Noted): Float64Array {
  const common = leakOf(tables, sign, Math.min(left.reliability, right.reliability), 0.5);
  const own = [left, right].map(({ reliability }) => leakOf(tables, sign, reliability, 0.5));
  const low = Math.min(left.severity, right.severity);
  const seen = [left, right].filter(({ severity }) => severity > 0).length;
  const weights = new Float64Array(1 << seen);
  for (let shared = 0; shared <= low; shared++) {
    const chance = common[shared]! - common[shared + 1]!;
    const sides = [left, right].map(({ severity }, part) => sideLeak(own[part]!, severity, shared));
    const rows = sides.filter((_, part) => [left, right][part]!.severity > 0);
    for (let pattern = 0; pattern < weights.length; pattern++)
      weights[pattern]! += rows.reduce(
        (product, row, place) => product * row[(pattern >> place) & 1]!,
        chance,
      );
  }
  return weights;
}

/** [stays below, reaches exactly] of one side, given what the common leak already shows. */
function sideLeak(above: readonly number[], severity: number, shared: number): [number, number] {
  const upTo = 1 - (above[severity + 1] ?? 0);
  if (severity === 0 || shared === severity) return [0, upTo];
  return [1 - above[severity]!, above[severity]! - above[severity + 1]!];
}
