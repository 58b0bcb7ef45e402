import type { MeasureId } from '../measuring/measures';

/**
 * Gauge stretch, per cent: (stretched − relaxed) / relaxed. A 4 in fold pulled to 5 in is 25 %.
 * @param relaxedMm > 0; @param stretchedMm ≥ relaxed
 * @throws RangeError for a gauge that cannot be
 */
export function gaugeStretchPercent(relaxedMm: number, stretchedMm: number): number {
  if (!(relaxedMm > 0) || stretchedMm < relaxedMm)
    throw new RangeError('a gauge needs a relaxed length above 0 and a stretched one not below it');
  return ((stretchedMm - relaxedMm) / relaxedMm) * 100;
}

export interface StretchTest {
  stretchPercent: number;
  growthPercent: number;
  recoveryPercent: number;
}

/**
 * Stretch, growth and recovery from three lengths (D3107 calculation forms, 2007), any one unit.
 * @param relaxed before; @param pulled under load; @param rested after half an hour's rest
 * @returns null where the cloth did not stretch: then it has no recovery either
 */
export function stretchTest(relaxed: number, pulled: number, rested: number): StretchTest | null {
  if (!(relaxed > 0) || pulled <= relaxed || rested < relaxed || rested > pulled) return null;
  return {
    stretchPercent: ((pulled - relaxed) / relaxed) * 100,
    growthPercent: ((rested - relaxed) / relaxed) * 100,
    recoveryPercent: ((pulled - rested) / (pulled - relaxed)) * 100,
  };
}

/** Where the cloth is board-hard: s % stretch can be cut at most 1 − 1/(1 + s) smaller than the body. A fraction of the body. */
export const stretchLimit = (stretchPercent: number): number => 1 - 1 / (1 + stretchPercent / 100);

/** Below this recovery, or above this growth, seat and knees bag out (trade convention). */
export const RECOVERY_LEAST_PERCENT = 90;
export const GROWTH_MOST_PERCENT = 3;

const BAGS_AT: readonly MeasureId[] = ['hip', 'knee'];

/**
 * How much smaller than the body a level may be cut, a fraction: at most half the gauge stretch is used, a quarter at seat and
 * knee where recovery is under 90 % (common practice). 25 % on the gauge gives 1 − 1/1.125, 11 %.
 * @param recoveryPercent null where it was not tested: taken as good
 */
export function usableReduction(
  stretchPercent: number,
  measure: MeasureId,
  recoveryPercent: number | null = null,
): number {
  const isPoor = recoveryPercent !== null && recoveryPercent < RECOVERY_LEAST_PERCENT;
  return stretchLimit(stretchPercent * (isPoor && BAGS_AT.includes(measure) ? 0.25 : 0.5));
}

/** The stretch that a garment asks of its cloth at a level, per cent; 0 where there is ease. 10 % negative ease asks 11.1 %. */
export const stretchAskedPercent = (bodyMm: number, finishedMm: number): number =>
  finishedMm >= bodyMm ? 0 : (bodyMm / finishedMm - 1) * 100;

/** To finish at a length after p % shrinkage cut L / (1 − p), not L (1 + p). @throws RangeError at 100 % and above */
export function cutForShrinkageMm(finishedMm: number, shrinkPercent: number): number {
  if (shrinkPercent >= 100) throw new RangeError('cloth cannot shrink to nothing');
  return finishedMm / (1 - shrinkPercent / 100);
}

/** Shrinkage of a square that was washed, per cent; negative where it grew. */
export const shrinkagePercent = (beforeMm: number, afterMm: number): number =>
  ((beforeMm - afterMm) / beforeMm) * 100;
