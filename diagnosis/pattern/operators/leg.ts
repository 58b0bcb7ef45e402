import { xy } from '../geometry/xy';
import { withPoint } from '../cut';
import { markOf, pointOf, type Piece } from '../piece';
import { move, stretch } from './move';
import { changes, edge, keeps, type Declared, type Outcome } from './outcome';

/** The outline named where a level passes side and inseam: `side-<level>` and `inseam-<level>`. */
export const atLevel = (piece: Piece, level: string, edges: readonly string[] = ['side', 'inseam']): Piece =>
  edges.reduce(
    (named, name) => withPoint(named, `${name}-${level}`, { edge: name, y: markOf(piece, level).y }),
    piece,
  );

export const width = (level: string) => ({ of: 'width', level }) as const;
export const HEM = edge('hem');
export const reach = (point: string, from: string): Declared['measure'] => ({
  of: 'offset',
  point,
  from,
  axis: 'x',
});
const sideways = (point: string, byMm: number) =>
  changes(`the ${point.startsWith('hem') ? 'hem' : 'knee'}, sideways`, reach(point, 'hip-out'), byMm);

/** Let out (+) or take in the side at the hip, to nothing at waist and thigh. */
export function hipAtSide(piece: Piece, amountMm: number): Outcome {
  return move(atLevel(piece, 'thigh', ['side']), {
    stretches: [
      stretch('side-thigh', 'hip-out', [0, 1], 'smooth', 'height'),
      stretch('hip-out', 'side-waist', [1, 0], 'smooth', 'height'),
    ],
    by: xy(-amountMm, 0),
    declared: [
      changes('the hip', width('hip'), amountMm),
      keeps('the waist', edge('waist')),
      keeps('the thigh', width('thigh')),
      keeps('the centre', edge('centre')),
    ],
  });
}

/** Let out (+) or take in the side at the thigh, to nothing at hip and knee. */
export function thighAtSide(piece: Piece, amountMm: number): Outcome {
  return move(atLevel(piece, 'thigh', ['side']), {
    stretches: [
      stretch('knee-out', 'side-thigh', [0, 1], 'smooth', 'height'),
      stretch('side-thigh', 'hip-out', [1, 0], 'smooth', 'height'),
    ],
    by: xy(-amountMm, 0),
    declared: [
      changes('the thigh', width('thigh'), amountMm),
      keeps('the hip', width('hip')),
      keeps('the knee', width('knee')),
      keeps('the inseam', edge('inseam')),
    ],
  });
}

/** Where the inseam is taken in most, and where it has run out, mm below the crotch point. */
const INSEAM_PEAK_MM = 60;
const INSEAM_END_MM = 275;

/** Let out (+) or take in the inseam below its point, to nothing 275 mm further down (trousers:TF012: 250 to 300). */
export function thighAtInseam(piece: Piece, amountMm: number): Outcome {
  const top = pointOf(piece, 'crotch-point').y;
  const peak = withPoint(piece, 'inseam-peak', { edge: 'inseam', y: top + INSEAM_PEAK_MM });
  const kneeY = pointOf(piece, 'knee-in').y;
  const end = withPoint(peak, 'inseam-end', {
    edge: 'inseam',
    y: Math.min(top + INSEAM_END_MM, kneeY - 20),
  });
  return move(end, {
    stretches: [
      stretch('crotch-point', 'inseam-peak', [0, 1], 'smooth', 'height'),
      stretch('inseam-peak', 'inseam-end', [1, 0], 'smooth', 'height'),
    ],
    by: xy(amountMm, 0),
    declared: [
      changes('the inseam, sideways', reach('inseam-peak', 'crotch-point'), amountMm),
      keeps('the crotch point', reach('crotch-point', 'notch')),
      keeps('the knee', width('knee')),
      keeps('the side', edge('side')),
    ],
  });
}

/** Let out (+) or take in both edges of a leg piece at the knee, to nothing at mid-thigh and calf. */
export function kneeBothEdges(piece: Piece, amountMm: number): Outcome {
  return move(atLevel(atLevel(piece, 'mid-thigh'), 'calf'), {
    stretches: [
      stretch('inseam-mid-thigh', 'knee-in', [0, 1], 'smooth', 'height'),
      stretch('knee-in', 'inseam-calf', [1, 0], 'smooth', 'height'),
      stretch('side-calf', 'knee-out', [0, -1], 'smooth', 'height'),
      stretch('knee-out', 'side-mid-thigh', [-1, 0], 'smooth', 'height'),
    ],
    by: xy(amountMm, 0),
    declared: [
      changes('the knee', width('knee'), 2 * amountMm),
      keeps('the calf', width('calf')),
      keeps('the thigh', width('thigh')),
      keeps('the hem', HEM),
    ],
  });
}

/** Swing the leg toward the inseam (+) or the side at the hem, in a straight line from the thigh. */
export function swingLeg(piece: Piece, amountMm: number): Outcome {
  return move(atLevel(piece, 'thigh'), {
    stretches: [
      stretch('inseam-thigh', 'hem-in', [0, 1], 'line', 'height'),
      stretch('hem-in', 'hem-out', [1, 1]),
      stretch('hem-out', 'side-thigh', [1, 0], 'line', 'height'),
    ],
    by: xy(amountMm, 0),
    declared: [
      sideways('hem-out', amountMm),
      sideways('hem-in', amountMm),
      keeps('the hem', HEM),
      keeps('the knee', width('knee')),
      keeps('the thigh', width('thigh')),
      keeps('the curve', edge('curve')),
    ],
  });
}

/** Shift the knee toward the inseam (+) or the side on both seams alike, to nothing at thigh and hem. */
export function shiftKnee(piece: Piece, amountMm: number): Outcome {
  return move(atLevel(piece, 'thigh'), {
    stretches: [
      stretch('inseam-thigh', 'knee-in', [0, 1], 'smooth', 'height'),
      stretch('knee-in', 'hem-in', [1, 0], 'smooth', 'height'),
      stretch('hem-out', 'knee-out', [0, 1], 'smooth', 'height'),
      stretch('knee-out', 'side-thigh', [1, 0], 'smooth', 'height'),
    ],
    by: xy(amountMm, 0),
    declared: [
      sideways('knee-out', amountMm),
      sideways('knee-in', amountMm),
      keeps('the knee', width('knee')),
      keeps('the hem', HEM),
      keeps('the thigh', width('thigh')),
    ],
  });
}

/** Shift the whole leg under the hip toward the inseam (+) or the side; the grain line goes with it. */
export function shiftLeg(piece: Piece, amountMm: number): Outcome {
  return move(piece, {
    stretches: [
      stretch('crotch-point', 'knee-in', [0, 1], 'smooth', 'height'),
      stretch('knee-in', 'hem-in', [1, 1]),
      stretch('hem-in', 'hem-out', [1, 1]),
      stretch('hem-out', 'knee-out', [1, 1]),
      stretch('knee-out', 'hip-out', [1, 0], 'smooth', 'height'),
    ],
    by: xy(amountMm, 0),
    marks: { 'grain-top': 1, 'grain-foot': 1 },
    declared: [
      changes('the grain line', reach('grain-top', 'hip-out'), amountMm),
      sideways('hem-out', amountMm),
      keeps('the hip', width('hip')),
      keeps('the knee', width('knee')),
      keeps('the hem', HEM),
    ],
  });
}
