import { assemble, layFindings } from './draft';
import type { Beliefs, Draft, OpenFinding, SumFactor } from './draft';
import { eliminate, orderOf } from './eliminate';
import { normalise } from './grid';
import { sumMessages } from './messages';
import type { Network, Posterior } from './network';
import type { Order } from './order';

/** How much work a round may be. */
export interface Care {
  /** Findings open at once up to which the elimination is exact. */
  widthMax: number;
  /** How many are left open once some have to be absorbed anyway. */
  narrowTo: number;
  /** How often messages are renewed. */
  sweeps: number;
}

export const CURRENT_ROUND: Care = { widthMax: 14, narrowTo: 12, sweeps: 6 };
/** A crowded round long past, of which only the margins are kept, is worth less. */
export const PAST_ROUND: Care = { widthMax: 12, narrowTo: 8, sweeps: 2 };

/** Messages are kept above this share of their greatest, so that a belief can always be taken back out. */
const MESSAGE_MIN = 1e-12;

export interface Solution {
  marginals: Float64Array[];
  beliefs: Beliefs;
  logWeight: number;
  exact: boolean;
  width: number;
}

/** Something that is passed as messages: a long sum, or a finding that was absorbed because too many were open. */
interface Loose {
  variables: number[];
  messages: Float64Array[];
  update: (beliefs: Float64Array[]) => Float64Array[];
}

/**
 * Beliefs given a round's evidence. Exact where at most `care.widthMax` findings are open at once and every sum joins two
 * needs; otherwise the weakest findings and the long sums are approximated by messages to single needs, passed in sweeps
 * (assumed-density filtering, Boyen & Koller 1998, taken back and renewed in each sweep instead of absorbed for good).
 */
export function solve(draft: Draft, care = CURRENT_ROUND): Solution {
  const whole = assemble(draft);
  const { order, kept, absorbed } = narrow(draft, whole.network, care);
  const first = { ...whole, network: { ...whole.network, ...layFindings(kept, whole.network.unary.length) } };
  const loose = [...whole.sums.map(looseSum), ...absorbed.map(looseFinding)];
  for (const factor of loose)
    factor.messages = factor.variables.map((variable) =>
      new Float64Array(draft.logs[variable]!.length).fill(1),
    );
  let posterior = eliminate(first.network, order);
  for (let sweep = 0; sweep < care.sweeps && loose.length > 0; sweep++) {
    for (const factor of loose) renew(factor, posterior.marginals);
    posterior = eliminate(withMessages(first.network, loose), order);
  }
  return {
    marginals: posterior.marginals,
    beliefs: beliefsOf(first.network, posterior),
    logWeight: posterior.logWeight + whole.logShift,
    exact: loose.length === 0,
    width: posterior.width,
  };
}

/** Absorbs the weakest of the findings at the widest step, half of what is too many at a time, until few are open at once. */
function narrow(draft: Draft, network: Network, { widthMax, narrowTo }: Care) {
  let kept: readonly OpenFinding[] = draft.findings;
  let order = orderOf(network);
  const absorbed: OpenFinding[] = [];
  const crowded = order.widest.length > widthMax;
  while (crowded && order.widest.length > narrowTo) {
    const laid = layFindings(kept, network.unary.length);
    const open = new Set(order.widest);
    const weakest = kept
      .filter((_, i) => laid.findings[i]!.bits.some((bit) => open.has(bit)))
      .sort((a, b) => a.weight - b.weight || (a.key < b.key ? -1 : 1))
      .slice(0, Math.ceil((order.widest.length - narrowTo) / 2));
    absorbed.push(...weakest);
    kept = kept.filter((finding) => !weakest.includes(finding));
    order = orderOf({ ...network, ...layFindings(kept, network.unary.length) });
  }
  return { order, kept, absorbed };
}

function looseSum(sum: SumFactor): Loose {
  return {
    variables: sum.terms.map(({ variable }) => variable),
    messages: [],
    update: (beliefs) => sumMessages(sum, beliefs),
  };
}

/** One finding alone against single beliefs is a small network of its own, always of the same shape. */
function looseFinding(finding: OpenFinding): Loose {
  const variables = [...new Set(finding.slots.map(({ variable }) => variable))];
  const renumbered = finding.slots.map((slot) => ({ ...slot, variable: variables.indexOf(slot.variable) }));
  const shape = { pairs: [], ...layFindings([{ ...finding, slots: renumbered }], variables.length) };
  let order: Order | undefined;
  return {
    variables,
    messages: [],
    update: (beliefs) => {
      const network = { ...shape, unary: beliefs };
      order ??= orderOf(network);
      const { marginals } = eliminate(network, order);
      return marginals.map((belief, i) => belief.map((weight, state) => ratio(weight, beliefs[i]![state]!)));
    },
  };
}

function ratio(a: number, b: number): number {
  return b > 0 ? a / b : 0;
}

function renew(factor: Loose, marginals: readonly Float64Array[]): void {
  const without = factor.variables.map((variable, i) => {
    const belief = marginals[variable]!.map((weight, state) => weight / factor.messages[i]![state]!);
    normalise(belief);
    return belief;
  });
  factor.messages = factor.update(without).map((message) => {
    const most = message.reduce((a, b) => Math.max(a, b), 0);
    return message.map((weight) => Math.max(weight / most, MESSAGE_MIN));
  });
}

function withMessages(network: Network, loose: readonly Loose[]): Network {
  const unary = network.unary.map((weights) => weights.slice());
  for (const { variables, messages } of loose)
    variables.forEach((variable, i) => {
      const weights = unary[variable]!;
      for (let state = 0; state < weights.length; state++) weights[state]! *= messages[i]![state]!;
    });
  return { ...network, unary };
}

/** The posterior as beliefs that a next round can start from: margins, and a joint wherever two needs were known together. */
function beliefsOf(network: Network, posterior: Posterior): Beliefs {
  return {
    marginals: posterior.marginals,
    pairs: network.pairs.map(({ first, second }, i) => ({ first, second, table: posterior.joints[i]! })),
  };
}
