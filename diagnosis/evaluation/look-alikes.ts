import { parseCase } from '../case';
import type { CaseInput } from '../case-schema';
import { diagnose } from '../diagnose';
import type { Direction, Knowledge } from '../garments/schema';
import type { RankedItem, Reading } from '../reading';

/** What an outcome of a check is said to show. */
export type Shown = { dimension: string; direction: Direction } | { cause: string };

/** Things that look alike, and the tests that tell them apart, in the order in which they are done. */
export interface LookAlikeGroup {
  row: number;
  name: string;
  /** The signs alone. */
  case: CaseInput;
  steps: {
    check: string;
    /**
     * Outcomes that settle something, with what they show (two or more share the first places), and signs that the
     * outcome itself names.
     */
    outcomes: { outcome: string; shows: Shown[]; also?: string[] }[];
    /** The outcome with which one goes on to the next step; undefined on the last. */
    goOn?: string;
  }[];
}

export interface WalkedOutcome {
  check: string;
  outcome: string;
  /** Whether everything shown is first in the ranking (two: both among the first two). */
  right: boolean;
  first: string[];
}

function read(knowledge: Knowledge, input: CaseInput): Reading {
  const parsed = parseCase(knowledge, input);
  if (!parsed.ok) throw new Error(`${parsed.fault.field}: ${parsed.fault.message}`);
  return diagnose(knowledge, parsed.value);
}

/** Whether the signs of a group alone read as doubt, or with one of its own tests as the first check. */
export function isOpenAtFirst(knowledge: Knowledge, group: LookAlikeGroup): boolean {
  const { doubt, checks } = read(knowledge, group.case);
  return doubt.level !== 'none' || group.steps.some(({ check }) => check === checks[0]?.check);
}

/** Walks a group's tests in their order and reads each outcome that settles something. */
export function walkGroup(knowledge: Knowledge, group: LookAlikeGroup): WalkedOutcome[] {
  const done: NonNullable<CaseInput['tests']> = [];
  return group.steps.flatMap(({ check, outcomes, goOn }) => {
    const walked = outcomes.map(({ outcome, shows, also = [] }) => {
      const signs = [...(group.case.signs ?? []), ...also.map((sign) => ({ sign, severity: 2 }))];
      const { ranked } = read(knowledge, { ...group.case, signs, tests: [...done, { check, outcome }] });
      return {
        check,
        outcome,
        right: areFirst(knowledge, ranked, shows),
        first: ranked.slice(0, 3).map(({ id }) => id),
      };
    });
    if (goOn) done.push({ check, outcome: goOn });
    return walked;
  });
}

/** Corrections that serve the same needs as one before them are the same answer said again. */
function areFirst(knowledge: Knowledge, ranked: readonly RankedItem[], shows: readonly Shown[]): boolean {
  const answers: string[] = [];
  for (const item of ranked) {
    const names = namesOf(knowledge, item);
    if (names.every((name) => answers.includes(name))) continue;
    if (answers.length >= shows.length) break;
    answers.push(...names);
  }
  return shows.every((shown) => answers.includes(nameOf(shown)));
}

function namesOf(knowledge: Knowledge, { kind, id }: RankedItem): string[] {
  if (kind === 'cause') return [nameOf({ cause: id })];
  return knowledge.corrections
    .find((one) => one.id === id)!
    .vector.filter(({ coupling }) => !coupling)
    .map(({ dimension, perMm }) => nameOf({ dimension, direction: perMm > 0 ? 'more' : 'less' }));
}

function nameOf(shown: Shown): string {
  return 'cause' in shown ? shown.cause : `${shown.dimension} ${shown.direction}`;
}
