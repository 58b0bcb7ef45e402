import { minus, times, unit, xy } from '../geometry/xy';
import { hasPoint, pointOf, type Piece } from '../piece';
import { move, moveAndSlide, stretch } from './move';
import { changes, edge, keeps, type Outcome } from './outcome';

const CENTRE = { of: 'seam', from: { point: 'centre-waist' }, to: { point: 'notch' } } as const;
const SIDE = { of: 'seam', from: { point: 'hip-out' }, to: { point: 'side-waist' } } as const;

/** Where a stretch of waist that begins at the side (`out`) or the centre (`in`) ends: at the dart, or without one right across. */
function innerEnd(piece: Piece, from: 'in' | 'out'): string {
  if (hasPoint(piece, `dart-1-${from}`)) return `dart-1-${from}`;
  return from === 'out' ? 'centre-waist' : 'side-waist';
}

/** Raise (+) or lower the waist at the centre, along the centre line, to nothing at the side. */
export function raiseCentre(piece: Piece, amountMm: number): Outcome {
  const up = unit(minus(pointOf(piece, 'centre-waist'), pointOf(piece, 'hip-in')));
  return move(piece, {
    stretches: [
      stretch('side-waist', 'centre-waist', [0, 1]),
      stretch('centre-waist', 'hip-in', [1, 0], 'line'),
    ],
    by: times(up, amountMm),
    declared: [
      changes('the centre, waist to notch', CENTRE, amountMm),
      keeps('the side', edge('side')),
      keeps('the curve', edge('curve')),
    ],
  });
}

/** Raise (+) or lower the waist at the side, straight up, to nothing at the centre. */
export function raiseSide(piece: Piece, amountMm: number): Outcome {
  return move(piece, {
    stretches: [
      stretch('hip-out', 'side-waist', [0, 1], 'line'),
      stretch('side-waist', 'centre-waist', [1, 0]),
    ],
    by: xy(0, -amountMm),
    declared: [
      changes(
        'the height of the side',
        { of: 'offset', point: 'crotch', from: 'side-waist', axis: 'y' },
        amountMm,
      ),
      keeps('the centre', edge('centre')),
      keeps('the curve', edge('curve')),
    ],
  });
}

/** Let the centre lean `amountMm` toward the inseam (+) or the side (−) at the waist; the side is given what the centre loses. */
export function pivotCentre(piece: Piece, amountMm: number): Outcome {
  const lean = { of: 'offset', point: 'centre-waist', from: 'hip-in', axis: 'x' } as const;
  const moved = {
    stretches: [
      stretch('side-waist', 'centre-waist', [1, 1]),
      stretch('centre-waist', 'hip-in', [1, 0], 'line', 'height'),
      stretch('hip-out', 'side-waist', [0, 1], 'smooth', 'height'),
    ],
    by: xy(amountMm, 0),
    marks: { 'dart-1-point': 1 },
    declared: [
      changes('the lean of the centre at the waist', lean, amountMm),
      keeps('the side, hip to waist', SIDE),
      keeps('the waist', edge('waist'), 0.1),
      keeps('the hip', { of: 'width', level: 'hip' }),
    ],
  };
  const waist = {
    from: 'side-waist',
    to: 'centre-waist',
    stretches: [
      stretch('hip-out', 'side-waist', [0, 1], 'smooth', 'height'),
      stretch('side-waist', innerEnd(piece, 'out'), [1, 0], 'line'),
    ],
    direction: xy(-1, 0),
  };
  return moveAndSlide(piece, moved, waist, {
    from: 'hip-out',
    to: 'side-waist',
    stretches: [
      stretch('hip-out', 'side-waist', [0, 1], 'line'),
      stretch('side-waist', 'centre-waist', [1, 0]),
    ],
    direction: xy(0, -1),
  });
}

/** Let out (+) or take in the waist at the side, to nothing at the hip. */
export function waistAtSide(piece: Piece, amountMm: number): Outcome {
  return move(piece, {
    stretches: [
      stretch('hip-out', 'side-waist', [0, 1], 'smooth', 'height'),
      stretch('side-waist', innerEnd(piece, 'out'), [1, 0], 'line'),
    ],
    by: xy(-amountMm, 0),
    declared: [
      changes('the waist', edge('waist'), amountMm, 0.1 * Math.abs(amountMm)),
      keeps('the hip', { of: 'width', level: 'hip' }),
      keeps('the centre', edge('centre')),
    ],
  });
}

/** Let out (+) or take in the centre above the notch: so much at the waist, `hipShare` of it at the hip, nothing at the notch. */
export function centreSeam(piece: Piece, amountMm: number, hipShare: number): Outcome {
  return move(piece, {
    stretches: [
      stretch(innerEnd(piece, 'in'), 'centre-waist', [0, 1], 'line'),
      stretch('centre-waist', 'hip-in', [1, hipShare], 'line', 'height'),
      stretch('hip-in', 'notch', [hipShare, 0], 'smooth', 'height'),
    ],
    by: xy(amountMm, 0),
    declared: [
      changes('the waist', edge('waist'), amountMm, 0.1 * Math.abs(amountMm)),
      changes('the hip', { of: 'width', level: 'hip' }, amountMm * hipShare),
      keeps('the curve below the notch', edge('curve')),
      keeps('the side', edge('side')),
    ],
  });
}
