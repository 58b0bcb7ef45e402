import { pictureDirection, type FigureView } from './figure';
import { figurePoint, photoPoint, type FigurePoint, type PhotoPoint } from './point';
import { applySimilarity, fitSimilarity, invertSimilarity, type Similarity } from './similarity';

/** What is known of a photo before it is placed: its view, its size in pixels, and whether it shows a mirror image. */
export type PhotoFrame = {
  readonly view: FigureView;
  readonly widthPx: number;
  readonly heightPx: number;
  readonly mirrored: boolean;
};

export type LandmarkTap = { readonly figure: FigurePoint; readonly photo: PhotoPoint };

/** How the figure lies over a photo. */
export type FigurePlacement = {
  readonly frame: PhotoFrame;
  /** From the figure as the photo shows it (turned to the view's side) to photo widths. */
  readonly map: Similarity;
  /** One crotch depth, as a fraction of the photo's width. */
  readonly unitWidths: number;
  /** How far the camera or the wearer is turned, in degrees clockwise on the photo. */
  readonly turnDeg: number;
  /** Root of the mean squared miss of the landmarks, in crotch depths; 0 for two landmarks. */
  readonly rms: number;
};

/** +1 where the photo shows the figure's growing x toward its right. */
function shownDirection({ view, mirrored }: PhotoFrame): 1 | -1 {
  return mirrored === (pictureDirection(view) === 1) ? -1 : 1;
}

/**
 * Lays the figure over a photo by two or more landmarks. Lengths are compared in photo widths on both axes, because
 * fractions of a picture that is not square are not alike across and down.
 * @returns null for fewer than two landmarks, or where they coincide: the photo then stays without body coordinates.
 */
export function placeFigure(frame: PhotoFrame, taps: readonly LandmarkTap[]): FigurePlacement | null {
  const direction = shownDirection(frame);
  const fit = fitSimilarity(
    taps.map(({ figure, photo }) => ({
      from: { x: direction * figure.x, y: figure.y },
      to: { x: photo.x, y: (photo.y * frame.heightPx) / frame.widthPx },
    })),
  );
  if (fit === null) return null;
  return { frame, map: fit.map, unitWidths: fit.scale, turnDeg: fit.turnDeg, rms: fit.rms / fit.scale };
}

/** A point of the photo in figure coordinates: x is the wearer's left (or front), also in mirror photos. */
export function photoToFigure({ frame, map }: FigurePlacement, { x, y }: PhotoPoint): FigurePoint {
  const shown = applySimilarity(invertSimilarity(map), { x, y: (y * frame.heightPx) / frame.widthPx });
  return figurePoint(shownDirection(frame) * shown.x, shown.y);
}

/** Where a point of the figure lies on the photo; may fall outside 0–1. */
export function figureToPhoto({ frame, map }: FigurePlacement, { x, y }: FigurePoint): PhotoPoint {
  const shown = applySimilarity(map, { x: shownDirection(frame) * x, y });
  return photoPoint(shown.x, (shown.y * frame.widthPx) / frame.heightPx);
}
