import { markOf, pointOf, type Piece } from '../piece';
import { hingedOverlap, hingedSpread, type Hinged } from '../operators/hinged';
import { parallelSpread, parallelTuck, type Parallel } from '../operators/parallel';
import { moveFork } from '../operators/fork';
import type { Outcome } from '../operators/outcome';
import { raiseCentre, raiseSide } from '../operators/waist';
import type { Chain, ChainStep } from './chain';

/** Heights that follow the piece: a little above the hip line, and half way down the lower leg. */
const aboveHip = (piece: Piece) => markOf(piece, 'hip').y - 25;
const lowerLeg = (piece: Piece) => (markOf(piece, 'calf').y + pointOf(piece, 'hem-in').y) / 2;

const acrossBody = (piece: Piece, amountMm: number): Parallel => ({
  axis: 'y',
  at: aboveHip(piece),
  edges: ['centre', 'side'],
  moves: 'centre-waist',
  amountMm,
});
const acrossLeg = (piece: Piece, amountMm: number): Parallel => ({
  axis: 'y',
  at: lowerLeg(piece),
  edges: ['inseam', 'side'],
  moves: 'hem-in',
  amountMm,
});
/** Over this, mm, a leg is changed above and below the knee alike (trousers:TC087). */
const SPLIT_MM = 50;
const LOWER_LEG = 'half way down the lower leg (over 50 mm: half there, half at mid-thigh)';
const acrossThigh = (piece: Piece, amountMm: number): Parallel => ({
  ...acrossLeg(piece, amountMm),
  at: markOf(piece, 'mid-thigh').y,
});

/** A change of leg length: below the knee, or by halves above and below it. */
function onLeg(operate: (piece: Piece, args: Parallel) => Outcome, piece: Piece, mm: number): Outcome {
  const once = operate(piece, acrossLeg(piece, mm > SPLIT_MM ? mm / 2 : mm));
  if (mm <= SPLIT_MM) return once;
  const twice = operate(once.piece, acrossThigh(once.piece, mm / 2));
  const declared = once.declared.map((one) => ({
    ...one,
    byMm: 2 * one.byMm,
    withinMm: 2 * one.withinMm,
  }));
  return { before: piece, piece: twice.piece, declared, drawn: once.drawn };
}

const wedge = (piece: Piece, amountMm: number, y: number): Hinged => ({
  hinge: { edge: 'side', y },
  target: 'centre',
  moves: 'centre-waist',
  amountMm,
});

/** How much a lowered fork is widened, for one mm down (trousers:TF055 widens by most of it; shared by front and back). */
const WIDEN = 0.4;

type OnBoth = Omit<ChainStep, 'piece' | 'perMm'>;
/** The same step on front and back. */
export const onBoth = (step: OnBoth): Chain => [
  { ...step, piece: 'front', perMm: 1 },
  { ...step, piece: 'back', perMm: 1 },
];

const spreadAcross = (run: ChainStep['run'], where: string): Chain =>
  onBoth({
    operator: 'parallel-spread',
    run,
    paper: [
      `Draw a line square to the grain ${where} and cut along it.`,
      'Lay paper beneath and move the two parts {amount} apart, the grain line unbroken.',
      'Tape them down and run the edges smooth across the gap.',
    ],
    muslin: ['Cut along the line, let a strip in, {amount} wide between its seams.'],
  });
const tuckAcross = (run: ChainStep['run'], where: string): Chain =>
  onBoth({
    operator: 'parallel-tuck',
    run,
    paper: [
      `Draw two lines square to the grain ${where}, {amount} apart.`,
      'Fold the one onto the other and tape.',
      'Run the edges smooth where they step.',
    ],
    muslin: ['Fold out half of {amount} deep, so that {amount} of cloth is gone, and stitch across.'],
  });

const raise = (
  piece: 'front' | 'back',
  sign: 1 | -1,
  operator: ChainStep['operator'] = 'raise-waist-taper',
): ChainStep => ({
  piece,
  operator,
  perMm: 1,
  run: (one, mm) => raiseCentre(one, sign * mm),
  paper: [
    `Mark {amount} ${sign > 0 ? 'above' : 'below'} the waist on the line of centre ${piece}.`,
    'Draw the waist from that mark to nothing at the side, square to the centre for the first few millimetres.',
    'Fold the dart shut before you draw, so that its cap comes right.',
  ],
  ...(sign < 0
    ? { muslin: ['Chalk the new waist at the centre to nothing at the side, and set the band to it.'] }
    : {}),
});

/** Over the fullest part of the seat, a hand's breadth of the hip line. */
const acrossSeat = (piece: Piece) => markOf(piece, 'hip').y - 5;

const hinged = (piece: 'front' | 'back', opens: boolean, level = aboveHip): ChainStep => ({
  piece,
  operator: opens ? 'hinged-spread' : 'hinged-overlap',
  perMm: 1,
  run: (one, mm) => (opens ? hingedSpread : hingedOverlap)(one, wedge(one, mm, level(one))),
  paper: [
    `Draw a line from centre ${piece}, square to it, to the stitching line of the side a little above the hip.`,
    'Cut from the centre to that line and stop there; snip the allowance from the other side, so that the paper hinges on the stitching line.',
    opens
      ? 'Spread by {amount} at the centre, nothing at the hinge.'
      : 'Lap by {amount} at the centre, nothing at the hinge.',
    'True the centre, run the small kick at the side smooth, and redraw the dart.',
  ],
  muslin: [
    opens
      ? 'Slash to the side seam, and let a wedge in: {amount} at the centre, nothing at the seam.'
      : 'Pin the fold out: {amount} of cloth at the centre, nothing at the side.',
  ],
});

const side = (sign: 1 | -1): Chain =>
  onBoth({
    operator: 'raise-waist-taper',
    run: (piece, mm) => raiseSide(piece, sign * mm),
    paper: [
      `Mark {amount} ${sign > 0 ? 'above' : 'below'} the waist at the side.`,
      'Draw the waist from there to nothing at the centre.',
      'Walk front against back at the side: both have moved alike.',
    ],
  });

const forkLevel = (sign: 1 | -1): Chain => [
  ...onBoth({
    operator: 'reshape-curve',
    run: (piece, mm) => moveFork(piece, 0, sign * mm),
    paper: [
      `Mark the crotch point {amount} ${sign > 0 ? 'lower' : 'higher'}.`,
      `Draw the curve from the notch to the mark, ${sign > 0 ? 'deeper' : 'shallower'} all along.`,
    ],
  }),
  ...onBoth({
    operator: 'extend-point',
    run: (piece, mm) => moveFork(piece, sign * mm, 0),
    paper: [
      `Move that point ${sign > 0 ? 'out by {amount}, so that the stride stays' : 'in by {amount}'}.`,
      'Draw the inseam from it to nothing at the knee.',
    ],
  }).map((step) => ({ ...step, perMm: WIDEN })),
];

/** Paper for the lengths of the body: depth, rises, the side of the waist. */
export const depthChains: Readonly<Record<string, Chain>> = {
  'lengthen-depth': spreadAcross(
    (piece, mm) => parallelSpread(piece, acrossBody(piece, mm)),
    'above the hip line',
  ),
  'shorten-depth': tuckAcross(
    (piece, mm) => parallelTuck(piece, acrossBody(piece, mm)),
    'above the hip line',
  ),
  'raise-centre-back': [raise('back', 1)],
  'wedge-into-back': [hinged('back', true)],
  'pin-out-back-fold': [hinged('back', false)],
  'overlap-wedge-in-back': [hinged('back', false, acrossSeat)],
  'tip-waist-forward': [raise('front', -1, 'lower-waist-taper'), raise('back', 1)],
  'raise-centre-front': [raise('front', 1)],
  'lower-centre-front': [raise('front', -1)],
  'wedge-into-front': [hinged('front', true)],
  'raise-side-waist': side(1),
  'lower-side-waist': side(-1),
  'lower-crotch-level': forkLevel(1),
  'raise-crotch-level': forkLevel(-1),
  'lengthen-leg': spreadAcross((piece, mm) => onLeg(parallelSpread, piece, mm), LOWER_LEG),
  'shorten-leg': tuckAcross((piece, mm) => onLeg(parallelTuck, piece, mm), LOWER_LEG),
};
