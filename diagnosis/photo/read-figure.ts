import { figureZones, landmarks, type FigureView } from '../figure/figure';
import type { Landmark } from '../figure/garment';
import type { ZoneRegion } from '../figure/mesh';
import type { FigurePoint, Side } from '../figure/point';
import { polygonArea, polygonHolds } from '../figure/polygon';
import type { Proportions } from '../figure/proportions';
import type { Zone } from '../garments/schema';

type Ring = { readonly zone: Zone; readonly side: Side | null; readonly polygon: readonly FigurePoint[] };

/** A drawn figure laid out for reading marks on it: made once for a view and a body. */
export type ReadFigure = {
  readonly view: FigureView;
  readonly rings: readonly Ring[];
  readonly landmarks: readonly Landmark[];
  /** Share (0–1) of the garment's area that a zone takes in this view, both sides together; absent where it is not seen. */
  readonly areaShares: ReadonlyMap<Zone, number>;
};

function sharesOf(regions: readonly ZoneRegion[]): Map<Zone, number> {
  const areas = regions.map(({ polygon }) => polygonArea(polygon));
  const total = areas.reduce((sum, area) => sum + area, 0);
  const shares = new Map<Zone, number>();
  regions.forEach(({ zone }, i) => shares.set(zone, (shares.get(zone) ?? 0) + areas[i]! / total));
  return shares;
}

export function readFigure(view: FigureView, proportions: Proportions): ReadFigure {
  const rings = figureZones(view, proportions);
  return { view, rings, landmarks: landmarks(view, proportions), areaShares: sharesOf(rings) };
}

type XY = { readonly x: number; readonly y: number };

/** Distance from a point to a stretch between two points. */
export function distanceToStretch({ x, y }: XY, a: XY, b: XY): number {
  const [dx, dy] = [b.x - a.x, b.y - a.y];
  const size = dx * dx + dy * dy;
  const along = size > 0 ? Math.min(1, Math.max(0, ((x - a.x) * dx + (y - a.y) * dy) / size)) : 0;
  return Math.hypot(x - a.x - along * dx, y - a.y - along * dy);
}

/** Distance to the zone in crotch depths, 0 within it, on either side of the body; Infinity where the view does not show it. */
export function distanceToZone(figure: ReadFigure, zone: Zone, point: FigurePoint): number {
  let least = Infinity;
  for (const ring of figure.rings) {
    if (ring.zone !== zone) continue;
    if (polygonHolds(ring.polygon, point)) return 0;
    ring.polygon.forEach((a, i) => {
      const b = ring.polygon[(i + 1) % ring.polygon.length]!;
      least = Math.min(least, distanceToStretch(point, a, b));
    });
  }
  return least;
}

/** x of the side seam at a height, in the views from the side; read from the landmarks that lie on it. */
export function seamX(figure: ReadFigure, y: number): number {
  const on = figure.landmarks.filter(({ name }) =>
    ['waist', 'high-hip', 'hip', 'thigh', 'hem'].includes(name),
  );
  const sorted = on.map(({ at }) => at).sort((a, b) => a.y - b.y);
  const below = sorted.findIndex((at) => at.y >= y);
  if (below <= 0) return (below === 0 ? sorted[0] : sorted.at(-1))?.x ?? 0;
  const [a, b] = [sorted[below - 1]!, sorted[below]!];
  return a.x + ((b.x - a.x) * (y - a.y)) / (b.y - a.y);
}
