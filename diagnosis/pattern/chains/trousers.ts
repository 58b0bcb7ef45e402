import type { Chain } from './chain';
import { depthChains } from './depth';
import { forkAndLegChains } from './fork-and-leg';
import { widthChains } from './width';

/** For each correction of the trousers, the operators that carry it out on the paper. */
export const TROUSER_CHAINS: Readonly<Record<string, Chain>> = {
  ...depthChains,
  ...widthChains,
  ...forkAndLegChains,
};

/** The chain of a correction, or null for one that is no drawing (recut on grain, a pocket stay). */
export const chainOf = (correction: string): Chain | null => TROUSER_CHAINS[correction] ?? null;
