import type { Mark } from '@/components/marks/model/mark';
import type { LandmarkInput } from '@/db/queries/landmarks';
import type { FigurePlacement } from '@/diagnosis/figure/align';
import type { FigureView } from '@/diagnosis/figure/figure';
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

const figures = new Map<FigureView, ReadFigure>();
function figureOf(view: FigureView): ReadFigure {
  const figure = figures.get(view) ?? readFigure(view, REFERENCE_PROPORTIONS);
  figures.set(view, figure);
  return figure;
}

/** A mark is a new object whenever it changes; with the same figure in the same place it lies where it lay. */
const carried = new WeakMap<DrawnOnPhoto, { placed: string; body: BodyMark }>();

function carry(figure: ReadFigure, placement: FigurePlacement, mark: DrawnOnPhoto): BodyMark {
  const placed = JSON.stringify([placement.frame, placement.map]);
  const had = carried.get(mark);
  if (had?.placed === placed) return had.body;
  const { id, kind, severity, side } = mark;
  const points = mark.points.map(({ x, y }) => photoPoint(x, y));
  const body = bodyMark(figure, placement, { id, kind, severity, side, points });
  carried.set(mark, { placed, body });
  return body;
}

/** The marks of a photo carried onto the body; null while the figure does not lie on the photo. */
export function marksOnBody(
  photo: ShownPhoto,
  tapped: readonly LandmarkInput[],
  marks: readonly DrawnOnPhoto[],
): MarksOnBody | null {
  const placement = placementOf(photo, tapped);
  if (!placement || !isFigureView(photo.view)) return null;
  const figure = figureOf(photo.view);
  return { figure, marks: marks.map((mark) => carry(figure, placement, mark)) };
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
