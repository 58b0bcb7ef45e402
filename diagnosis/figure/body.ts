import { curveSegments, mirrorSegments, type CubicSegment } from './curve';
import type { FigureView } from './figure';
import type { Proportions } from './proportions';
import { seatedLegs } from './seated';
import { levelY, standingWidths } from './standing';
import { LEVELS } from './zone-tables';

export type BodyPart = 'torso' | 'arm' | 'foot';

/** One closed outline of the body; later shapes lie in front of earlier ones. */
export type BodyShape = { readonly part: BodyPart; readonly segments: readonly CubicSegment[] };

type Place = readonly [x: number, y: number];

/** A closed smooth curve through the places, in order. */
function closedCurve(places: readonly Place[]): CubicSegment[] {
  const count = places.length;
  const wrapped = [places[count - 1]!, ...places, places[0]!, places[1]!];
  return curveSegments({ knots: wrapped.map(([x, y], v) => ({ v, x, y })) }).slice(1, count + 1);
}

/** Half the width of the chest under the arms: between the waist and the hip, steadied by a constant frame. */
function chestHalf({ hip, waist }: Proportions): number {
  return 0.16 * waist + 0.34 * hip + 0.1;
}

/** The left side of the trunk from the neck down to the waist. */
function trunkPlaces(proportions: Proportions): Place[] {
  const waistHalf = 0.495 * proportions.waist;
  const chest = chestHalf(proportions);
  const rib = 0.5 * waistHalf + 0.5 * chest - 0.015;
  return [
    [0.17, -2.02], [0.18, -1.86], [0.36, -1.74], [chest + 0.1, -1.6], [chest + 0.07, -1.34], [chest + 0.01, -1.1],
    [chest - 0.005, -0.85], [rib, -0.45], [waistHalf + 0.01, -0.14], [waistHalf + 0.005, 0],
  ]; // prettier-ignore
}

/** The trunk above the waist, closed inside the garment below it. */
function frontTorso(proportions: Proportions): CubicSegment[] {
  const waistHalf = 0.495 * proportions.waist;
  const left: Place[] = [...trunkPlaces(proportions), [waistHalf - 0.02, 0.1], [waistHalf - 0.16, 0.16]];
  const right = left.map(([x, y]): Place => [-x, y]).reverse();
  return closedCurve([...left, ...right]);
}

/** The middle line of the arm: shoulder, elbow and wrist, hanging clear of the hip. */
export function armAxis(proportions: Proportions): { shoulder: Place; elbow: Place; wrist: Place } {
  const waistHalf = 0.505 * proportions.waist;
  const chest = chestHalf(proportions);
  return {
    shoulder: [chest + 0.12, -1.45],
    elbow: [Math.max(chest + 0.23, waistHalf + 0.3), -0.42],
    wrist: [Math.max(chest + 0.3, standingWidths(proportions).hipHalf + 0.27, waistHalf + 0.38), 0.4],
  };
}

/** The arm on the left of the body, the hand at rest with its thumb toward the front. */
function frontArm(proportions: Proportions): CubicSegment[] {
  const { shoulder, elbow, wrist } = armAxis(proportions);
  const [sx, ex, wx] = [shoulder[0], elbow[0], wrist[0]];
  const [upper, fore] = [0.5 * sx + 0.5 * ex, 0.65 * ex + 0.35 * wx];
  const stout = 0.7 + 0.15 * (proportions.waist + proportions.hip);
  const arm = (axis: number, by: number, y: number): Place => [axis + by * stout, y];
  return closedCurve([
    arm(sx, -0.06, -1.6), arm(sx, 0.1, -1.54), arm(sx, 0.17, -1.36), arm(upper, 0.155, -0.92), arm(ex, 0.125, -0.5),
    arm(ex, 0.13, -0.34), arm(fore, 0.132, -0.08), arm(wx, 0.092, 0.27), [wx + 0.077, 0.42], [wx + 0.1, 0.54],
    [wx + 0.118, 0.7], [wx + 0.114, 0.84], [wx + 0.096, 0.965], [wx + 0.062, 1.04], [wx + 0.015, 1.06],
    [wx - 0.028, 1.03], [wx - 0.046, 0.94], [wx - 0.05, 0.85], [wx - 0.072, 0.875], [wx - 0.106, 0.87],
    [wx - 0.128, 0.8], [wx - 0.122, 0.68], [wx - 0.1, 0.54], [wx - 0.082, 0.42], arm(wx, -0.088, 0.26),
    arm(fore, -0.12, -0.1), arm(ex, -0.112, -0.4), arm(upper, -0.135, -0.85), arm(sx, -0.14, -1.18), arm(sx, -0.16, -1.4),
  ]); // prettier-ignore
}

/** An arm bent out of the way, the hand on the chest, seen from the side: nothing hangs before the garment. */
function foldedArm({ waist, hip }: Proportions): CubicSegment[] {
  const reach = 0.14 * (0.5 * waist + 0.5 * hip) + 0.31;
  return closedCurve([
    [-0.14, -1.56], [-0.2, -1.36], [-0.17, -1.06], [-0.1, -0.8], [-0.02, -0.68], [0.09, -0.66], [0.2, -0.74],
    [reach - 0.04, -1.03], [reach + 0.03, -1.2], [reach + 0.02, -1.36], [reach - 0.08, -1.38], [reach - 0.15, -1.2],
    [0.16, -0.98], [0.13, -1.1], [0.14, -1.36], [0.06, -1.56], [-0.04, -1.62],
  ]); // prettier-ignore
}

/** The left side of a foot-to-hip outline, from the waist down the outside, round the foot and up the inside to the fork. */
function legPlaces(view: 'front' | 'back', proportions: Proportions): Place[] {
  const w = standingWidths(proportions);
  const y = (v: number) => levelY(v, proportions);
  const { thigh, hip } = proportions;
  const knee = 0.19 + 0.06 * (thigh - 1) + 0.05 * (hip - 1);
  const calf = 0.2 + 0.07 * (thigh - 1) + 0.06 * (hip - 1);
  const calfAxis = 0.5 * w.kneeAxis + 0.5 * w.hemAxis;
  const foot = footPlaces(view, proportions);
  return [
    [0.97 * w.highHipHalf, LEVELS.highHip - 0.04], [w.hipHalf - 0.015, LEVELS.hip], [w.thighTop - 0.012, 1],
    [w.thighOuter - 0.02, y(1.3)], [w.kneeAxis + knee + 0.05, y(1.82)], [w.kneeAxis + knee, y(2.12)],
    [w.kneeAxis + knee - 0.005, y(2.25)], [calfAxis + calf, y(2.62)], [w.hemAxis + 0.13, y(3.2)], ...foot,
    [w.hemAxis - 0.12, y(3.2)], [calfAxis - calf + 0.02, y(2.68)], [w.kneeAxis - knee + 0.02, y(2.3)],
    [w.kneeAxis - knee + 0.01, y(2.12)], [Math.min(w.kneeAxis - knee - 0.03, 0.12), y(1.8)], [0.03, y(1.3)], [0.012, 1.06],
  ]; // prettier-ignore
}

/** The whole standing body in one outline, for a figure without trousers. */
export function bareOutline(view: 'front' | 'back', proportions: Proportions): CubicSegment[] {
  const left = [...trunkPlaces(proportions), ...legPlaces(view, proportions)];
  const right = left.map(([x, y]): Place => [-x, y]).reverse();
  return closedCurve([...left, [0, 1.02], ...right]);
}

function footPlaces(view: 'front' | 'back', proportions: Proportions): Place[] {
  const { hemAxis: x } = standingWidths(proportions);
  const y = levelY(LEVELS.hem, proportions);
  if (view === 'back') {
    return [
      [x + 0.105, y - 0.14], [x + 0.112, y], [x + 0.165, y + 0.12], [x + 0.195, y + 0.2], [x + 0.155, y + 0.25],
      [x + 0.06, y + 0.265], [x - 0.05, y + 0.265], [x - 0.115, y + 0.22], [x - 0.12, y + 0.12], [x - 0.1, y - 0.02],
      [x - 0.105, y - 0.14],
    ]; // prettier-ignore
  }
  return [
    [x + 0.105, y - 0.14], [x + 0.11, y - 0.02], [x + 0.14, y + 0.08], [x + 0.18, y + 0.17], [x + 0.198, y + 0.24],
    [x + 0.172, y + 0.292], [x + 0.11, y + 0.325], [x + 0.03, y + 0.345], [x - 0.06, y + 0.352], [x - 0.13, y + 0.337],
    [x - 0.165, y + 0.28], [x - 0.158, y + 0.2], [x - 0.13, y + 0.1], [x - 0.105, y], [x - 0.1, y - 0.14],
  ]; // prettier-ignore
}

function sideTorso({ waist, hip, front }: Proportions): CubicSegment[] {
  const girth = 0.5 * waist + 0.5 * hip;
  const belly = 0.345 * waist + 0.025 * front;
  return closedCurve([
    [0.13, -2.02], [0.12, -1.84], [0.2, -1.62], [0.2 + 0.16 * girth, -1.25], [0.18 + 0.18 * girth, -0.9],
    [0.14 + 0.22 * waist + 0.01 * front, -0.42], [belly, -0.1], [belly, 0.08], [belly - 0.16, 0.18],
    [-0.345 * waist + 0.16, 0.16], [-0.345 * waist, 0.04], [-0.345 * waist, -0.12], [-0.1 - 0.265 * waist, -0.42],
    [-0.2 - 0.235 * girth, -0.9], [-0.21 - 0.24 * girth, -1.3], [-0.34, -1.6], [-0.19, -1.82], [-0.17, -2.02],
  ]); // prettier-ignore
}

/** A foot from the side, heel behind; (x, y) is the middle of the ankle. */
function sideFoot(x: number, y: number): CubicSegment[] {
  return closedCurve([
    [x - 0.15, y - 0.2], [x - 0.145, y - 0.02], [x - 0.19, y + 0.1], [x - 0.185, y + 0.22], [x - 0.1, y + 0.265],
    [x + 0.1, y + 0.25], [x + 0.3, y + 0.265], [x + 0.55, y + 0.262], [x + 0.645, y + 0.225], [x + 0.6, y + 0.165],
    [x + 0.42, y + 0.1], [x + 0.22, y - 0.01], [x + 0.135, y - 0.1], [x + 0.125, y - 0.2],
  ]); // prettier-ignore
}

/** The bare parts of a figure from back to front. */
export function bodyShapes(view: FigureView, proportions: Proportions): BodyShape[] {
  const hemY = levelY(LEVELS.hem, proportions);
  if (view === 'left' || view === 'right') {
    return [
      { part: 'foot', segments: sideFoot(-0.07, hemY) },
      { part: 'torso', segments: sideTorso(proportions) },
      { part: 'arm', segments: foldedArm(proportions) },
    ];
  }
  if (view === 'seated') {
    const legs = seatedLegs(proportions);
    return [
      { part: 'foot', segments: sideFoot(legs.kneeFrontX - 0.32, legs.floorY - 0.265) },
      { part: 'torso', segments: sideTorso(proportions) },
      { part: 'arm', segments: foldedArm(proportions) },
    ];
  }
  const foot = closedCurve(footPlaces(view, proportions));
  const arm = frontArm(proportions);
  return [
    { part: 'foot', segments: foot },
    { part: 'foot', segments: mirrorSegments(foot) },
    { part: 'torso', segments: frontTorso(proportions) },
    { part: 'arm', segments: arm },
    { part: 'arm', segments: mirrorSegments(arm) },
  ];
}

/** Height of the floor under the figure, in figure coordinates. */
export function floorY(view: FigureView, proportions: Proportions): number {
  if (view === 'seated') return seatedLegs(proportions).floorY;
  return levelY(LEVELS.hem, proportions) + 0.265;
}
