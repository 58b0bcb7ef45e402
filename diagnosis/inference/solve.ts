import { assemble, layFindings } from './draft';
import type { Beliefs, Draft, OpenFinding, SumFactor } from './draft';
import { eliminate, orderOf } from './eliminate';
import { normalise } from './grid';
import { sumMessages } from './messages';
import type { Network, Posterior } from './network';
import type { Order } from './order';

/** Findings open at once up to which the elimination is exact. */
export const WIDTH_MAX = 14;
const SWEEPS = 6;
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
 * Beliefs given a round's evidence. Exact where at most `widthMax` findings are open at once and every sum joins two
 * needs; otherwise the weakest findings and the long sums are approximated by messages to single needs, passed in sweeps
 * (assumed-density filtering, Boyen & Koller 1998, taken back and renewed in each sweep instead of absorbed for good).
 */
export function solve(draft: Draft, widthMax = WIDTH_MAX): Solution {
  const whole = assemble(draft);
  const { order, kept, absorbed } = narrow(draft, whole.network, widthMax);
  const first = { ...whole, network: { ...whole.network, ...layFindings(kept, whole.network.unary.length) } };
  const loose = [...whole.sums.map(looseSum), ...absorbed.map(looseFinding)];
  for (const factor of loose)
    factor.messages = factor.variables.map((variable) =>
      new Float64Array(draft.logs[variable]!.length).fill(1),
    );
  let posterior = eliminate(first.network, order);
  for (let sweep = 0; sweep < SWEEPS && loose.length > 0; sweep++) {
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

/** Absorbs the weakest of the findings at the widest step until few enough are open at once. */
function narrow(
  draft: Draft,
  network: Network,
  widthMax: number,
): { order: Order; kept: OpenFinding[]; absorbed: OpenFinding[] } {
  let kept = draft.findings;
  let order = orderOf(network);
  const absorbed: OpenFinding[] = [];
  while (order.widest.length > widthMax) {
    const laid = layFindings(kept, network.unary.length);
    const open = new Set(order.widest);
    const [weakest] = kept
      .filter((_, i) => laid.findings[i]!.bits.some((bit) => open.has(bit)))
      .sort((a, b) => a.weight - b.weight || (a.key < b.key ? -1 : 1)) as [OpenFinding];
    absorbed.push(weakest);
    kept = kept.filter((finding) => finding !== weakest);
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

/** One finding alone against single beliefs is a small network of its own. */
function looseFinding({ slots, leak }: OpenFinding): Loose {
  const variables = [...new Set(slots.map(({ variable }) => variable))];
  const bits = leak.length === 4 ? [0, 1] : [0];
  return {
    variables,
    messages: [],
    update: (beliefs) => {
      const { marginals } = eliminate({
        unary: beliefs,
        pairs: [],
        findings: [{ bits, leak }],
        slots: variables.map((own) =>
          slots
            .filter(({ variable }) => variable === own)
            .map(({ miss, hit, parts }) => ({ miss, hit, bits: parts.map((part) => bits[part]!) })),
        ),
      });
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
