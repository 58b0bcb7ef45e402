import type { Finding, Group } from './network';

/** One step of the elimination: which group, which bits it handles, opens and closes. */
export interface Step {
  group: Group;
  /** Bits open before the step that the group does not touch, then those it touches, then those it opens. */
  rest: number[];
  held: number[];
  opened: number[];
  closed: Set<number>;
}

export interface Order {
  steps: Step[];
  /** Bits open at the widest step. */
  widest: readonly number[];
}

/** A group that waits for its turn; `shares[i]` is what opening its bit i costs. */
interface Waiting {
  group: Group;
  shares: readonly number[];
}

/**
 * Orders the groups greedily so that few findings stay open at once: next comes the group that opens the fewest, then the
 * one that closes the most; ties by place. Bits open at their finding's first group and close after their last.
 */
export function orderGroups(groups: readonly Group[], findings: readonly Finding[]): Order {
  const partners: (readonly number[])[] = [];
  for (const { bits } of findings) for (const bit of bits) partners[bit] = bits;
  const pending = new Int32Array(partners.length);
  for (const { bits } of groups) for (const bit of bits) pending[bit]! += 1;

  const waiting = groups.filter(({ bits }) => bits.length > 0).map((group) => waitingFor(group, partners));
  const isOpen = new Uint8Array(partners.length);
  let open: number[] = [];
  const steps: Step[] = [];
  let widest: readonly number[] = [];
  while (waiting.length > 0) {
    const [{ group }] = waiting.splice(cheapest(waiting, isOpen, pending), 1) as [Waiting];
    const step = stepOf(group, open, isOpen, pending, partners);
    const during = [...step.rest, ...step.held, ...step.opened];
    if (during.length > widest.length) widest = during;
    open = during.filter((bit) => !step.closed.has(bit));
    isOpen.fill(0);
    for (const bit of open) isOpen[bit] = 1;
    steps.push(step);
  }
  return { steps, widest };
}

/** The two sides of one finding open together: each costs one bit where both are touched, both where only one is. */
function waitingFor(group: Group, partners: readonly (readonly number[])[]): Waiting {
  const shares = group.bits.map((bit) => {
    const together = partners[bit]!;
    return together.length / together.filter((other) => group.bits.includes(other)).length;
  });
  return { group, shares };
}

function cheapest(waiting: readonly Waiting[], isOpen: Uint8Array, pending: Int32Array): number {
  let best = 0;
  let bestCost = Infinity;
  for (let i = 0; i < waiting.length; i++) {
    const { group, shares } = waiting[i]!;
    let cost = 0;
    for (let place = 0; place < shares.length; place++) {
      const bit = group.bits[place]!;
      if (isOpen[bit] === 0) cost += shares[place]! * 1000;
      if (pending[bit] === 1) cost -= 1;
    }
    if (cost < bestCost) [best, bestCost] = [i, cost];
  }
  return best;
}

function stepOf(
  group: Group,
  open: readonly number[],
  isOpen: Uint8Array,
  pending: Int32Array,
  partners: readonly (readonly number[])[],
): Step {
  const opened: number[] = [];
  for (const bit of group.bits) {
    pending[bit]! -= 1;
    if (isOpen[bit] === 0 && !opened.includes(bit)) opened.push(...partners[bit]!);
  }
  const touched = new Set(group.bits);
  // A side of a finding that no variable touches can only be reached by its leak: it closes as it opens.
  const closed = new Set([...touched, ...opened].filter((bit) => pending[bit] === 0));
  return {
    group,
    rest: open.filter((bit) => !touched.has(bit)),
    held: open.filter((bit) => touched.has(bit)),
    opened,
    closed,
  };
}
