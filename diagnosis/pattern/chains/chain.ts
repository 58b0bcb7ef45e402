import type { Outcome } from '../operators/outcome';
import type { Block } from '../blocks/block';
import type { Piece } from '../piece';

export type OperatorId =
  | 'parallel-spread'
  | 'parallel-tuck'
  | 'raise-waist-taper'
  | 'lower-waist-taper'
  | 'hinged-spread'
  | 'hinged-overlap'
  | 'extend-point'
  | 'reshape-curve'
  | 'reshape-edge'
  | 'let-out-taper'
  | 'take-in-taper'
  | 'pivot-centre'
  | 'swing-leg'
  | 'shift-leg'
  | 'shift-knee-line'
  | 'shift-seam'
  | 'slope-hem'
  | 'shaped-seam'
  | 'resize-dart'
  | 'move-dart-point'
  | 'contour-band';

/** One operator on one piece, with the words that a person follows at the table. `{amount}` stands for the length. */
export interface ChainStep {
  readonly piece: keyof Block;
  readonly operator: OperatorId;
  /** Millimetres on this piece for one millimetre of the correction's amount. */
  readonly perMm: number;
  readonly run: (piece: Piece, amountMm: number) => Outcome;
  readonly paper: readonly string[];
  /** The same on the muslin, where it can be done there. */
  readonly muslin?: readonly string[];
}

export type Chain = readonly ChainStep[];
