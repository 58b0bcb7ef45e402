/**
 * Figures of published drafts, as functions of girths and lengths in one unit (mm in, mm out; inches in, inches out).
 * Each names its source; together with {@link draftTrousers} they are the whole of what the block takes from print.
 */

/** Plain-front trouser draft in centimetres (standards:D02): depth of the fork below the waist. */
export const riseOf = (outsideLeg: number, insideLeg: number): number => outsideLeg - insideLeg;

/** Height of the knee line above the hem (standards:D02: half the inside leg and 5 cm), mm. */
export const kneeAboveHemMm = (insideLegMm: number): number => insideLegMm / 2 + 50;

/** The hip line lies a twelfth of the seat girth above the fork (standards:D02, standards:D03). */
export const hipAboveFork = (seat: number): number => seat / 12;

/** The front takes a quarter of the seat girth (standards:D02, standards:D03). */
export const frontSeat = (seat: number): number => seat / 4;

/** Front waist before darts: a quarter of the girth and 2 cm (standards:D02), mm. */
export const frontWaistMm = (waistMm: number): number => waistMm / 4 + 20;

/** Half of a leg piece at knee or hem, each side of its middle line (standards:D02). */
export const legHalf = (girth: number): number => girth / 4;

/** How far the points reach in front of and behind the seat's edge (textbook rule, standards:D09: hip/20 … hip/16 and hip/10 … hip/8). */
export const frontExtension = (hip: number): number => hip / 20;
export const backExtension = (hip: number): number => hip / 10;

/** The same by a teaching rule in shares of a quarter hip (standards:D08: 15 % and 45 %). */
export const taughtExtensions = (hip: number) => ({
  front: 0.15 * (hip / 4),
  back: 0.45 * (hip / 4),
});

/** A slope drawn as `across` over `up`, in degrees (standards:D04: 2.5 over 10 is 14.04°, not the 15° it is called). */
export const slopeDegrees = (across: number, up: number): number => (Math.atan2(across, up) * 180) / Math.PI;

/** Total of the back waist line (standards:D01: half the waist and 2¼ in), in. */
export const oldBackWaistIn = (waistIn: number): number => waistIn / 2 + 2.25;

/** The same source's knee line below the fork: half the inseam less 2 in, in. */
export const oldKneeBelowForkIn = (inseamIn: number): number => inseamIn / 2 - 2;

/**
 * A girth cut for stretch: at most half of what the gauge shows is used round the body (common practice: 25 % gauge, cut
 * 11 % smaller). `stretch` is a share: 0.25 for a cloth that gives a quarter of its width.
 */
export const cutForStretch = (girth: number, stretch: number): number => girth / (1 + stretch / 2);
