import type { MuslinForm } from '@/components/round/round-schema';
import type { CutDto } from '@/db/queries/cuts';
import { beforeTheCut } from '@/diagnosis/before-the-cut/before-the-cut';
import { factsOf } from '@/diagnosis/before-the-cut/facts';
import { knowledgeOf } from '@/diagnosis/garments/registry';
import { sizeWords } from '@/diagnosis/sizing/levels';

const SIZE_MAX = 40;

/** The first muslin as it was decided before the cut: its size and blends, its cloth and length, and whether the draft was altered. */
export function muslinFrom(dto: CutDto, muslin: MuslinForm): MuslinForm {
  const { sizes, blends } = beforeTheCut(knowledgeOf(dto.garment), factsOf(dto));
  const { gauge, cut, altered } = dto.choices;
  const stretch = gauge.relaxed && gauge.pulled ? (gauge.pulled.mm / gauge.relaxed.mm - 1) * 100 : 0;
  const blended = blends.map(({ name, to }) => `${name.toLowerCase()} ${sizeWords(to)}`);
  const size = sizes.base ? [sizeWords(sizes.base), ...blended].join(', ') : muslin.size;
  return {
    ...muslin,
    cut,
    clothKind: dto.clothKind,
    stretchPercent: dto.clothKind === 'woven' ? 0 : Math.round(Math.min(200, Math.max(0, stretch))),
    size: size.slice(0, SIZE_MAX),
    isStraightFromDraft: altered.length === 0,
  };
}
