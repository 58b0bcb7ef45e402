import { extendPoint, reshapeCurve, slopeHem } from '../operators/fork';
import { kneeBothEdges, shiftKnee, shiftLeg, swingLeg } from '../operators/leg';
import { calfBothEdges, foldAcross, hemBothEdges, shiftKneeLine, shiftSide } from '../operators/lower-leg';
import type { Outcome } from '../operators/outcome';
import { pivotCentre } from '../operators/waist';
import type { Piece } from '../piece';
import type { Chain, ChainStep } from './chain';
import { onBoth } from './depth';

const point = (piece: 'front' | 'back', sign: 1 | -1): Chain => [
  {
    piece,
    operator: 'extend-point',
    perMm: 1,
    run: (one, mm) => extendPoint(one, sign * mm),
    paper: [
      `Mark the crotch point {amount} further ${sign > 0 ? 'out' : 'in'} along the crotch line.`,
      'Draw the curve from the notch to the new point; above the notch nothing moves.',
      'Draw the inseam from the new point to nothing at the knee, measure it, and let the point up or down until it is as long as before.',
    ],
    ...(sign < 0 ? { muslin: ['Take the inseam in by {amount} at the fork, to nothing at the knee.'] } : {}),
  },
];

const curve = (piece: 'front' | 'back', sign: 1 | -1): Chain => [
  {
    piece,
    operator: 'reshape-curve',
    perMm: 1,
    run: (one, mm) => reshapeCurve(one, sign * mm),
    paper: [
      `Mark {amount} ${sign > 0 ? 'inside' : 'outside'} the curve at its deepest place.`,
      'Draw the curve through the mark; the notch and the crotch point stay, and no corner is left at either.',
    ],
    ...(sign > 0 ? { muslin: ['Stitch the curve {amount} lower at its deepest, then trim it.'] } : {}),
  },
];

/** `toSide` −1: the centre leans to the side seam; +1: outward. */
const slope = (piece: 'front' | 'back', direction: 1 | -1): Chain => [
  {
    piece,
    operator: 'pivot-centre',
    perMm: 1,
    run: (one, mm) => pivotCentre(one, direction * mm),
    paper: [
      `Mark {amount} ${direction > 0 ? 'further out' : 'nearer the side'} at the top of centre ${piece}, and draw it straight from the hip.`,
      `Move the side by {amount} the same way at the waist, to nothing at the hip: the waist is as wide as before.`,
      'Move the dart with the waist, and square the waist at the centre.',
    ],
  },
];

type Leg = (piece: Piece, mm: number) => Outcome;
const bothSeams = (operator: ChainStep['operator'], run: Leg, words: readonly string[]): Chain =>
  onBoth({ operator, run, paper: words });
const toward = (sign: 1 | -1) => (sign > 0 ? 'toward the inseam' : 'toward the side');

const swing = (sign: 1 | -1): Chain =>
  bothSeams('swing-leg', (piece, mm) => swingLeg(piece, sign * mm), [
    `Mark both ends of the hem {amount} ${toward(sign)}.`,
    'Draw both seams from the thigh to the new hem: they move alike, so that every width stays.',
    'Square the hem again.',
  ]);
const knee = (sign: 1 | -1): Chain =>
  bothSeams('shift-leg', (piece, mm) => shiftKnee(piece, sign * mm), [
    `Mark the knee {amount} ${toward(sign)} on both seams.`,
    'Draw both seams smoothly through the marks, from thigh to hem.',
  ]);
const leg = (sign: 1 | -1): Chain =>
  bothSeams('shift-leg', (piece, mm) => shiftLeg(piece, sign * mm), [
    `Mark knee and hem {amount} ${toward(sign)} on both seams, and the grain line with them.`,
    'Draw the side from the hip, and the inseam from the crotch point, smoothly into the shifted leg.',
  ]);

const fourEdges = (run: Leg, sign: 1 | -1, place: string, ends: string): Chain =>
  onBoth({
    operator: sign > 0 ? 'let-out-taper' : 'take-in-taper',
    run: (piece, mm) => run(piece, sign * mm),
    paper: [
      `Mark {amount} ${sign > 0 ? 'outside' : 'inside'} both edges ${place}.`,
      `Draw both edges smoothly through the marks, ${ends}.`,
      'All four edges of a leg move alike, or it twists.',
    ],
    muslin: ['Stitch inseam and side seam on the new lines, both by the same amount.'],
  });

const fold = (
  operator: ChainStep['operator'],
  level: string,
  sign: 1 | -1,
  paper: readonly string[],
): Chain => [
  { piece: 'back', operator, perMm: 1, run: (one, mm) => foldAcross(one, level, sign * mm), paper },
];

const kneeLine = (sign: 1 | -1): Chain =>
  bothSeams('shift-knee-line', (piece, mm) => shiftKneeLine(piece, sign * mm), [
    `Mark the knee line {amount} ${sign > 0 ? 'lower' : 'higher'} on both seams, as wide as it was.`,
    'Draw both seams through the marks, to nothing at mid-thigh and hem.',
  ]);

const sideForward = (sign: 1 | -1): Chain =>
  (['front', 'back'] as const).map((piece) => {
    const gains = (piece === 'back') === sign > 0;
    return {
      piece,
      operator: 'shift-seam',
      perMm: 1,
      run: (one, mm) => shiftSide(one, gains ? mm : -mm),
      paper: [
        `Mark {amount} ${gains ? 'outside' : 'inside'} the side edge at the hem.`,
        'Draw the side from there to nothing at the knee.',
      ],
    };
  });

const hem = (sign: 1 | -1): Chain => [
  {
    piece: 'back',
    operator: 'slope-hem',
    perMm: 1,
    run: (piece, mm) => slopeHem(piece, sign * mm),
    paper: [
      `Mark {amount} ${sign > 0 ? 'below' : 'above'} the hem of the back, in its middle.`,
      'Draw the hem through the mark to nothing at both seams; cut its facing to the same line.',
    ],
    muslin: [
      `Chalk the hem ${sign > 0 ? 'lower' : 'higher'} behind, to nothing at the seams, and turn it up on the chalk.`,
    ],
  },
];

/** Paper for the fork, the slopes and the leg. */
export const forkAndLegChains: Readonly<Record<string, Chain>> = {
  'extend-back-point': point('back', 1),
  'shorten-back-point': point('back', -1),
  'extend-front-point': point('front', 1),
  'shorten-front-point': point('front', -1),
  'hollow-back-curve': curve('back', 1),
  'fill-back-curve': curve('back', -1),
  'deepen-front-curve': curve('front', 1),
  'fill-front-curve': curve('front', -1),
  'more-back-slope': slope('back', -1),
  'less-back-slope': slope('back', 1),
  'more-front-slope': slope('front', 1),
  'less-front-slope': slope('front', -1),
  'shape-under-seat': fold('shaped-seam', 'thigh', 1, [
    'Draw the fold across the back under the seat: {amount} wide in the middle, nothing at the stitching lines of side and inseam.',
    'Draw a line down the middle of the back leg and cut along it to the fold; it becomes a seam.',
    'Lap the fold shut in each half, hinged on its own seam line, and draw the new seam curved where the halves bend apart.',
  ]),
  'swing-leg-in': swing(1),
  'swing-leg-out': swing(-1),
  'shift-knee-in': knee(1),
  'shift-knee-out': knee(-1),
  'shift-leg-in': leg(1),
  'shift-leg-out': leg(-1),
  'let-out-calf': fourEdges(calfBothEdges, 1, 'at the calf', 'to nothing at the knee and half of it at the hem'),
  'let-out-knee': fourEdges(kneeBothEdges, 1, 'at the knee', 'to nothing at mid-thigh and calf'),
  'take-in-knee': fourEdges(kneeBothEdges, -1, 'at the knee', 'to nothing at mid-thigh and calf'),
  'shorten-behind-knee': fold('hinged-overlap', 'knee', 1, [
    'Draw a wedge across the back at the knee: {amount} wide in the middle, nothing at the stitching lines of side and inseam.',
    'Lap it shut from the middle, hinged at both seams; press the paper flat and ease what stands up into the seams.',
    'Walk both seams: they measure as before.',
  ]),
  'lengthen-under-seat': fold('shaped-seam', 'thigh', -1, [
    'Draw a line across the back under the seat, and one down the middle of the back leg, which becomes a seam.',
    'Cut both; in each half spread the cross line from the new seam, {amount} in all there, hinged on the stitching line of side or inseam.',
    'Draw the new seam smooth; side and inseam measure as before.',
  ]),
  'lengthen-behind-knee': fold('hinged-spread', 'knee', -1, [
    'Draw a line across the back at the knee, between the stitching lines of side and inseam.',
    'Open it by {amount} in the middle, hinged at both seams; let the paper bubble and ease what stands up.',
    'Walk both seams: they measure as before.',
  ]),
  'take-in-calf': fourEdges(calfBothEdges, -1, 'at the calf', 'to nothing at the knee and half of it at the hem'),
  'let-out-hem': fourEdges(hemBothEdges, 1, 'at the hem', 'to nothing at the knee'),
  'take-in-hem': fourEdges(hemBothEdges, -1, 'at the hem', 'to nothing at the knee'),
  'lower-knee-line': kneeLine(1),
  'raise-knee-line': kneeLine(-1),
  'bring-side-seam-forward': sideForward(1),
  'bring-side-seam-back': sideForward(-1),
  'lower-hem-behind': hem(1),
  'level-hem': hem(-1),
}; // prettier-ignore
