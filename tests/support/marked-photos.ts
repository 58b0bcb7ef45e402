import type { FigureView } from '@/diagnosis/figure/figure';
import { figureZones, landmarks } from '@/diagnosis/figure/figure';
import {
  figurePoint,
  photoPoint,
  type FigurePoint,
  type PhotoPoint,
  type Side,
} from '@/diagnosis/figure/point';
import { polygonHolds } from '@/diagnosis/figure/polygon';
import type { Proportions } from '@/diagnosis/figure/proportions';
import type { Zone } from '@/diagnosis/garments/schema';
import type { DrawnKind, DrawnMark } from '@/diagnosis/photo/body-mark';
import type { PhotoFrame } from '@/diagnosis/figure/align';

/**
 * Marked photos, made from what print says of lines: where they lie, which way they run, what they point to, taut or slack.
 * It knows the figure and these facts, and nothing of how lines are read.
 */
export type LineFact = {
  readonly sign: string;
  /** Facts in print, or common practice where only the sign's own words say it. */
  readonly source: string;
  readonly view: FigureView;
  readonly kind: DrawnKind;
  /** Lines start at a landmark, or lie anywhere in a zone; `centre` holds them to the centre line. */
  readonly from:
    | { readonly landmark: string; readonly inward?: number }
    | { readonly zone: Zone }
    | { readonly centre: number };
  /** Degrees from plumb, + down and out, crossed lines turn by turn the other way; or the landmark that they run toward. */
  readonly toward: { readonly deg: number; readonly isCrossed?: boolean } | { readonly landmark: string };
  /** In crotch depths. */
  readonly length: number;
  readonly lines: number;
};

const BODIES_OF: Partial<Proportions>[] = [
  {},
  { hip: 1.25, waist: 1.35, front: 0.6, thigh: 1.15 },
  { hip: 0.88, waist: 0.9, seat: -0.6, thigh: 0.88, height: 1.08 },
  { hip: 1.15, waist: 0.95, seat: 0.8, thigh: 1.2, legLine: -0.5 },
  { hip: 1.02, waist: 1.2, front: 0.3, height: 0.92, legLine: 0.5 },
];
export const BODIES: readonly Proportions[] = BODIES_OF.map((body) => ({
  hip: 1, waist: 1, front: 0, seat: 0, thigh: 1, legLine: 0, height: 1, hipHigherSide: null, ...body,
})); // prettier-ignore

/** A small generator with a seed (mulberry32), so that each photo can be made again. */
export function seeded(seed: number) {
  let state = seed >>> 0;
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
  const between = (low: number, high: number) => low + (high - low) * next();
  return { next, between, pick: <T>(list: readonly T[]): T => list[Math.floor(next() * list.length)]! };
}
type Chance = ReturnType<typeof seeded>;

const CROTCH_DEPTH_MM = 260;
const PLACE_OFF = 15 / CROTCH_DEPTH_MM;

export type MarkedPhoto = {
  readonly fact: LineFact;
  readonly body: Proportions;
  readonly frame: PhotoFrame;
  readonly marks: readonly DrawnMark[];
  /** Where each landmark of the body shows on the photo. */
  readonly shown: readonly { readonly id: string; readonly at: PhotoPoint }[];
};

/** A camera: turned about the body, rolled, nearer or farther, with the wide lens of a phone. */
function camera(chance: Chance, frame: PhotoFrame) {
  const yaw = (chance.between(-15, 15) * Math.PI) / 180;
  const roll = (chance.between(-4, 4) * Math.PI) / 180;
  const size = chance.between(0.17, 0.22);
  const [cx, cy] = [chance.between(0.45, 0.55), chance.between(0.16, 0.22)];
  const isTurned = frame.view === 'front' || frame.view === 'right';
  const direction = isTurned === frame.mirrored ? -1 : 1;
  return ({ x, y }: FigurePoint): PhotoPoint => {
    // 2.5 m away at hip height: what turns toward the camera grows by its depth.
    const grows = 1 / (1 - (x * Math.sin(yaw) * CROTCH_DEPTH_MM) / 2500);
    const [px, py] = [direction * x * Math.cos(yaw) * grows, 0.5 + (y - 0.5) * grows];
    const [rx, ry] = [px * Math.cos(roll) - py * Math.sin(roll), px * Math.sin(roll) + py * Math.cos(roll)];
    return photoPoint(cx + size * rx, cy + (size * ry * frame.widthPx) / frame.heightPx);
  };
}

/** A place in the zone on one side of the body. */
function placeIn(chance: Chance, view: FigureView, body: Proportions, zone: Zone, side: Side): FigurePoint {
  const regions = figureZones(view, body).filter(
    (one) => one.zone === zone && (one.side === null || one.side === side),
  );
  const { polygon } = chance.pick(regions);
  const [xs, ys] = [polygon.map(({ x }) => x), polygon.map(({ y }) => y)];
  for (let tries = 0; tries < 500; tries += 1) {
    const at = figurePoint(
      chance.between(Math.min(...xs), Math.max(...xs)),
      chance.between(Math.min(...ys), Math.max(...ys)),
    );
    if (polygonHolds(polygon, at)) return at;
  }
  throw new Error(`No place was found in ${zone}`);
}

function landmarkAt(view: FigureView, body: Proportions, name: string, side: Side): FigurePoint {
  const found = landmarks(view, body).find(
    (one) => one.name === name && (one.side === null || one.side === side),
  );
  if (!found) throw new Error(`${view} shows no ${name}`);
  return found.at;
}

const inwardOf = ({ x, y }: FigurePoint, by: number) => figurePoint(x - Math.sign(x) * by, y);

type Stroke = {
  readonly from: FigurePoint;
  readonly rad: number;
  readonly length: number;
  readonly isMiddle: boolean;
};

/** One line as print has it: `rad` from plumb, + toward growing x. */
function trueStroke(chance: Chance, fact: LineFact, body: Proportions, side: Side, index: number): Stroke {
  const out = side === 'left' ? 1 : -1;
  const turned = 'isCrossed' in fact.toward && index % 2 === 1 ? -out : out;
  const start =
    'landmark' in fact.from
      ? inwardOf(landmarkAt(fact.view, body, fact.from.landmark, side), fact.from.inward ?? 0)
      : 'zone' in fact.from
        ? placeIn(chance, fact.view, body, fact.from.zone, side)
        : figurePoint(0, fact.from.centre + chance.between(-0.04, 0.04));
  if ('deg' in fact.toward)
    return {
      from: start,
      rad: (turned * fact.toward.deg * Math.PI) / 180,
      length: fact.length,
      isMiddle: !('landmark' in fact.from),
    };
  const to = landmarkAt(fact.view, body, fact.toward.landmark, side);
  return {
    from: start,
    rad: Math.atan2(to.x - start.x, to.y - start.y),
    length: fact.length,
    isMiddle: false,
  };
}

/** What a hand makes of it: ±10° of direction, ±15 % of length, ±15 mm of place, and a slight bow. */
function drawnPath(chance: Chance, { from, rad, length, isMiddle }: Stroke): FigurePoint[] {
  const turned = rad + (chance.between(-10, 10) * Math.PI) / 180;
  const long = length * chance.between(0.85, 1.15);
  const away = chance.between(0, PLACE_OFF);
  const aside = chance.between(0, 2 * Math.PI);
  const bow = chance.between(-0.05, 0.05) * long;
  const [ux, uy] = [Math.sin(turned), Math.cos(turned)];
  return Array.from({ length: 12 }, (_, i) => {
    const t = i / 11;
    const along = (isMiddle ? t - 0.5 : t) * long;
    const off = bow * Math.sin(Math.PI * t);
    return figurePoint(
      from.x + away * Math.cos(aside) + along * ux + off * uy,
      from.y + away * Math.sin(aside) + along * uy - off * ux,
    );
  });
}

/** A line that means nothing: of whatever kind, somewhere on the garment, some way round. */
function strayPath(chance: Chance, view: FigureView, body: Proportions): FigurePoint[] {
  const side = chance.pick<Side>(['left', 'right']);
  const zone = chance.pick(figureZones(view, body).map((one) => one.zone));
  const from = placeIn(chance, view, body, zone, side);
  return drawnPath(chance, {
    from,
    rad: chance.between(0, Math.PI),
    length: chance.between(0.15, 0.6),
    isMiddle: true,
  });
}

/** One photo of a body with one thing to see on it; a fifth of its lines were not drawn, a fifth of what was drawn is stray. */
export function markedPhoto(fact: LineFact, body: Proportions, seed: number): MarkedPhoto {
  const chance = seeded(seed);
  const frame: PhotoFrame = { view: fact.view, widthPx: 1500, heightPx: 2000, mirrored: chance.next() < 0.3 };
  const show = camera(chance, frame);
  const isBothSides = fact.view === 'front' || fact.view === 'back';
  const own: Side = isBothSides
    ? chance.pick<Side>(['left', 'right'])
    : fact.view === 'right'
      ? 'right'
      : 'left';
  const kept = Array.from({ length: fact.lines }, () => chance.next() >= 0.2);
  const drawn = kept.some(Boolean) ? kept : kept.map((_, i) => i === 0);
  const marks: DrawnMark[] = [];
  const add = (kind: DrawnKind, path: FigurePoint[]) =>
    marks.push({ id: `m${marks.length}`, kind, severity: 2, side: 'both', points: path.map(show) });
  for (const [index, isDrawn] of drawn.entries()) {
    if (isDrawn) add(fact.kind, drawnPath(chance, trueStroke(chance, fact, body, own, index)));
    if (chance.next() < 0.2)
      add(
        chance.pick<DrawnKind>(['tight', 'slack', 'gap', 'pooling', 'tilt']),
        strayPath(chance, fact.view, body),
      );
  }
  const shown = landmarks(fact.view, body).map(({ id, at }) => ({ id, at: show(at) }));
  return { fact, body, frame, marks, shown };
}
