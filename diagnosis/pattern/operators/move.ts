import { solve } from '../geometry/cubic';
import { plus, times, type XY } from '../geometry/xy';
import { bendAll, type Stretch } from '../bend';
import { seamLength } from '../measure';
import type { Piece } from '../piece';
import type { Declared, Outcome } from './outcome';

/** Stretches of outline moved by one vector, running to nothing at their ends. */
export interface Move {
  readonly stretches: readonly Stretch[];
  /** The vector, mm. */
  readonly by: XY;
  /** Marks that go along, each with its weight. */
  readonly marks?: Readonly<Record<string, number>>;
  readonly declared: readonly Declared[];
}

/** A seam that must keep its length: after the move, `stretches` slide along `direction` until it does. */
export interface Slide {
  readonly from: string;
  readonly to: string;
  readonly stretches: readonly Stretch[];
  readonly direction: XY;
}

/** How far the slide is looked for, mm: no seam within the stop marks needs more. */
const SLIDE_MM = 60;

/** A stretch between two named points. */
export const stretch = (
  from: string,
  to: string,
  weights: readonly [number, number],
  shape: Stretch['shape'] = 'smooth',
  by: Stretch['by'] = 'length',
): Stretch => ({ from: { point: from }, to: { point: to }, weights, shape, by });

/** Move what is named and let its neighbours run to nothing. */
export function move(piece: Piece, { stretches, by, marks = {}, declared }: Move): Outcome {
  const bent = bendAll(piece, stretches, by);
  const carried = Object.entries(marks)
    .filter(([name]) => name in bent.marks)
    .map(([name, weight]) => [name, plus(bent.marks[name]!, times(by, weight))]);
  return {
    before: piece,
    piece: { ...bent, marks: { ...bent.marks, ...Object.fromEntries(carried) } },
    declared,
    drawn: {},
  };
}

/** The piece with the stretches slid until the seam measures `wantedMm`. */
export function slideUntil(piece: Piece, slide: Slide, wantedMm: number): Piece {
  const [from, to] = [{ point: slide.from }, { point: slide.to }];
  const at = (mm: number) => bendAll(piece, slide.stretches, times(slide.direction, mm));
  const mm = solve((tried) => seamLength(at(tried), from, to) - wantedMm, -SLIDE_MM, SLIDE_MM, 0);
  return at(mm);
}

/**
 * As {@link move}; the seams then get back their lengths by sliding, as a pattern maker lowers a lengthened crotch point until the
 * inseam measures as before. Several seams are slid in turn, thrice, since each moves the others a little; the last is exact.
 */
export function moveAndSlide(piece: Piece, args: Move, ...slides: readonly Slide[]): Outcome {
  const wanted = slides.map(({ from, to }) => seamLength(piece, { point: from }, { point: to }));
  const moved = move(piece, args);
  let slid = moved.piece;
  for (let turn = 0; turn < (slides.length > 1 ? 3 : 1); turn++)
    for (const [index, slide] of slides.entries()) slid = slideUntil(slid, slide, wanted[index]!);
  return { ...moved, piece: slid };
}
