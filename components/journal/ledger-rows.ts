import type { BasisOf } from '@/components/tape/basis-words';
import type { DeskRoundDto } from '@/db/queries/desk';
import { findCorrection, type GarmentId } from '@/diagnosis/garments/registry';

export interface LedgerRow {
  id: string;
  round: number;
  name: string;
  side: 'left' | 'right' | 'both';
  of: BasisOf | null;
  plannedMm: number | null;
  madeMm: number | null;
  isMade: boolean;
  reason: string;
  proposedBy: string | null;
}

/** Every change of a journal, in the order of the rounds they were decided in. */
export const ledgerRows = (garment: GarmentId, rounds: DeskRoundDto[]): LedgerRow[] =>
  rounds.flatMap((round) =>
    round.changes.map(({ id, correction, side, plannedMm, madeMm, madeAt, reason, proposedBy }) => {
      const known = findCorrection(garment, correction);
      return {
        id,
        round: round.number,
        name: known?.name ?? correction,
        side,
        of: known?.amounts ?? null,
        plannedMm,
        madeMm,
        isMade: madeAt !== null,
        reason,
        proposedBy: proposedBy ?? null,
      };
    }),
  );
