import type { Change, PastRound } from '../case-schema';
import type { Beliefs } from './draft';
import { GRID_SIZE, GRID_STEP, normalise, transpose } from './grid';
import { variablesFor } from './layout';
import type { Layout } from './layout';

/** Cutting error of one change at the reference size, mm, one standard deviation. */
const CUTTING_SD_MM = 3;
/** Of the amount, in addition, where the cloth was changed. */
const NEW_CLOTH_SD_SHARE = 0.3;
/** No change is known better than this, z. */
const BLUR_MIN_Z = 0.35;
/** Share of the prior mixed in between two rounds, so that repeated rounds cannot make certainty. */
const PRIOR_SHARE = 0.05;
/** The same for causes, which come and go with the wearing and the cloth. */
const CAUSE_PRIOR_SHARE = { 're-baste': 0.2, patch: 0.2, 'new-cloth': 0.6 } as const;

/**
 * Beliefs at the start of the next round: shifted by what was really made, blurred, and mixed with a little of the prior.
 * Dependence between needs beyond the joints is dropped at the round's end (Boyen & Koller 1998).
 */
export function advance(layout: Layout, beliefs: Beliefs, prior: Beliefs, round: PastRound): Beliefs {
  const shifts = shiftsOf(layout, round);
  const mixes = layout.variables.map(({ kind }) =>
    kind === 'cause' ? CAUSE_PRIOR_SHARE[round.next] : PRIOR_SHARE,
  );
  const marginals = beliefs.marginals.map((belief, variable) =>
    mix(moved(belief, shifts.get(variable)), prior.marginals[variable]!, mixes[variable]!),
  );
  const pairs = beliefs.pairs.map(({ first, second, table }) => {
    const rows = movedRows(table, shifts.get(first));
    const both = transpose(movedRows(transpose(rows), shifts.get(second)));
    return { first, second, table: mix(both, priorJoint(prior, first, second), PRIOR_SHARE) };
  });
  return { marginals, pairs };
}

/** The needs that the changes after a round touched, couplings included. */
export function changedVariables(layout: Layout, round: PastRound): ReadonlySet<number> {
  return new Set(shiftsOf(layout, round).keys());
}

interface Shift {
  byZ: number;
  blurZ: number;
}

/** need after = need − perMm · amount, summed over the changes of a round. */
function shiftsOf(layout: Layout, round: PastRound): Map<number, Shift> {
  const shifts = new Map<number, Shift>();
  for (const change of round.changes) {
    const { vector, amounts } =
      layout.index.knowledge.corrections[layout.index.corrections.get(change.correction)!]!;
    if (!amounts) continue;
    const amountMm = ownAmount(layout, change);
    const sdMm = Math.hypot(
      CUTTING_SD_MM * layout.factors.length,
      round.next === 'new-cloth' ? NEW_CLOTH_SD_SHARE * amountMm : 0,
    );
    for (const { dimension, perMm } of vector) {
      const at = layout.index.dimensions.get(dimension)!;
      for (const variable of variablesFor(layout, at, change.side)) {
        const { byZ, blurZ } = shifts.get(variable) ?? { byZ: 0, blurZ: BLUR_MIN_Z };
        const errorZ = (sdMm * Math.abs(perMm)) / layout.scaleMm[at]!;
        shifts.set(variable, {
          byZ: byZ - (perMm * amountMm) / layout.scaleMm[at]!,
          blurZ: Math.max(blurZ, errorZ),
        });
      }
    }
  }
  return shifts;
}

/** A change's amount in its correction's own basis, mm. */
export function ownAmount(layout: Layout, { correction, amountMm, basis }: Change): number {
  const { amounts } = layout.index.knowledge.corrections[layout.index.corrections.get(correction)!]!;
  if (!amounts || amountMm === null) return 0;
  return amountMm * (basis === null || basis === amounts.basis ? 1 : amounts.conversions[basis]!);
}

/** A histogram shifted and blurred; mass beyond the ends gathers there. */
function moved(belief: Float64Array, shift: Shift | undefined): Float64Array {
  if (!shift) return belief;
  const kernel = kernelOf(shift);
  const out = new Float64Array(GRID_SIZE);
  for (let from = 0; from < GRID_SIZE; from++)
    for (let k = 0; k < kernel.weights.length; k++) {
      const to = Math.min(GRID_SIZE - 1, Math.max(0, from + kernel.first + k));
      out[to]! += belief[from]! * kernel.weights[k]!;
    }
  return out;
}

/** Weights of the whole-bin steps around a shift, three standard deviations wide. */
function kernelOf({ byZ, blurZ }: Shift): { first: number; weights: Float64Array } {
  const middle = byZ / GRID_STEP;
  const sd = blurZ / GRID_STEP;
  const first = Math.floor(middle - 3 * sd);
  const weights = Float64Array.from({ length: Math.ceil(6 * sd) + 2 }, (_, k) =>
    Math.exp(-0.5 * ((first + k - middle) / sd) ** 2),
  );
  normalise(weights);
  return { first, weights };
}

function movedRows(table: Float64Array, shift: Shift | undefined): Float64Array {
  if (!shift) return table;
  const columns = transpose(table);
  const out = new Float64Array(table.length);
  for (let column = 0; column < GRID_SIZE; column++)
    out.set(moved(columns.subarray(column * GRID_SIZE, (column + 1) * GRID_SIZE), shift), column * GRID_SIZE);
  return transpose(out);
}

function priorJoint(prior: Beliefs, first: number, second: number): Float64Array {
  for (const pair of prior.pairs) {
    if (pair.first === first && pair.second === second) return pair.table;
    if (pair.first === second && pair.second === first) return transpose(pair.table);
  }
  const rows = prior.marginals[first]!;
  const columns = prior.marginals[second]!;
  return Float64Array.from(
    { length: GRID_SIZE * GRID_SIZE },
    (_, i) => rows[Math.floor(i / GRID_SIZE)]! * columns[i % GRID_SIZE]!,
  );
}

function mix(belief: Float64Array, prior: Float64Array, share: number): Float64Array {
  return belief.map((weight, i) => (1 - share) * weight + share * prior[i]!);
}
