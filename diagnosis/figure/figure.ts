import type { View, Zone } from '../garments/schema';
import { buildZones, type ZoneRegion } from './mesh';
import type { FigurePoint, Side } from './point';
import { polygonHolds } from './polygon';
import type { Proportions } from './proportions';
import { standingGarment } from './garment-front-back';
import { sideGarment } from './garment-side';
import type { Garment, Landmark } from './garment';

/** The views that are drawn; a close-up has no figure of its own. */
export type FigureView = Exclude<View, 'close-up'>;

export type ZoneAt = { readonly zone: Zone; readonly side: Side | null };

/** The garment of one view: its edges and seams as cubic Béziers, its landmarks, and the sheets that its zones are cut from. */
export function figureGarment(view: FigureView, proportions: Proportions): Garment {
  return view === 'front' || view === 'back'
    ? standingGarment(view, proportions)
    : sideGarment(view, proportions);
}

/** The zones of a view as polygons that tile the garment, in figure coordinates. */
export function figureZones(view: FigureView, proportions: Proportions): ZoneRegion[] {
  return buildZones(figureGarment(view, proportions).sheets).zones;
}

/** The garment's outline sampled at the corners of its zones. */
export function garmentPolygon(view: FigureView, proportions: Proportions): FigurePoint[] {
  return buildZones(figureGarment(view, proportions).sheets).outline;
}

/**
 * The zone under a point, or null off the garment. `side` is the wearer's; null where a zone crosses the centre line.
 */
export function zoneAt(view: FigureView, proportions: Proportions, point: FigurePoint): ZoneAt | null {
  const found = figureZones(view, proportions).find(({ polygon }) => polygonHolds(polygon, point));
  return found ? { zone: found.zone, side: found.side } : null;
}

/** The named points of a view, from the waist down. */
export function landmarks(view: FigureView, proportions: Proportions): readonly Landmark[] {
  return figureGarment(view, proportions).landmarks;
}

/**
 * +1 where a picture of the view shows growing x toward its right, −1 toward its left. From the front the wearer's left
 * is at the picture's right; from behind it is at the left; seen from their left the wearer faces the picture's left.
 */
export function pictureDirection(view: FigureView): 1 | -1 {
  return view === 'front' || view === 'right' ? 1 : -1;
}
