import type { Correction, Knowledge } from './schema';
import { trousers } from './trousers';

const KNOWN: Record<'trousers', Knowledge> = { trousers };

export type GarmentId = keyof typeof KNOWN;

/** What Ruckle knows about a kind of garment. */
export const knowledgeOf = (garment: GarmentId): Knowledge => KNOWN[garment];

/** Null for an id that this knowledge does not (or no longer) have: a ledger may be older than it. */
export const findCorrection = (garment: GarmentId, id: string): Correction | null =>
  KNOWN[garment].corrections.find((one) => one.id === id || one.aliases?.includes(id)) ?? null;
