import { GROWTH_MOST_PERCENT, RECOVERY_LEAST_PERCENT, stretchAskedPercent, usableReduction } from './stretch';
import type { MeasureId } from '../measuring/measures';

/** Muslin and good cloth may differ by this many points of stretch, and a cloth from its draft (common practice). */
export const ALIKE_POINTS = 5;

export interface ClothFacts {
  stretchPercent: number;
  recoveryPercent: number | null;
  growthPercent: number | null;
}

/** A level whose finished measure is known beside the body, mm. */
export interface WornLevel {
  measure: MeasureId;
  name: string;
  bodyMm: number;
  finishedMm: number;
}

export interface ClothVerdict {
  kind: 'suits' | 'too-little' | 'more';
  message: string;
  /** Levels where the garment would ask more of this cloth than may be used, with both figures, per cent. */
  overdrawn: { measure: MeasureId; name: string; askedPercent: number; usablePercent: number }[];
  cautions: string[];
}

const percent = (value: number) => `${Math.round(value * 10) / 10} %`;

/**
 * Whether a cloth suits a draft. Too little stretch is plain: not for this pattern. Much more than drafted means that the same
 * paper wears looser and longer. Lengthwise nothing is taken in, whatever the cloth gives across.
 * @param draftPercent stretch that the draft asks for, 0 for woven
 */
export function clothVerdict(
  draftPercent: number,
  cloth: ClothFacts,
  levels: readonly WornLevel[],
): ClothVerdict {
  const overdrawn = levels.flatMap(({ measure, name, bodyMm, finishedMm }) => {
    const askedPercent = stretchAskedPercent(bodyMm, finishedMm);
    const reduction = usableReduction(cloth.stretchPercent, measure, cloth.recoveryPercent);
    const usablePercent = (1 / (1 - reduction) - 1) * 100;
    // A tenth of a point is less than any gauge shows.
    return askedPercent > usablePercent + 0.1 ? [{ measure, name, askedPercent, usablePercent }] : [];
  });
  const cautions = cautionsOf(cloth);
  const short = draftPercent - cloth.stretchPercent;
  if (short > ALIKE_POINTS || overdrawn.length > 0) {
    const worst = overdrawn.toSorted((a, b) => b.askedPercent - a.askedPercent)[0];
    const figures = worst
      ? `at the ${worst.name.toLowerCase()} it would be stretched by ${percent(worst.askedPercent)}, and ${percent(worst.usablePercent)} is what may be used`
      : `it stretches ${percent(cloth.stretchPercent)} and the draft asks for ${percent(draftPercent)}`;
    return { kind: 'too-little', message: `Too little stretch: do not use it for this pattern in this size; ${figures}.`, overdrawn, cautions }; // prettier-ignore
  }
  if (-short > ALIKE_POINTS)
    return { kind: 'more', message: `It stretches ${percent(cloth.stretchPercent)}, the draft was made for ${percent(draftPercent)}. The same paper will wear looser and may drop at the waist; a round in like cloth tells by how much.`, overdrawn, cautions }; // prettier-ignore
  return { kind: 'suits', message: draftPercent === 0 ? 'It suits the draft: no stretch is asked and little is there.' : `It suits the draft: ${percent(cloth.stretchPercent)} beside ${percent(draftPercent)}.`, overdrawn, cautions }; // prettier-ignore
}

function cautionsOf({ recoveryPercent, growthPercent }: ClothFacts): string[] {
  const cautions: string[] = [];
  if (recoveryPercent !== null && recoveryPercent < RECOVERY_LEAST_PERCENT)
    cautions.push(`It comes back by ${percent(recoveryPercent)} only: seat and knees will bag, so only a quarter of its stretch is used there.`); // prettier-ignore
  if (growthPercent !== null && growthPercent > GROWTH_MOST_PERCENT)
    cautions.push(
      `It stays ${percent(growthPercent)} longer after a pull: photograph again after half an hour’s wear.`,
    );
  return cautions;
}
