import type { Network } from '@/diagnosis/inference/network';
import type { Random } from '@/diagnosis/evaluation/random';

/** Beliefs of a network by walking every joint state and every pattern of firings: slow, and written apart from the engine. */
export function enumerate({ unary, slots, pairs, findings }: Network): {
  marginals: number[][];
  logWeight: number;
} {
  const marginals = unary.map((weights) => Array.from(weights, () => 0));
  const bits = findings.flatMap((finding) => finding.bits).length;
  let total = 0;
  const states = unary.map(() => 0);
  const walk = (variable: number, weight: number) => {
    if (weight === 0) return;
    if (variable < unary.length) {
      for (let state = 0; state < unary[variable]!.length; state++) {
        states[variable] = state;
        walk(variable + 1, weight * unary[variable]![state]!);
      }
      return;
    }
    const joint = pairs.reduce(
      (product, { first, second, table }) =>
        product * table[states[first]! * unary[second]!.length + states[second]!]!,
      weight,
    );
    const all = joint * reachAll({ unary, slots, pairs, findings }, states, bits);
    total += all;
    states.forEach((state, v) => (marginals[v]![state]! += all));
  };
  walk(0, 1);
  return {
    marginals: marginals.map((row) => row.map((weight) => weight / total)),
    logWeight: Math.log(total),
  };
}

/** Weight that every finding is reached, given the states: patterns are combined by OR, one firing after another. */
function reachAll({ slots, findings }: Network, states: readonly number[], bits: number): number {
  let patterns = new Map<number, number>([[0, 1]]);
  const fire = (choices: readonly { mask: number; weight: number }[]) => {
    const next = new Map<number, number>();
    for (const [pattern, weight] of patterns)
      for (const choice of choices) {
        const reached = pattern | choice.mask;
        next.set(reached, (next.get(reached) ?? 0) + weight * choice.weight);
      }
    patterns = next;
  };
  for (const { bits: own, leak } of findings)
    fire(
      Array.from(leak, (weight, pattern) => ({
        mask: own.reduce((mask, bit, place) => mask | (((pattern >> place) & 1) << bit), 0),
        weight,
      })),
    );
  slots.forEach((ofVariable, v) => {
    for (const { bits: own, miss, hit } of ofVariable)
      fire([
        { mask: 0, weight: miss[states[v]!]! },
        { mask: own.reduce((mask, bit) => mask | (1 << bit), 0), weight: hit[states[v]!]! },
      ]);
  });
  return patterns.get(2 ** bits - 1) ?? 0;
}

/** A random network: some variables in pairs, some findings with two sides, links between a few of them. */
export function randomNetwork(random: Random, sizes: readonly number[], findingCount: number): Network {
  const weights = (length: number, least: number) =>
    Float64Array.from({ length }, () => random.between(least, 1));
  const leaves = random.chance(0.5) ? 1 + random.below(2) : 0;
  const pairs = sizes
    .slice(1, 1 + leaves)
    .map((size, i) => ({ first: 0, second: i + 1, table: weights(sizes[0]! * size, 0) }));
  let next = 0;
  const findings = Array.from({ length: findingCount }, () => {
    const bits = random.chance(0.3) ? [next, next + 1] : [next];
    next += bits.length;
    return { bits, leak: Float64Array.from({ length: 1 << bits.length }, () => random.between(0.001, 0.5)) };
  });
  const slots = sizes.map((size) =>
    findings.flatMap(({ bits }) => {
      if (random.chance(0.3)) return [];
      const parts = bits.length === 2 && random.chance(0.5) ? [[random.pick(bits)]] : [[...bits]];
      return parts.map((own) => {
        const hit = weights(size, 0);
        return { bits: own, hit, miss: hit.map((reached) => (1 - reached) * random.next()) };
      });
    }),
  );
  return { unary: sizes.map((size) => weights(size, 0)), slots, pairs, findings };
}
