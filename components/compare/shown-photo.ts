import { type Mark, type MarkSeverity, photoPoint } from '@/components/marks/model/mark';
import { placementOf } from '@/components/photo-reading/figure-on-photo';
import type { MarkedPhotoDto } from '@/db/queries/marked-photos';
import { type Affine, layOver } from '@/diagnosis/photo/lay-over';

/** The marks of a photo as the drawing takes them. */
export const marksOf = (photo: MarkedPhotoDto): Mark[] =>
  photo.marks.map((mark) => ({
    ...mark,
    severity: Math.min(3, Math.max(1, mark.severity)) as MarkSeverity,
    points: mark.points.map(({ x, y }) => photoPoint(x, y)),
  }));

/** How the one photo is laid over the other by the figure on both; null where it does not lie on both. */
export function overMap(photo: MarkedPhotoDto, onto: MarkedPhotoDto): Affine | null {
  const [from, to] = [placementOf(photo, photo.landmarks), placementOf(onto, onto.landmarks)];
  return from && to ? layOver(from, to) : null;
}
