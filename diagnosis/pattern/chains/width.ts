import { contourBand } from '../operators/band';
import { moveDartPoint, resizeDart } from '../operators/dart';
import { reshapeSide } from '../operators/fork';
import { hipAtSide, thighAtInseam, thighAtSide } from '../operators/leg';
import type { Outcome } from '../operators/outcome';
import { parallelSpread, parallelTuck, type Parallel } from '../operators/parallel';
import { centreSeam, waistAtSide } from '../operators/waist';
import { hasPoint, pointOf, type Piece } from '../piece';
import type { Chain, ChainStep } from './chain';
import { onBoth } from './depth';

const taper = (sign: 1 | -1) => (sign > 0 ? 'let-out-taper' : 'take-in-taper');
const way = (sign: 1 | -1) => (sign > 0 ? 'outside' : 'inside');

const edgeSteps = (sign: 1 | -1, place: string, ends: string, both: boolean): string[] => [
  `Mark {amount} ${way(sign)} the stitching line ${place}.`,
  `Run a smooth line through the mark, to nothing ${ends}.`,
  ...(both ? ['Do the same on front and back: each edge takes {amount}, not the sum.'] : []),
];
const seamOnMuslin = (sign: 1 | -1) => [
  sign > 0
    ? 'Unpick there and stitch {amount} nearer the cut edge, if the allowance has it.'
    : 'Stitch {amount} inside the old seam, running out smoothly.',
];

const sides = (
  sign: 1 | -1,
  run: (piece: Piece, mm: number) => Outcome,
  place: string,
  ends: string,
): Chain =>
  onBoth({
    operator: taper(sign),
    run: (piece, mm) => run(piece, sign * mm),
    paper: edgeSteps(sign, place, ends, true),
    muslin: seamOnMuslin(sign),
  });

const waist = (piece: 'front' | 'back', sign: 1 | -1): ChainStep => ({
  piece,
  operator: taper(sign),
  perMm: 1,
  run: (one, mm) => waistAtSide(one, sign * mm),
  paper: edgeSteps(sign, 'at the side of the waist', 'at the hip', false),
  muslin: seamOnMuslin(sign),
});

const centreBack = (sign: 1 | -1): ChainStep => ({
  piece: 'back',
  operator: taper(sign),
  perMm: 1,
  run: (one, mm) => centreSeam(one, sign * mm, sign > 0 ? 1 : 0.5),
  paper: [
    `Mark {amount} ${way(sign)} the stitching line of centre back at the waist${sign > 0 ? ' and at the hip' : ', and half of it at the hip'}.`,
    'Run the line into the old seam at the notch; leave the curve below alone.',
  ],
  muslin: seamOnMuslin(sign),
});

const BESIDE_DART_MM = 8;
/** Room that a long slash leaves to the ends of waist and hem, mm. */
const FROM_ENDS_MM = 25;

/** A plumb line that passes both waist and hem: beside the dart, or without one in the middle of what they share. */
function besideGrain(piece: Piece): number {
  const x = (name: string) => pointOf(piece, name).x;
  const low = Math.max(x('side-waist'), x('hem-out')) + FROM_ENDS_MM;
  const high = Math.min(x('centre-waist'), x('hem-in')) - FROM_ENDS_MM;
  return hasPoint(piece, 'dart-1-in') ? Math.max(low, x('dart-1-in') + BESIDE_DART_MM) : (low + high) / 2;
}

/** A plumb line on the inner side of the dart, through waist and hem. */
const lengthwise = (piece: Piece, amountMm: number): Parallel => ({
  axis: 'x',
  at: besideGrain(piece),
  edges: ['waist', 'hem'],
  moves: 'centre-waist',
  amountMm,
});

const spread = (piece: 'front' | 'back'): ChainStep => ({
  piece,
  operator: 'parallel-spread',
  perMm: 1,
  run: (one, mm) => parallelSpread(one, lengthwise(one, mm)),
  paper: [
    'Draw a line beside the grain line from waist to hem and cut along it.',
    'Move the parts {amount} apart all the way down and tape paper beneath.',
    'Draw a new grain line in the middle; the waist has grown too: ease it in, or fold it into the dart.',
  ],
  muslin: ['Slash from waist to hem and let a strip in, {amount} wide between its seams.'],
});

const tuck = (piece: 'front' | 'back'): ChainStep => ({
  piece,
  operator: 'parallel-tuck',
  perMm: 1,
  run: (one, mm) => parallelTuck(one, lengthwise(one, mm)),
  paper: [
    'Draw two lines beside the grain line from waist to hem, {amount} apart.',
    'Fold the one onto the other and tape; draw a new grain line in the middle.',
  ],
  muslin: ['Stitch a long tuck beside the crease that takes {amount} of cloth.'],
});

const band = (sign: 1 | -1): Chain => [
  {
    piece: 'waistband',
    operator: 'contour-band',
    // The amount is round; each half of the band takes half of it.
    perMm: 0.5,
    run: (one, mm) => contourBand(one, sign * mm),
    paper: [
      'Slash the band at four places from its top edge to the stitching line of the lower edge.',
      sign > 0
        ? 'Lap each slash alike, so that the top edge of this half is {amount} shorter in all.'
        : 'Spread each slash alike, so that the top edge of this half is {amount} longer in all.',
      'Run both edges smooth; the lower edge measures as before.',
    ],
  },
];

const backInseam = (sign: 1 | -1): Chain => [
  {
    piece: 'back',
    operator: taper(sign),
    perMm: 1,
    run: (one, mm) => thighAtInseam(one, sign * mm),
    paper: edgeSteps(
      sign,
      'of the inseam, 60 mm below the crotch point',
      'at the point and 275 mm down',
      false,
    ),
    muslin: seamOnMuslin(sign),
  },
];

const dartStep = (operator: ChainStep['operator'], run: ChainStep['run'], paper: string[]): ChainStep => ({
  piece: 'back',
  operator,
  perMm: 1,
  run,
  paper,
  muslin: ['Unpick the dart and stitch it on the new line.'],
});

const dartPoint = (sign: 1 | -1): Chain => [
  dartStep('move-dart-point', (one, mm) => moveDartPoint(one, { dart: 'dart-1', amountMm: sign * mm }), [
    `Mark the dart's point {amount} ${sign > 0 ? 'lower' : 'higher'}, on the line through the middle of its mouth.`,
    'Draw both legs to it and measure them: they must be equal.',
  ]),
];

const side = (sign: 1 | -1): Chain =>
  onBoth({
    operator: 'reshape-edge',
    run: (piece, mm) => reshapeSide(piece, sign * mm),
    paper: [
      `Mark {amount} ${way(sign)} the side edge, half way between waist and hip.`,
      'Draw the edge through the mark from waist to hip, without a corner at either.',
    ],
    muslin: seamOnMuslin(sign),
  });

/** Paper for what runs round: hip, waist, thigh, darts, band. */
export const widthChains: Readonly<Record<string, Chain>> = {
  'let-out-hip-side': sides(1, hipAtSide, 'at the hip', 'at waist and thigh'),
  'take-in-hip-side': sides(-1, hipAtSide, 'at the hip', 'at waist and thigh'),
  'let-out-centre-back': [centreBack(1)],
  'take-in-centre-back': [centreBack(-1)],
  'spread-back': [spread('back')],
  'spread-front': [spread('front')],
  'narrow-front': [tuck('front')],
  'narrow-back': [tuck('back')],
  'round-out-side': side(1),
  'flatten-side': side(-1),
  'let-out-waist-front': [waist('front', 1)],
  'take-in-waist-front': [waist('front', -1)],
  'let-out-waist-back': [waist('back', 1)],
  'take-in-waist-back': [waist('back', -1)],
  'deepen-back-dart': [
    dartStep('resize-dart', (one, mm) => resizeDart(one, { dart: 'dart-1', along: 'waist', amountMm: mm }), [
      'Mark half of {amount} beyond each leg of the dart at the waist.',
      'Draw both legs from there to the old point, fold the dart shut and draw its cap with the waist.',
    ]),
  ],
  'lengthen-back-dart': dartPoint(1),
  'shorten-back-dart': dartPoint(-1),
  'contour-waistband': band(1),
  'straighten-waistband': band(-1),
  'let-out-thigh-side': sides(1, thighAtSide, 'a little below the fork', 'at the hip notch and the knee'),
  'take-in-thigh-side': sides(-1, thighAtSide, 'a little below the fork', 'at the hip notch and the knee'),
  'let-out-back-inseam': backInseam(1),
  'take-in-back-inseam': backInseam(-1),
};
