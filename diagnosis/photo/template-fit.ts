import type { Landmark } from '../figure/garment';
import type { FigurePoint } from '../figure/point';
import type { Sign, Zone } from '../garments/schema';
import type { BodyMark } from './body-mark';
import { distanceToStretch, type ReadFigure } from './read-figure';

export type Template = NonNullable<Sign['template']>;

/** What speaks for reading a mark as a sign. */
export type Reason =
  | { readonly kind: 'zone'; readonly zone: Zone }
  | { readonly kind: 'direction'; readonly angleDeg: number }
  | { readonly kind: 'anchor'; readonly landmark: string }
  | { readonly kind: 'target'; readonly landmark: string }
  | { readonly kind: 'meeting'; readonly landmark: string; readonly lines: number }
  | { readonly kind: 'views'; readonly views: readonly string[] };

export type Fit = {
  /** How much likelier the mark is under the sign than as a stray line; 1 says nothing. */
  readonly odds: number;
  readonly reasons: readonly Reason[];
};

/**
 * Spread that a hand, a camera and another body bring into a mark. Common practice: marks are trusted to about ten degrees,
 * a sixth of their length and 15 mm.
 */
const ANGLE_SD_DEG = 12;
const PLACE_SD = 0.16;
const HEADING_SD_DEG = 14;
const LENGTH_SD = 0.2;
const LENGTH_LEAST = 0.05;
/** What is left of the odds where one feature is off altogether: a person may call a thing by a near word, or draw half of it. */
const LEAST = { kind: 0.002, zone: 0.02, angle: 0.05, length: 0.3, anchor: 0.4, target: 0.3, view: 0.1 };
/** Area that a zone's edge is uncertain by, as a share of the garment. */
const EDGE_SHARE = 0.03;
const OWN_ZONE_SHARE = 0.4;
/** A sign of place is told by where an edge sits, not by a line: a line says it less well. */
const PLACE_SIGN_SHARE = 0.6;

const bell = (miss: number, sd: number) => Math.exp(-((miss / sd) ** 2) / 2);
const blend = (least: number, ratio: number) => least + (1 - least) * ratio;

/** Kinds a person may take for one another, and how much of the odds is left then. */
const NEAR_KINDS: Readonly<Record<string, number>> = {
  'pooling slack': 0.5,
  'gap slack': 0.15,
  'gap pooling': 0.15,
};
const KINDS_READ = 5;

/** A sign that may look like three kinds of mark says less by one of them than a sign that has only that one. */
function kindOdds(kind: BodyMark['kind'], kinds: Template['kinds']): number {
  const alike = kinds.map((wanted) =>
    wanted === kind ? 1 : (NEAR_KINDS[[wanted, kind].sort().join(' ')] ?? LEAST.kind),
  );
  return (Math.max(...alike) * KINDS_READ) / kinds.length ** 0.8;
}

/** Degrees between an angle and a range, both modulo 180; 0 within it. `to` below `from` runs over plumb. */
export function angleMiss(angleDeg: number, { from, to }: { from: number; to: number }): number {
  const turn = (value: number) => ((value % 180) + 180) % 180;
  const width = to >= from ? Math.min(180, to - from) : turn(to - from);
  const past = turn(angleDeg - from);
  return past <= width ? 0 : Math.min(past - width, 180 - past);
}

function angleWidth({ from, to }: { from: number; to: number }): number {
  return to >= from ? Math.min(180, to - from) : (((to - from) % 180) + 180) % 180;
}

/** Share (0–1) of the line that lies in any of the zones, their edges blurred, over what chance would put there. */
function placeOdds(figure: ReadFigure, mark: BodyMark, zones: Template['zones']): number | null {
  const rows = zones.map((zone) => mark.closeness.get(zone)).filter((row) => row !== undefined);
  if (rows.length === 0) return null;
  const within =
    mark.path.reduce((sum, _, i) => sum + Math.max(...rows.map((row) => row[i]!)), 0) / mark.path.length;
  const area = zones.reduce((sum, zone) => sum + (figure.areaShares.get(zone) ?? 0), 0) + EDGE_SHARE;
  return within ** 1.5 / Math.min(1, area);
}

/** The template's zones say where the line may run, the sign's own zone where it belongs. */
function zoneOdds(figure: ReadFigure, mark: BodyMark, sign: Sign, template: Template): number {
  const may = placeOdds(figure, mark, template.zones) ?? 0;
  const belongs = placeOdds(figure, mark, [sign.zone]) ?? may;
  return blend(LEAST.zone, (1 - OWN_ZONE_SHARE) * may + OWN_ZONE_SHARE * belongs);
}

function angleOdds(angleDeg: number | null, range: Template['angleDeg']): number {
  if (range === null || angleDeg === null) return 1;
  const spread = angleWidth(range) + ANGLE_SD_DEG * Math.sqrt(2 * Math.PI);
  return blend(LEAST.angle, (bell(angleMiss(angleDeg, range), ANGLE_SD_DEG) * 180) / Math.max(spread, 1));
}

/** Lengths that are drawn at all run over a factor of about thirty; a range is the narrower the more it says. */
const LENGTHS_LOG = 3.4;

function lengthOdds(length: number, range: Template['lengthRatio']): number {
  if (range === null || length <= 0) return 1;
  const [from, to] = [
    Math.log(Math.max(range.from, LENGTH_LEAST)),
    Math.log(Math.max(range.to, 2 * LENGTH_LEAST)),
  ];
  const at = Math.log(length);
  const miss = Math.max(0, from - at, at - to);
  const spread = to - from + LENGTH_SD * Math.sqrt(2 * Math.PI);
  return blend(LEAST.length, (bell(miss, LENGTH_SD) * LENGTHS_LOG) / Math.max(spread, 1));
}

/** The same place under the name that another view has for it. */
const OTHER_NAMES: Readonly<Record<string, readonly string[]>> = {
  'waist-front': ['waist-centre'],
  'waist-back': ['waist-centre'],
  'waist-centre': ['waist-front', 'waist-back'],
  knee: ['behind-knee'],
  'behind-knee': ['knee'],
};

/** The landmarks of a name that a mark of one side may mean, in the names of this view. */
export function landmarksFor(figure: ReadFigure, name: string, side: BodyMark['side']): Landmark[] {
  const isShown = figure.landmarks.some((one) => one.name === name);
  const names = isShown ? [name] : (OTHER_NAMES[name] ?? []);
  return figure.landmarks.filter(
    (one) => names.includes(one.name) && (side === null || one.side === null || one.side === side),
  );
}

const away = (a: FigurePoint, b: FigurePoint) => Math.hypot(a.x - b.x, a.y - b.y);

/** Degrees by which the line, gone on from `from` through `to`, passes a place. */
function headingMiss(from: FigurePoint, to: FigurePoint, place: FigurePoint): number {
  const [ax, ay, bx, by] = [to.x - from.x, to.y - from.y, place.x - from.x, place.y - from.y];
  return Math.abs((Math.atan2(ax * by - ay * bx, ax * bx + ay * by) * 180) / Math.PI);
}

const distanceToPath = (path: readonly FigurePoint[], at: FigurePoint) =>
  Math.min(...path.slice(1).map((point, i) => distanceToStretch(at, path[i]!, point)));

const ALONG_SHARE = 0.8;
const HEADING_SHARE = 0.35;

type EndFit = { readonly anchor: number; readonly target: number };

/** How well one way round of the line starts at the anchor and heads for, or reaches, the target; 0–1 each. */
function endFit(figure: ReadFigure, mark: BodyMark, template: Template, isTurned: boolean): EndFit {
  const [from, to] = isTurned ? [mark.path.at(-1)!, mark.path[0]!] : [mark.path[0]!, mark.path.at(-1)!];
  const best = (name: string | null, fit: (at: FigurePoint) => number) =>
    name === null ? 0 : Math.max(0, ...landmarksFor(figure, name, mark.side).map(({ at }) => fit(at)));
  const heading = (at: FigurePoint) =>
    away(from, at) > 0.2 ? bell(headingMiss(from, to, at), HEADING_SD_DEG) : 0;
  return {
    // Some lines pass over their landmark, some would come from it if they were longer: both count, for less.
    anchor: best(template.anchor, (at) =>
      Math.max(
        bell(away(from, at), PLACE_SD),
        ALONG_SHARE * bell(distanceToPath(mark.path, at), PLACE_SD),
        HEADING_SHARE * heading(at),
      ),
    ),
    target: best(template.target, (at) => Math.max(bell(away(to, at), PLACE_SD), heading(at))),
  };
}

/** Odds of a place that was hit, against the chance of hitting it: a landmark is a small thing, a heading a wide one. */
const ANCHOR_GAIN = 2.2;
const TARGET_GAIN = 2.2;

function endOdds(figure: ReadFigure, mark: BodyMark, template: Template): EndFit & { odds: number } {
  const seen = (name: string | null) => name !== null && landmarksFor(figure, name, mark.side).length > 0;
  const oddsOf = ({ anchor, target }: EndFit) =>
    (seen(template.anchor) ? blend(LEAST.anchor, ANCHOR_GAIN * anchor) : 1) *
    (seen(template.target) ? blend(LEAST.target, TARGET_GAIN * target) : 1);
  const [straight, turned] = [false, true].map((isTurned) => {
    const fit = endFit(figure, mark, template, isTurned);
    return { ...fit, odds: oddsOf(fit) };
  });
  return straight!.odds >= turned!.odds ? straight! : turned!;
}

/** A sign of sitting is not read from a standing photo, nor the other way; beside its own views a sign may still show a little. */
function viewOdds(figure: ReadFigure, sign: Sign): number {
  if (sign.views.includes(figure.view)) return 1;
  const isOtherPose = figure.view === 'seated' || sign.views.every((view) => view === 'seated');
  return isOtherPose ? 0 : LEAST.view;
}

/** A sign that is also seen from front or back says its direction toward the side seam; one seen from the side alone, toward the back. */
function directionFor(mark: BodyMark, sign: Sign): number | null {
  const isStandingSign = sign.views.some((view) => view === 'front' || view === 'back');
  return isStandingSign ? mark.seamwardDeg : mark.angleDeg;
}

/** How well one mark fits a sign's template in the view it was drawn on, and what speaks for it. */
export function fitTemplate(figure: ReadFigure, mark: BodyMark, sign: Sign, template: Template): Fit {
  const kind = kindOdds(mark.kind, template.kinds) * (sign.tension === 'place' ? PLACE_SIGN_SHARE : 1);
  const zone = zoneOdds(figure, mark, sign, template);
  const angleDeg = directionFor(mark, sign);
  const angle = angleOdds(angleDeg, template.angleDeg);
  const ends = endOdds(figure, mark, template);
  const view = viewOdds(figure, sign);
  const reasons: Reason[] = [];
  const within = mark.zones.find((one) => template.zones.includes(one.zone));
  if (within) reasons.push({ kind: 'zone', zone: within.zone });
  if (
    template.angleDeg &&
    mark.angleDeg !== null &&
    angleMiss(mark.angleDeg, template.angleDeg) < ANGLE_SD_DEG
  )
    reasons.push({ kind: 'direction', angleDeg: mark.angleDeg });
  if (template.anchor !== null && ends.anchor > 0.5)
    reasons.push({ kind: 'anchor', landmark: template.anchor });
  if (template.target !== null && ends.target > 0.5)
    reasons.push({ kind: 'target', landmark: template.target });
  return {
    odds: kind * zone * angle * ends.odds * view * lengthOdds(mark.length, template.lengthRatio),
    reasons,
  };
}
