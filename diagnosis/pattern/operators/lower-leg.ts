import { xy, type XY } from '../geometry/xy';
import { stationPoint } from '../cut';
import { markOf, type Piece } from '../piece';
import { atLevel, HEM, reach, width } from './leg';
import { move, stretch } from './move';
import { changes, edge, keeps, type Outcome } from './outcome';

/** Let out (+) or take in both edges at the calf, to nothing at the knee and half as much at the hem. */
export function calfBothEdges(piece: Piece, amountMm: number): Outcome {
  return move(atLevel(piece, 'calf'), {
    stretches: [
      stretch('knee-in', 'inseam-calf', [0, 1], 'smooth', 'height'),
      stretch('inseam-calf', 'hem-in', [1, 0.5], 'smooth', 'height'),
      stretch('hem-in', 'hem-out', [0.5, -0.5], 'line'),
      stretch('hem-out', 'side-calf', [-0.5, -1], 'smooth', 'height'),
      stretch('side-calf', 'knee-out', [-1, 0], 'smooth', 'height'),
    ],
    by: xy(amountMm, 0),
    declared: [
      changes('the calf', width('calf'), 2 * amountMm),
      changes('the hem', HEM, amountMm),
      keeps('the knee', width('knee')),
    ],
  });
}

/** Let out (+) or take in both edges at the hem, in a straight line from the knee. */
export function hemBothEdges(piece: Piece, amountMm: number): Outcome {
  return move(piece, {
    stretches: [
      stretch('knee-in', 'hem-in', [0, 1], 'line', 'height'),
      stretch('hem-in', 'hem-out', [1, -1], 'line'),
      stretch('hem-out', 'knee-out', [-1, 0], 'line', 'height'),
    ],
    by: xy(amountMm, 0),
    declared: [
      changes('the hem', HEM, 2 * amountMm),
      keeps('the knee', width('knee')),
      keeps('the thigh', width('thigh')),
    ],
  });
}

/** Move the shaping of the knee down (+) or up on both seams, its width kept, to nothing at mid-thigh and hem. */
export function shiftKneeLine(piece: Piece, amountMm: number): Outcome {
  return move(atLevel(piece, 'mid-thigh'), {
    stretches: [
      stretch('inseam-mid-thigh', 'knee-in', [0, 1]),
      stretch('knee-in', 'hem-in', [1, 0]),
      stretch('hem-out', 'knee-out', [0, 1]),
      stretch('knee-out', 'side-mid-thigh', [1, 0]),
    ],
    by: xy(0, amountMm),
    marks: { knee: 1 },
    declared: [
      changes(
        'the height of the knee',
        { of: 'offset', point: 'knee-in', from: 'hip-in', axis: 'y' },
        amountMm,
      ),
      keeps('the knee', width('knee')),
      keeps('the hem', HEM),
      // A steep taper is a little longer or shorter for a knee at another height; the walk names it.
      keeps('the side', edge('side'), 6),
      keeps('the inseam', edge('inseam'), 6),
    ],
  });
}

/** Give (+) or take width at the side of the hem, to nothing at the knee: what one piece is given the other loses. */
export function shiftSide(piece: Piece, amountMm: number): Outcome {
  return move(piece, {
    stretches: [
      stretch('hem-in', 'hem-out', [0, 1], 'line'),
      stretch('hem-out', 'knee-out', [1, 0], 'smooth', 'height'),
    ],
    by: xy(-amountMm, 0),
    declared: [
      changes('the hem', HEM, amountMm),
      changes('the side at the hem', reach('hem-out', 'hip-out'), -amountMm),
      keeps('the knee', width('knee')),
      keeps('the inseam', edge('inseam')),
    ],
  });
}

/** Fold a wedge out of the middle (+) or let one in at a level, nothing at side and inseam; what it shapes away lies in a seam or is eased. */
export function foldAcross(piece: Piece, level: string, amountMm: number): Outcome {
  const y = markOf(piece, level).y;
  const [from, to] = ['side', 'inseam'].map((name) => stationPoint(piece, { edge: name, y })) as [XY, XY];
  const x = (from.x + to.x) / 2;
  const fold = {
    from,
    to,
    amountMm,
    upper: xy(x, y - Math.abs(amountMm) / 2),
    lower: xy(x, y + Math.abs(amountMm) / 2),
  };
  return {
    before: piece,
    piece: { ...piece, folds: [...piece.folds, fold] },
    declared: [
      changes('the middle of the leg', { of: 'middle', from: 'hip', to: 'calf' }, -amountMm),
      keeps('the side', edge('side')),
      keeps('the inseam', edge('inseam')),
    ],
    drawn: { folds: [[from, fold.upper, to, fold.lower]] },
  };
}
