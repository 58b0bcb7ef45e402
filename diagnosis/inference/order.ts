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

/**
 * Orders the groups greedily so that few findings stay open at once: next comes the group that leaves the fewest open
 * while it is combined, then after it; ties by place. Bits open at their finding's first group and close after their last.
 */
export function orderGroups(groups: readonly Group[], findings: readonly Finding[]): Order {
  const partners = new Map<number, readonly number[]>();
  for (const finding of findings) for (const bit of finding.bits) partners.set(bit, finding.bits);
  const pending = new Map<number, number>();
  for (const group of groups) for (const bit of group.bits) pending.set(bit, (pending.get(bit) ?? 0) + 1);

  const remaining = groups.filter((group) => group.bits.length > 0);
  let open: number[] = [];
  const steps: Step[] = [];
  let widest: readonly number[] = [];
  while (remaining.length > 0) {
    const isOpen = new Set(open);
    let best = 0;
    let bestCost = Infinity;
    for (let i = 0; i < remaining.length; i++) {
      const cost = costOf(remaining[i]!, isOpen, pending, partners);
      if (cost < bestCost) [best, bestCost] = [i, cost];
    }
    const [group] = remaining.splice(best, 1) as [Group];
    const step = stepOf(group, open, isOpen, pending, partners);
    const during = [...step.rest, ...step.held, ...step.opened];
    if (during.length > widest.length) widest = during;
    open = during.filter((bit) => !step.closed.has(bit));
    steps.push(step);
  }
  return { steps, widest };
}

function costOf(
  group: Group,
  isOpen: ReadonlySet<number>,
  pending: ReadonlyMap<number, number>,
  partners: ReadonlyMap<number, readonly number[]>,
): number {
  let opened = 0;
  let closed = 0;
  for (const bit of group.bits) {
    // The two sides of one finding open together; half a bit each keeps the count when both are touched.
    if (!isOpen.has(bit)) opened += partners.get(bit)!.length / partnersTouched(group, bit, partners);
    if (pending.get(bit) === 1) closed++;
  }
  return opened * 1000 - closed;
}

function partnersTouched(
  group: Group,
  bit: number,
  partners: ReadonlyMap<number, readonly number[]>,
): number {
  return partners.get(bit)!.filter((other) => group.bits.includes(other)).length;
}

function stepOf(
  group: Group,
  open: readonly number[],
  isOpen: ReadonlySet<number>,
  pending: Map<number, number>,
  partners: ReadonlyMap<number, readonly number[]>,
): Step {
  const touched = new Set(group.bits);
  const opened: number[] = [];
  for (const bit of group.bits) {
    if (isOpen.has(bit) || opened.includes(bit)) continue;
    opened.push(...partners.get(bit)!);
  }
  for (const bit of group.bits) pending.set(bit, pending.get(bit)! - 1);
  // A side of a finding that no variable touches can only be reached by its leak: it closes as it opens.
  const closed = new Set([...touched, ...opened].filter((bit) => (pending.get(bit) ?? 0) === 0));
  return {
    group,
    rest: open.filter((bit) => !touched.has(bit)),
    held: open.filter((bit) => touched.has(bit)),
    opened,
    closed,
  };
}
