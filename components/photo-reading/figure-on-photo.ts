import type { PhotoDto } from '@/db/queries/photos';
import type { LandmarkInput } from '@/db/queries/landmarks';
import { figureToPhoto, placeFigure, type FigurePlacement, type PhotoFrame } from '@/diagnosis/figure/align';
import { landmarks, type FigureView } from '@/diagnosis/figure/figure';
import { photoPoint } from '@/diagnosis/figure/point';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';

export type ShownPhoto = Pick<PhotoDto, 'view' | 'isMirrored' | 'widthPx' | 'heightPx'>;

/** The two points that are asked for first: far apart, and found without searching. */
export const FIRST_TAPS: Record<FigureView, readonly [string, string]> = {
  front: ['waist-centre', 'fork'],
  back: ['waist-centre', 'fork'],
  left: ['waist', 'under-seat'],
  right: ['waist', 'under-seat'],
  seated: ['waist', 'knee'],
};

export const isFigureView = (view: ShownPhoto['view']): view is FigureView => view !== 'close-up';

/** Photo and view as the figure needs them; null for a close-up, which has no figure. */
export function frameOf({ view, isMirrored, widthPx, heightPx }: ShownPhoto): PhotoFrame | null {
  return isFigureView(view) ? { view, widthPx, heightPx, mirrored: isMirrored } : null;
}

/** How the drawn figure lies over a photo by the points that were tapped; null for fewer than two of this view. */
export function placementOf(photo: ShownPhoto, tapped: readonly LandmarkInput[]): FigurePlacement | null {
  const frame = frameOf(photo);
  if (!frame) return null;
  const own = new Map(landmarks(frame.view, REFERENCE_PROPORTIONS).map(({ id, at }) => [id, at]));
  const taps = tapped.flatMap(({ landmark, x, y }) => {
    const figure = own.get(landmark);
    return figure ? [{ figure, photo: photoPoint(x, y) }] : [];
  });
  return placeFigure(frame, taps);
}

export interface ShownPoint {
  id: string;
  at: { x: number; y: number };
  /** Set by hand, or only where the drawing puts it. */
  isSet: boolean;
}

/** Every point of the figure that lies on the photo: those set by hand where they were set, the others where the drawing has them. */
export function shownPoints(
  view: FigureView,
  placement: FigurePlacement | null,
  tapped: readonly LandmarkInput[],
): ShownPoint[] {
  const set = new Map(tapped.map((one) => [one.landmark, { x: one.x, y: one.y }]));
  return landmarks(view, REFERENCE_PROPORTIONS).flatMap(({ id, at }): ShownPoint[] => {
    const own = set.get(id);
    if (own) return [{ id, at: own, isSet: true }];
    const shown = placement && figureToPhoto(placement, at);
    const isInside = shown && shown.x >= 0 && shown.x <= 1 && shown.y >= 0 && shown.y <= 1;
    return isInside ? [{ id, at: shown, isSet: false }] : [];
  });
}
