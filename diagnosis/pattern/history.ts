import type { Block } from './blocks/block';
import { chainOf } from './chains/trousers';
import { runChain, type Done } from './chains/run';

/** One change of a history: what was done, by how much (mm, in the basis of the correction). */
export interface HistoryEntry {
  readonly correction: string;
  readonly amountMm: number;
}

export type Replayed =
  | { readonly ok: true; readonly block: Block; readonly done: readonly Done[] }
  | { readonly ok: false; readonly at: number; readonly why: string };

/**
 * Carries a history out on a block, one change after the other. Nothing is stored but the changes, so that undoing is leaving the
 * last one out, re-ordering is another list, and another size is another block. A change that this block is too small for is a
 * value, with its place in the list; a correction that is no drawing is passed over.
 */
export function replay(block: Block, history: readonly HistoryEntry[]): Replayed {
  const done: Done[] = [];
  let now = block;
  for (const [at, { correction, amountMm }] of history.entries()) {
    const chain = chainOf(correction);
    if (!chain) continue;
    const next = attempt(() => runChain(now, chain, amountMm));
    if (typeof next === 'string') return { ok: false, at, why: next };
    done.push(next);
    now = next.after;
  }
  return { ok: true, block: now, done };
}

/** The operators answer a piece that is too small with a RangeError; everything else is a bug and goes on. */
export function attempt<Value>(work: () => Value): Value | string {
  try {
    return work();
  } catch (error) {
    if (error instanceof RangeError) return error.message;
    throw error;
  }
}
