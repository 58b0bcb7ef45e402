import { edgeLength } from '../measure';
import type { Piece } from '../piece';
import { hingedOverlap, hingedSpread } from './hinged';
import { changes, edge, keeps, type Outcome } from './outcome';

/** Slashes that share the change, so that the band bends evenly. */
const SLASHES = 4;

const all = <T>(some: readonly T[] = [], more: readonly T[] = []): T[] => [...some, ...more];

/**
 * Curve a half band more (+) or less: slashed from the top edge to the stitching line of the lower edge at four places, each
 * overlapped (or spread) by a quarter of the amount. The top edge changes by exactly the amount, the lower not at all.
 */
export function contourBand(piece: Piece, amountMm: number): Outcome {
  const lowerMm = edgeLength(piece, 'lower');
  const slash = amountMm > 0 ? hingedOverlap : hingedSpread;
  let bent: Outcome = { before: piece, piece, declared: [], drawn: {} };
  for (let index = 0; index < SLASHES; index++) {
    const hinge = { edge: 'lower', mm: (lowerMm * (index + 0.5)) / SLASHES };
    const args = {
      hinge,
      target: 'upper',
      moves: 'back-top',
      amountMm: Math.abs(amountMm) / SLASHES,
    } as const;
    const one = slash(bent.piece, args);
    bent = {
      ...one,
      drawn: {
        slashes: all(bent.drawn.slashes, one.drawn.slashes),
        hinges: all(bent.drawn.hinges, one.drawn.hinges),
      },
    };
  }
  return {
    ...bent,
    before: piece,
    declared: [
      changes('the top edge', edge('upper'), -amountMm),
      keeps('the lower edge', edge('lower')),
      keeps('the front end', edge('front')),
    ],
  };
}
