import type { Landmark } from '../figure/garment';
import type { FigurePoint } from '../figure/point';
import type { Sign, Zone } from '../garments/schema';
import type { BodyMark } from './body-mark';
import type { ReadFigure } from './read-figure';

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
  /** How much likelier the mark is under the sign than as any line anywhere; 1 says nothing. */
  readonly odds: number;
  readonly reasons: readonly Reason[];
};

/**
 * Spread that a hand, a camera and another body bring into a mark. Common practice: marks are trusted to about ten degrees,
 * a sixth of their length and 15 mm.
 */
const ANGLE_SD_DEG = 12;
const PLACE_SD = 0.13;
const HEADING_SD_DEG = 14;
const LENGTH_SD = 0.2;
/** What is left of the odds where one feature is off altogether: a person may call a thing by a near word, or draw half of it. */
const LEAST = { zone: 0.02, angle: 0.05, length: 0.3, anchor: 0.25, target: 0.25, view: 0.3 };
/** Area that a zone's edge is uncertain by, as a share of the garment. */
const EDGE_SHARE = 0.03;

const bell = (miss: number, sd: number) => Math.exp(-((miss / sd) ** 2) / 2);
const blend = (least: number, ratio: number) => least + (1 - least) * ratio;

/** How alike two kinds of mark are to the eye. */
function kindOdds(kind: BodyMark['kind'], kinds: Template['kinds']): number {
  const odds = kinds.map((wanted) => {
    if (wanted === kind) return 3;
    const pair = [wanted, kind].sort().join(' ');
    if (pair === 'pooling slack') return 1.5;
    return pair === 'gap slack' || pair === 'gap pooling' ? 0.5 : 0.08;
  });
  return Math.max(...odds);
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

function zoneOdds(figure: ReadFigure, mark: BodyMark, zones: Template['zones']): number {
  const rows = zones.map((zone) => mark.closeness.get(zone)).filter((row) => row !== undefined);
  if (rows.length === 0) return LEAST.zone;
  const within =
    mark.path.reduce((sum, _, i) => sum + Math.max(...rows.map((row) => row[i]!)), 0) / mark.path.length;
  const area = zones.reduce((sum, zone) => sum + (figure.areaShares.get(zone) ?? 0), 0) + EDGE_SHARE;
  return blend(LEAST.zone, within ** 1.5 / Math.min(1, area));
}

function angleOdds(angleDeg: number | null, range: Template['angleDeg']): number {
  if (range === null || angleDeg === null) return 1;
  const spread = angleWidth(range) + ANGLE_SD_DEG * Math.sqrt(2 * Math.PI);
  return blend(LEAST.angle, (bell(angleMiss(angleDeg, range), ANGLE_SD_DEG) * 180) / Math.max(spread, 1));
}

function lengthOdds(length: number, range: Template['lengthRatio']): number {
  if (range === null || length <= 0) return 1;
  const [from, to] = [Math.log(Math.max(range.from, 0.01)), Math.log(Math.max(range.to, 0.02))];
  const at = Math.log(length);
  const miss = at < from ? from - at : at > to ? at - to : 0;
  return blend(LEAST.length, 1.4 * bell(miss, LENGTH_SD));
}

/** The landmarks of a name that a mark of one side may mean. */
export function landmarksFor(figure: ReadFigure, name: string, side: BodyMark['side']): Landmark[] {
  return figure.landmarks.filter(
    (one) => one.name === name && (side === null || one.side === null || one.side === side),
  );
}

const away = (a: FigurePoint, b: FigurePoint) => Math.hypot(a.x - b.x, a.y - b.y);

/** Degrees by which the line, gone on from `from` through `to`, passes a place. */
function headingMiss(from: FigurePoint, to: FigurePoint, place: FigurePoint): number {
  const [ax, ay, bx, by] = [to.x - from.x, to.y - from.y, place.x - from.x, place.y - from.y];
  return Math.abs((Math.atan2(ax * by - ay * bx, ax * bx + ay * by) * 180) / Math.PI);
}

type EndFit = { readonly anchor: number; readonly target: number };

/** How well one way round of the line starts at the anchor and heads for, or reaches, the target; 0–1 each. */
function endFit(figure: ReadFigure, mark: BodyMark, template: Template, isTurned: boolean): EndFit {
  const [from, to] = isTurned ? [mark.path.at(-1)!, mark.path[0]!] : [mark.path[0]!, mark.path.at(-1)!];
  const best = (name: string | null, fit: (at: FigurePoint) => number) =>
    name === null ? 0 : Math.max(0, ...landmarksFor(figure, name, mark.side).map(({ at }) => fit(at)));
  return {
    anchor: best(template.anchor, (at) => bell(away(from, at), PLACE_SD)),
    target: best(template.target, (at) =>
      Math.max(
        bell(away(to, at), PLACE_SD),
        away(from, at) > 0.2 ? bell(headingMiss(from, to, at), HEADING_SD_DEG) : 0,
      ),
    ),
  };
}

/** Odds of a place that was hit, against the chance of hitting it: a landmark is a small thing, a heading a wide one. */
const ANCHOR_GAIN = 3;
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

/** How well one mark fits a sign's template in the view it was drawn on, and what speaks for it. */
export function fitTemplate(figure: ReadFigure, mark: BodyMark, sign: Sign, template: Template): Fit {
  const kind = kindOdds(mark.kind, template.kinds);
  const zone = zoneOdds(figure, mark, template.zones);
  const angle = angleOdds(mark.angleDeg, template.angleDeg);
  const ends = endOdds(figure, mark, template);
  const view = sign.views.includes(figure.view) ? 1 : LEAST.view;
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
