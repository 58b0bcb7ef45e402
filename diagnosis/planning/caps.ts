import type { Body } from '../case-schema';
import type { Correction } from '../garments/schema';
import { sizeFactors } from '../size';

/** First amount and stop marks of a correction on a body, mm of the correction's own basis. */
export interface Caps {
  firstMm: number;
  capRoundMm: number;
  capTotalMm: number;
}

/** The table's amounts carried to this body; null where the change is no length. */
export function capsOn({ amounts }: Correction, factors: ReturnType<typeof sizeFactors>): Caps | null {
  if (!amounts) return null;
  const factor = factors[amounts.sizeLevel];
  return {
    firstMm: amounts.firstMm * factor,
    capRoundMm: amounts.capRoundMm * factor,
    capTotalMm: amounts.capTotalMm * factor,
  };
}

/** Half a sixteenth of an inch: a stop is shown on the nearest mark of the reader's tape. */
const TAPE_MM = 25.4 / 32;

/**
 * Whether an amount passes the stop mark of one round on this body, as it stands on the reader's tape.
 * @param amountMm mm in the correction's own basis
 */
export function isPastStop(correction: Correction, body: Body, amountMm: number): boolean {
  const caps = capsOn(correction, sizeFactors(body));
  return caps !== null && amountMm > caps.capRoundMm + TAPE_MM;
}
