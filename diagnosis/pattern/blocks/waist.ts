import { lengthOf, parameterAtLength, splitCubic } from '../geometry/cubic';
import { minus, plus, times, unit, xy, type XY } from '../geometry/xy';
import { part, type Part } from '../piece';
import { waistCubic, type Corners } from './outline';

/** The waist edge with one dart let in, and the dart's point. The dart takes whatever the sewn width leaves. */
export function waistWithDart(
  corners: Corners,
  { sewnMm, place, lengthMm }: { sewnMm: number; place: number; lengthMm: number },
): { parts: Part[]; point: XY | null; intakeMm: number } {
  const cubic = waistCubic(corners);
  const paperMm = lengthOf(cubic);
  const intakeMm = paperMm - sewnMm;
  if (intakeMm < 1) return { parts: [part('waist', cubic, 'side-waist')], point: null, intakeMm: 0 };
  const startMm = sewnMm * place;
  const [before, rest] = splitCubic(cubic, parameterAtLength(cubic, startMm));
  const [mouth, after] = splitCubic(rest, parameterAtLength(rest, intakeMm));
  const across = unit(minus(mouth.to, mouth.from));
  const middle = times(plus(mouth.from, mouth.to), 1 / 2);
  return {
    parts: [
      part('waist', before, 'side-waist'),
      part('dart-1', mouth, 'dart-1-out'),
      part('waist', after, 'dart-1-in'),
    ],
    point: plus(middle, times(xy(-across.y, across.x), lengthMm)),
    intakeMm,
  };
}

/** Length that the waist edge has on paper, mm. */
export const waistPaperMm = (corners: Corners): number => lengthOf(waistCubic(corners));
