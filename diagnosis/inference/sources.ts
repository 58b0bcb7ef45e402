import type { Side } from '../case-schema';
import type { Link } from '../garments/schema';
import type { Layout } from './layout';
import { variablesFor } from './layout';
import type { RiseTable, Strengths } from './strengths';
import { LEVELS, riseTables } from './strengths';

/** P(severity ≤ k) of one source per state, k = 0 … 3; multiplied over the links between a sign and a variable. */
export type Cumulative = readonly Float64Array[];

export interface Source {
  variable: number;
  /** The side of the body that the variable belongs to; `both` where it has none. */
  side: Side;
  cause: boolean;
  cumulative: Cumulative;
}

/** Strength numbers with the tables worked out of them. */
export interface Tables {
  strengths: Strengths;
  rise: ReturnType<typeof riseTables>;
  single: Map<string, Cumulative>;
}

const made = new WeakMap<Strengths, Tables>();

/** The tables of some strengths, made once. */
export function tablesOf(strengths: Strengths): Tables {
  const tables = made.get(strengths) ?? { strengths, rise: riseTables(strengths), single: new Map() };
  made.set(strengths, tables);
  return tables;
}

/**
 * The sources of an observation on `side`: each linked variable with its P(severity ≤ k). A need that is split counts
 * with the square root of its factor on each leg for something seen without a side, so that equal legs act as one.
 */
export function sourcesOf(
  layout: Layout,
  tables: Tables,
  links: readonly Link[],
  side: Side,
  reliability: number,
): Source[] {
  const found = new Map<number, Source>();
  const add = (variable: number, ofSide: Side, cause: boolean, cumulative: Cumulative) => {
    const before = found.get(variable);
    const merged = before
      ? before.cumulative.map((row, k) => row.map((c, i) => c * cumulative[k]![i]!))
      : cumulative;
    found.set(variable, { variable, side: ofSide, cause, cumulative: merged });
  };
  for (const link of links) {
    const cause = layout.index.causes.get(link.to);
    if (cause !== undefined) {
      add(layout.ofCause[cause]!, 'both', true, cumulativeOf(tables, 'cause', link.grade, reliability, 1));
      continue;
    }
    const dimension = layout.index.dimensions.get(link.to)!;
    if (layout.muslin === 'shorts' && layout.index.knowledge.dimensions[dimension]!.needsFullLength) continue;
    const variables = variablesFor(layout, dimension, side, link.opposite);
    const share = 1 / variables.length;
    for (const variable of variables) {
      const own = layout.variables[variable]!;
      const ofSide = own.kind === 'need' ? own.side : 'both';
      add(variable, ofSide, false, cumulativeOf(tables, link.direction!, link.grade, reliability, share));
    }
  }
  return [...found.values()];
}

function cumulativeOf(
  tables: Tables,
  kind: keyof Tables['rise'],
  grade: Link['grade'],
  reliability: number,
  share: number,
): Cumulative {
  const key = `${kind} ${grade} ${share}`;
  const cached = reliability === 1 ? tables.single.get(key) : undefined;
  if (cached) return cached;
  const risen: RiseTable = tables.rise[kind];
  const q = tables.strengths.grade[grade] * reliability;
  const rows = Array.from({ length: LEVELS + 1 }, (_, k) =>
    k === LEVELS ? new Float64Array(risen[0]!.length).fill(1) : risen[k]!.map((g) => (1 - q * g) ** share),
  );
  if (reliability === 1) tables.single.set(key, rows);
  return rows;
}

/** Weights that a source stays below severity k, and that it reaches it exactly (k = 1 … 3). */
export function reaching(
  { cumulative }: Source,
  severity: number,
): { miss: Float64Array; hit: Float64Array } {
  const miss = cumulative[severity - 1]!;
  return { miss, hit: cumulative[severity]!.map((upTo, state) => Math.max(0, upTo - miss[state]!)) };
}
