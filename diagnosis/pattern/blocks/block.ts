import { edgeLength } from '../measure';
import type { Piece } from '../piece';
import { draftBand } from './band';
import type { BlockMeasures } from './measures';
import { draftTrousers } from './trousers';

/** The pieces of one pair of trousers; each is cut twice. */
export interface Block {
  readonly front: Piece;
  readonly back: Piece;
  readonly waistband: Piece;
}

/** Height and contour (round, at the top edge) of the band where nothing else is known: common practice, mm. */
const BAND = { heightMm: 40, contourMm: 16 } as const;

/** Front, back and a band that fits their waist, mm. */
export function draftBlock(measures: BlockMeasures): Block {
  const { front, back } = draftTrousers(measures);
  const lowerMm = edgeLength(front, 'waist') + edgeLength(back, 'waist');
  const waistband = draftBand({ lowerMm, heightMm: BAND.heightMm, contourMm: BAND.contourMm / 2 });
  return { front, back, waistband };
}
