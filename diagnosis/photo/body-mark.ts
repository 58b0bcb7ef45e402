import type { FigurePlacement } from '../figure/align';
import { photoToFigure } from '../figure/align';
import type { FigureView } from '../figure/figure';
import type { LandmarkName } from '../figure/garment';
import { figurePoint, type FigurePoint, type PhotoPoint, type Side } from '../figure/point';
import type { Zone } from '../garments/schema';
import { distanceToZone, seamX, type ReadFigure } from './read-figure';

export type DrawnKind = 'tight' | 'slack' | 'gap' | 'pooling' | 'tilt' | 'pin';

/** A mark as it lies on a photo. `side` is what the person said; `both` where they said nothing. */
export type DrawnMark = {
  readonly id: string;
  readonly kind: DrawnKind;
  readonly severity: 1 | 2 | 3;
  readonly side: Side | 'both';
  readonly points: readonly PhotoPoint[];
};

export type NearLandmark = {
  readonly name: LandmarkName;
  readonly side: Side | null;
  /** In crotch depths. */
  readonly distance: number;
};

/** A mark on the body: all lengths in crotch depths, the wearer's side, also from mirror photos. */
export type BodyMark = {
  readonly id: string;
  readonly kind: DrawnKind;
  readonly severity: 1 | 2 | 3;
  readonly view: FigureView;
  readonly side: Side | null;
  /** `SAMPLES` points, evenly along the line, in the order it was drawn. */
  readonly path: readonly FigurePoint[];
  readonly length: number;
  /**
   * 0–180 from plumb: 0 upright, 90 level. Front and back: 45 goes down and out toward the side seam, 135 down and in. From
   * the side and seated: 45 goes down and back, 135 down and forward. Null for a pin.
   */
  readonly angleDeg: number | null;
  /** The same with 45 going down toward the side seam in every view: how a line seen from behind lies from the side. */
  readonly seamwardDeg: number | null;
  /** Zones that the line lies in, by their share of it (0–1), greatest first; empty off the garment. */
  readonly zones: readonly { readonly zone: Zone; readonly share: number }[];
  /** How close each sample lies to each zone of the view: 1 within, falling over about 0.07 of the crotch depth. */
  readonly closeness: ReadonlyMap<Zone, readonly number[]>;
  readonly ends: readonly [NearLandmark, NearLandmark];
};

export const SAMPLES = 9;
const ZONE_BLUR = 0.07;
const ON_CENTRE = 0.06;
const SEAM_ZONES: ReadonlySet<Zone> = new Set<Zone>(['side-seam', 'hip-side', 'high-hip-side', 'waist-side']);

const distance = (a: FigurePoint, b: FigurePoint) => Math.hypot(a.x - b.x, a.y - b.y);

/** The line as `count` points evenly along it, and its length. */
export function resample(
  points: readonly FigurePoint[],
  count: number,
): { path: FigurePoint[]; length: number } {
  const along = [0];
  points.slice(1).forEach((point, i) => along.push(along[i]! + distance(points[i]!, point)));
  const length = along.at(-1)!;
  let from = 0;
  const path = Array.from({ length: count }, (_, i) => {
    const wanted = (length * i) / (count - 1);
    while (from + 2 < points.length && along[from + 1]! < wanted) from += 1;
    const [a, b] = [points[from]!, points[from + 1] ?? points[from]!];
    const step = (along[from + 1] ?? 0) - along[from]!;
    const share = step > 0 ? (wanted - along[from]!) / step : 0;
    return figurePoint(a.x + (b.x - a.x) * share, a.y + (b.y - a.y) * share);
  });
  return { path, length };
}

export function middleOf(path: readonly FigurePoint[]): FigurePoint {
  const sum = path.reduce((total, { x, y }) => ({ x: total.x + x, y: total.y + y }), { x: 0, y: 0 });
  return figurePoint(sum.x / path.length, sum.y / path.length);
}

/** The way the line runs, going down: its long axis, so that a wiggle of the hand does not turn it. */
export function axisOf(path: readonly FigurePoint[]): { x: number; y: number } {
  const middle = middleOf(path);
  let [xx, xy, yy] = [0, 0, 0];
  for (const { x, y } of path) {
    xx += (x - middle.x) ** 2;
    xy += (x - middle.x) * (y - middle.y);
    yy += (y - middle.y) ** 2;
  }
  const turn = 0.5 * Math.atan2(2 * xy, xx - yy);
  const axis = { x: Math.cos(turn), y: Math.sin(turn) };
  return axis.y < 0 ? { x: -axis.x, y: -axis.y } : axis;
}

const isStanding = (view: FigureView) => view === 'front' || view === 'back';

/** +1 where growing x leads toward the side seam from this place; on the seam itself, seen from the side, toward the back. */
function seamward(figure: ReadFigure, middle: FigurePoint, zone: Zone | undefined): 1 | -1 {
  if (isStanding(figure.view)) return middle.x < 0 ? -1 : 1;
  if (zone !== undefined && SEAM_ZONES.has(zone)) return -1;
  return middle.x < seamX(figure, middle.y) ? 1 : -1;
}

const toHalfTurn = (x: number, y: number) => ((Math.atan2(x, y) * 180) / Math.PI + 180) % 180;

function sideOf(mark: DrawnMark, view: FigureView, middle: FigurePoint): Side | null {
  if (mark.side !== 'both') return mark.side;
  if (view === 'left' || view === 'right') return view;
  if (view === 'seated' || Math.abs(middle.x) < ON_CENTRE) return null;
  return middle.x > 0 ? 'left' : 'right';
}

function nearest(figure: ReadFigure, point: FigurePoint): NearLandmark {
  let best: NearLandmark | null = null;
  for (const { name, side, at } of figure.landmarks) {
    const away = distance(at, point);
    if (best === null || away < best.distance) best = { name, side, distance: away };
  }
  return best!;
}

function closenessOf(figure: ReadFigure, path: readonly FigurePoint[]) {
  return new Map(
    [...figure.areaShares.keys()].map((zone): [Zone, number[]] => [
      zone,
      path.map((point) => Math.exp(-((distanceToZone(figure, zone, point) / ZONE_BLUR) ** 2) / 2)),
    ]),
  );
}

function zonesOf(closeness: ReadonlyMap<Zone, readonly number[]>) {
  return [...closeness]
    .map(([zone, near]) => ({ zone, share: near.filter((one) => one === 1).length / near.length }))
    .filter(({ share }) => share > 0)
    .sort((a, b) => b.share - a.share);
}

/** Carries a mark from its photo onto the body. */
export function bodyMark(figure: ReadFigure, placement: FigurePlacement, mark: DrawnMark): BodyMark {
  const drawn = mark.points.map((point) => photoToFigure(placement, point));
  const { path, length } = resample(drawn, SAMPLES);
  const middle = middleOf(path);
  const closeness = closenessOf(figure, path);
  const zones = zonesOf(closeness);
  const axis = axisOf(path);
  const toSeam = seamward(figure, middle, zones[0]?.zone);
  const seamwardDeg = length > 0 ? toHalfTurn(toSeam * axis.x, axis.y) : null;
  return {
    id: mark.id,
    kind: mark.kind,
    severity: mark.severity,
    view: figure.view,
    side: sideOf(mark, figure.view, middle),
    path,
    length,
    angleDeg: isStanding(figure.view) || length === 0 ? seamwardDeg : toHalfTurn(-axis.x, axis.y),
    seamwardDeg,
    zones,
    closeness,
    ends: [nearest(figure, path[0]!), nearest(figure, path.at(-1)!)],
  };
}
