import { measureOf, type MeasureId } from './measures';

/** Alone on oneself the tape slips and bending changes the body (common practice). */
export const ALONE_FACTOR = 1.5;
/** However often it is repeated, the same hand finds the same place: the error never falls below this part of the tape's own. */
const FLOOR = 0.6;

export interface Taken {
  /** Mean of the takes, mm. */
  meanMm: number;
  /** Sample standard deviation of the takes, mm; null for a single one. */
  spreadMm: number | null;
  /** Error of the mean, one standard deviation, mm. */
  sdMm: number;
  takes: number;
}

/**
 * What one or several readings of the tape say together: their mean, how far they spread, and the error to believe.
 * The error of a single take is the tape's own (× 1.5 alone); of n takes that or their spread, whichever is greater, over √n.
 * @param valuesMm at least one reading, mm
 * @throws RangeError when there is none
 */
export function combineTakes(id: MeasureId, valuesMm: readonly number[], takenAlone: boolean): Taken {
  const count = valuesMm.length;
  if (count === 0) throw new RangeError('a measure needs at least one take');
  const meanMm = valuesMm.reduce((sum, value) => sum + value, 0) / count;
  const spreadMm =
    count === 1
      ? null
      : Math.sqrt(valuesMm.reduce((sum, value) => sum + (value - meanMm) ** 2, 0) / (count - 1));
  const tapeMm = measureOf(id).tapeSdMm * (takenAlone ? ALONE_FACTOR : 1);
  const sdMm = Math.max(Math.max(tapeMm, spreadMm ?? 0) / Math.sqrt(count), tapeMm * FLOOR);
  return { meanMm, spreadMm, sdMm, takes: count };
}
