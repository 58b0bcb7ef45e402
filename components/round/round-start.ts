import { findCorrection, type GarmentId } from '@/diagnosis/garments/registry';
import type { DeskRoundDto } from '@/db/queries/desk';
import type { PlannedChange } from './MadeList';
import type { MuslinForm } from './round-schema';

const FIRST_MUSLIN: MuslinForm = {
  cut: 'full',
  cloth: '',
  clothKind: 'woven',
  stretchPercent: 0,
  isOnGrain: true,
  size: '',
  isStraightFromDraft: true,
};

/** What the next round starts from: the muslin as it was last cut, and the changes that were planned and not yet made. */
export function roundStartOf(
  garment: GarmentId,
  rounds: DeskRoundDto[],
): {
  number: number;
  isFirst: boolean;
  muslin: MuslinForm;
  planned: PlannedChange[];
} {
  const last = rounds.at(-1);
  if (!last) return { number: 1, isFirst: true, muslin: FIRST_MUSLIN, planned: [] };
  const { cut, cloth, clothKind, stretchPercent, size } = last;
  const muslin: MuslinForm = {
    cut,
    cloth,
    clothKind,
    stretchPercent,
    size,
    isOnGrain: true,
    isStraightFromDraft: false,
  };
  const planned = last.changes
    .filter((change) => change.madeAt === null)
    .map(({ id, correction, side, plannedMm, version }) => {
      const known = findCorrection(garment, correction);
      return { id, name: known?.name ?? correction, of: known?.amounts ?? null, side, plannedMm, version };
    });
  return { number: last.number + 1, isFirst: false, muslin, planned };
}
