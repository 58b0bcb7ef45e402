import type { Mark } from '@/components/marks/model/mark';
import type { LandmarkInput } from '@/db/queries/landmarks';
import { photoPoint } from '@/diagnosis/figure/point';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';
import type { Sign, Zone } from '@/diagnosis/garments/schema';
import { bodyMark, type BodyMark } from '@/diagnosis/photo/body-mark';
import { bundleMarks } from '@/diagnosis/photo/bundle';
import { readFigure, type ReadFigure } from '@/diagnosis/photo/read-figure';
import { isFigureView, placementOf, type ShownPhoto } from './figure-on-photo';

export interface MarksOnBody {
  figure: ReadFigure;
  marks: BodyMark[];
}

type DrawnOnPhoto = Pick<Mark, 'id' | 'kind' | 'severity' | 'side'> & {
  points: readonly { x: number; y: number }[];
};

/** The marks of a photo carried onto the body; null while the figure does not lie on the photo. */
export function marksOnBody(
  photo: ShownPhoto,
  tapped: readonly LandmarkInput[],
  marks: readonly DrawnOnPhoto[],
): MarksOnBody | null {
  const placement = placementOf(photo, tapped);
  if (!placement || !isFigureView(photo.view)) return null;
  const figure = readFigure(photo.view, REFERENCE_PROPORTIONS);
  const drawn = marks.map(({ id, kind, severity, side, points }) => ({
    id,
    kind,
    severity,
    side,
    points: points.map(({ x, y }) => photoPoint(x, y)),
  }));
  return { figure, marks: drawn.map((mark) => bodyMark(figure, placement, mark)) };
}

/** The marks that lie together with the chosen one; all of them where none is chosen. */
export function marksAtHand(marks: readonly BodyMark[], selected: string | null): readonly BodyMark[] {
  const bundle = bundleMarks(marks).find((one) => one.marks.some(({ id }) => id === selected));
  return bundle?.marks ?? marks;
}

/** The signs of the places that these marks lie in: what one has looked at who has marked there. */
export function signsOfPlaces(signs: readonly Sign[], marks: readonly BodyMark[]): Sign[] {
  const zones = new Set<Zone>(marks.flatMap((mark) => mark.zones.map(({ zone }) => zone)));
  return signs.filter(({ zone }) => zones.has(zone));
}
