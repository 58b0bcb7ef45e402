import { pointAt } from '../geometry/cubic';
import type { Block } from '../blocks/block';
import { read, type Measure } from '../measure';
import { indexOfPoint, pointOf, walkFrom, type Piece } from '../piece';

/**
 * What a weighted sum of needs means on the paper: a measure that the geometry can be asked for. A need of girth counts both
 * halves of the garment (leg girths: one leg), so that one piece's width counts twice where both halves are meant.
 */
export interface PaperSum {
  readonly id: string;
  /** Millimetres of the measure for one millimetre of need, in the need's own basis. */
  readonly weights: Readonly<Record<string, number>>;
  readonly measure: (block: Block) => number;
}

const HALVES = 2;
const seam = (from: string, to: string): Measure => ({
  of: 'seam',
  from: { point: from },
  to: { point: to },
});
const width = (level: string): Measure => ({ of: 'width', level });
const offset = (point: string, from: string, axis: 'x' | 'y'): Measure => ({
  of: 'offset',
  point,
  from,
  axis,
});
const edge = (name: string): Measure => ({ of: 'edge', edge: name });

const once = (id: string, dimension: string, piece: keyof Block, measure: Measure, factor = 1): PaperSum => ({
  id,
  weights: { [dimension]: 1 },
  measure: (block) => factor * read(block[piece], measure),
});
const leg = (id: string, dimension: string, level: string): PaperSum => ({
  id,
  weights: { [dimension]: 1 },
  measure: ({ front, back }) => read(front, width(level)) + read(back, width(level)),
});

/** The farthest that the outline between two points lies off the line joining them, outward (`sign` +1) or inward, mm. */
function deepest(piece: Piece, from: string, to: string, sign: 1 | -1): number {
  const [a, b] = [pointOf(piece, from), pointOf(piece, to)];
  const chord = Math.hypot(b.x - a.x, b.y - a.y);
  const depths = walkFrom(piece, indexOfPoint(piece, from), indexOfPoint(piece, to)).flatMap((index) =>
    Array.from({ length: 33 }, (_, step) => {
      const { x, y } = pointAt(piece.parts[index]!.cubic, step / 32);
      return (sign * ((x - a.x) * (b.y - a.y) - (y - a.y) * (b.x - a.x))) / chord;
    }),
  );
  return Math.max(...depths);
}

/** The middle of the leg at knee or hem, toward the inseam from the hip, mm. */
const middle = (piece: Piece, level: 'knee' | 'hem') =>
  (read(piece, offset(`${level}-in`, 'hip-in', 'x')) + read(piece, offset(`${level}-out`, 'hip-in', 'x'))) /
  2;

/** How much of a swing at the hem arrives at the knee: the leg turns at the thigh. */
const swingAtKnee = ({ front }: Block) => {
  const [thigh, knee, hem] = [front.marks.thigh!.y, front.marks.knee!.y, pointOf(front, 'hem-in').y];
  return (knee - thigh) / (hem - thigh);
};

/** How far the middle of the hem hangs below its ends, mm. */
function hemFall(piece: Piece): number {
  const hem = walkFrom(piece, indexOfPoint(piece, 'hem-in'), indexOfPoint(piece, 'hem-out'));
  const falls = hem.map((index) => piece.parts[index]!.cubic.to.y - pointOf(piece, 'hem-in').y);
  return falls.reduce((most, fall) => (Math.abs(fall) > Math.abs(most) ? fall : most), 0);
}

/** The sums that this block can be asked for. */
export const paperSums = (block: Block): PaperSum[] => [
  { id: 'centre front, waist to notch', weights: { 'crotch-depth': 1, 'front-rise': 1 }, measure: ({ front }) => read(front, seam('centre-waist', 'notch')) },
  { id: 'centre back, waist to notch', weights: { 'crotch-depth': 1, 'back-rise': 1 }, measure: ({ back }) => read(back, seam('centre-waist', 'notch')) },
  { id: 'side waist above the fork', weights: { 'crotch-depth': 1, 'side-rise': 1 }, measure: ({ front }) => read(front, offset('crotch-point', 'side-waist', 'y')) },
  { id: 'side waist above the hem', weights: { 'leg-length': 1, 'side-rise': 1 }, measure: ({ front }) => read(front, offset('hem-out', 'side-waist', 'y')) },
  once('reach of the front point', 'front-extension', 'front', offset('crotch-point', 'notch', 'x')),
  once('reach of the back point', 'back-extension', 'back', offset('crotch-point', 'notch', 'x')),
  { id: 'hollow of the front curve', weights: { 'front-curve': 1 }, measure: ({ front }) => deepest(front, 'notch', 'crotch-point', -1) },
  { id: 'hollow of the back curve', weights: { 'back-curve': 1 }, measure: ({ back }) => deepest(back, 'notch', 'crotch-point', -1) },
  once('lean of centre front', 'front-slope', 'front', offset('centre-waist', 'hip-in', 'x')),
  once('lean of centre back', 'back-slope', 'back', offset('centre-waist', 'hip-in', 'x'), -1),
  once('front waist', 'waist-front', 'front', edge('waist'), HALVES),
  once('back waist', 'waist-back', 'back', edge('waist'), HALVES),
  once('width over the front', 'abdomen-width', 'front', width('abdomen'), HALVES),
  once('front hip', 'hip-front', 'front', width('hip'), HALVES),
  once('back hip', 'hip-back', 'back', width('hip'), HALVES),
  once('front thigh', 'front-thigh', 'front', width('thigh')),
  once('back thigh', 'back-thigh', 'back', width('thigh')),
  { id: 'round of the side above the hip', weights: { 'high-hip-curve': 1 }, measure: ({ front }) => deepest(front, 'hip-out', 'side-waist', 1) },
  once('back middle, hip to mid-thigh', 'under-seat-length', 'back', { of: 'middle', from: 'hip', to: 'mid-thigh' }),
  once('back middle, mid-thigh to calf', 'back-leg-length', 'back', { of: 'middle', from: 'mid-thigh', to: 'calf' }),
  once('height of the knee below the hip', 'knee-level', 'back', offset('knee-in', 'hip-in', 'y')),
  { id: 'hem of the back against the front', weights: { 'leg-twist': 1 }, measure: ({ front, back }) => (read(back, offset('hem-in', 'hem-out', 'x')) - read(front, offset('hem-in', 'hem-out', 'x'))) / 2 },
  leg('knee', 'knee-girth', 'knee'),
  leg('calf', 'calf-girth', 'calf'),
  { id: 'hem', weights: { 'hem-width': 1 }, measure: ({ front, back }) => read(front, offset('hem-in', 'hem-out', 'x')) + read(back, offset('hem-in', 'hem-out', 'x')) },
  { id: 'middle of the leg at the hem', weights: { 'leg-swing': 1, 'leg-centre': 1 }, measure: ({ front }) => middle(front, 'hem') },
  { id: 'middle of the leg at the knee', weights: { 'knee-shift': 1, 'leg-centre': 1, 'leg-swing': swingAtKnee(block) }, measure: ({ front }) => middle(front, 'knee') },
  once('length of the back dart', 'back-dart-point', 'back', { of: 'dart-length', dart: 'dart-1' }),
  { id: 'top edge of the band against the lower', weights: { 'waistband-contour': 1 }, measure: ({ waistband }) => HALVES * (read(waistband, edge('lower')) - read(waistband, edge('upper'))) },
  { id: 'fall of the back hem', weights: { 'hem-slope': 1 }, measure: ({ back }) => hemFall(back) },
]; // prettier-ignore

/** One sum: what the vector foretells of it and what the paper does, mm for one mm of amount. */
export interface Compared {
  readonly id: string;
  readonly declared: number;
  readonly drawn: number;
}

/** The vector of a correction against what its chain did to the block, one row for each sum that either moves. */
export function compareVector(
  { before, after }: { before: Block; after: Block },
  vector: readonly { readonly dimension: string; readonly perMm: number }[],
  amountMm: number,
): Compared[] {
  return paperSums(before).map(({ id, weights, measure }) => ({
    id,
    declared: vector.reduce((total, { dimension, perMm }) => total + (weights[dimension] ?? 0) * perMm, 0),
    drawn: (measure(after) - measure(before)) / amountMm,
  }));
}
