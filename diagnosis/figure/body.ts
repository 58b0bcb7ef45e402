import { curveSegments, type CubicSegment } from './curve';
import type { FigureView } from './figure';
import { mirrorPoint } from './point';
import type { Proportions } from './proportions';
import { seatedLegs } from './seated';
import { levelY, standingWidths } from './standing';
import { LEVELS } from './zone-tables';

export type BodyPart = 'torso' | 'arm' | 'foot' | 'leg';

/** One closed outline of the body; later shapes lie in front of earlier ones. */
export type BodyShape = { readonly part: BodyPart; readonly segments: readonly CubicSegment[] };

type Place = readonly [x: number, y: number];

/** A closed smooth curve through the places, in order. */
function closedCurve(places: readonly Place[]): CubicSegment[] {
  const count = places.length;
  const wrapped = [places[count - 1]!, ...places, places[0]!, places[1]!];
  return curveSegments({ knots: wrapped.map(([x, y], v) => ({ v, x, y })) }).slice(1, count + 1);
}

function mirrored(segments: readonly CubicSegment[]): CubicSegment[] {
  return segments.map(({ from, control1, control2, to }) => ({
    from: mirrorPoint(from),
    control1: mirrorPoint(control1),
    control2: mirrorPoint(control2),
    to: mirrorPoint(to),
  }));
}

/** The trunk above the waist up to the shoulders, closed inside the garment below it. */
function frontTorso({ hip, waist }: Proportions): CubicSegment[] {
  const waistHalf = 0.505 * waist;
  const rib = 0.26 * waist + 0.26 * hip + 0.04;
  const chest = 0.12 * waist + 0.42 * hip + 0.07;
  const right: Place[] = [
    [0.16, -1.98], [0.19, -1.84], [0.5, -1.72], [chest + 0.12, -1.58], [chest + 0.06, -1.3], [chest - 0.01, -1.02],
    [chest - 0.03, -0.8], [rib, -0.42], [waistHalf + 0.012, -0.12], [waistHalf, 0.02], [waistHalf + 0.02, 0.2],
  ]; // prettier-ignore
  const left = right.map(([x, y]): Place => [-x, y]).reverse();
  return closedCurve([...right, ...left]);
}

/** The arm on the left of the body, hanging a little away from it, the hand at rest. */
function frontArm(proportions: Proportions): CubicSegment[] {
  const { hip, waist } = proportions;
  const chest = 0.12 * waist + 0.42 * hip + 0.07;
  const shoulder = chest + 0.1;
  const elbow = Math.max(chest + 0.24, 0.505 * waist + 0.27);
  const wrist = Math.max(standingWidths(proportions).hipHalf + 0.25, 0.505 * waist + 0.36);
  return closedCurve([
    [shoulder - 0.1, -1.5], [shoulder + 0.06, -1.56], [shoulder + 0.17, -1.38], [shoulder + 0.2, -1.1],
    [elbow + 0.1, -0.42], [elbow + 0.16, -0.1], [wrist + 0.1, 0.3], [wrist + 0.075, 0.46], [wrist + 0.125, 0.62],
    [wrist + 0.12, 0.82], [wrist + 0.085, 0.97], [wrist + 0.035, 1.06], [wrist - 0.01, 1.05], [wrist - 0.03, 0.92],
    [wrist - 0.045, 0.8], [wrist - 0.07, 0.86], [wrist - 0.105, 0.82], [wrist - 0.1, 0.68], [wrist - 0.085, 0.52],
    [wrist - 0.075, 0.42], [wrist - 0.1, 0.26], [elbow - 0.135, -0.12], [elbow - 0.14, -0.42], [shoulder - 0.1, -1.05],
    [shoulder - 0.13, -1.25],
  ]); // prettier-ignore
}

/** The bare leg on the left of the body, from the hip into the foot. */
function frontLeg(proportions: Proportions): CubicSegment[] {
  const w = standingWidths(proportions);
  const y = (v: number) => levelY(v, proportions);
  const { thigh, hip } = proportions;
  const knee = 0.195 + 0.07 * (thigh - 1);
  const calf = 0.205 + 0.08 * (thigh - 1);
  const calfAxis = 0.5 * w.kneeAxis + 0.5 * w.hemAxis;
  const thighOuter = w.thighOuter - 0.02;
  return closedCurve([
    [0.505 * proportions.waist, 0.02], [w.hipHalf - 0.04 * hip, 0.45], [w.hipHalf - 0.015, LEVELS.hip],
    [w.thighTop - 0.015, 1], [thighOuter, y(1.3)], [w.kneeAxis + knee + 0.04, y(1.85)], [w.kneeAxis + knee, y(2.15)],
    [calfAxis + calf, y(2.6)], [w.hemAxis + 0.13, y(3.25)], [w.hemAxis + 0.105, y(3.58)], [w.hemAxis - 0.1, y(3.58)],
    [w.hemAxis - 0.12, y(3.25)], [calfAxis - calf + 0.02, y(2.65)], [w.kneeAxis - knee + 0.015, y(2.2)],
    [w.kneeAxis - knee - 0.01, y(1.9)], [0.045, y(1.3)], [0.015, 1.06], [0.002, 1], [0.001, 0.6], [0.001, 0.05],
  ]); // prettier-ignore
}

function standingFoot(view: 'front' | 'back', proportions: Proportions): CubicSegment[] {
  const { hemAxis: x } = standingWidths(proportions);
  const y = levelY(LEVELS.hem, proportions);
  if (view === 'back') {
    return closedCurve([
      [x - 0.11, y - 0.14], [x - 0.105, y - 0.02], [x - 0.125, y + 0.12], [x - 0.12, y + 0.22], [x - 0.05, y + 0.265],
      [x + 0.06, y + 0.265], [x + 0.16, y + 0.25], [x + 0.2, y + 0.2], [x + 0.17, y + 0.12], [x + 0.115, y],
      [x + 0.105, y - 0.14],
    ]); // prettier-ignore
  }
  return closedCurve([
    [x - 0.105, y - 0.14], [x - 0.115, y], [x - 0.14, y + 0.12], [x - 0.155, y + 0.24], [x - 0.12, y + 0.32],
    [x - 0.02, y + 0.345], [x + 0.12, y + 0.335], [x + 0.225, y + 0.29], [x + 0.23, y + 0.22], [x + 0.16, y + 0.1],
    [x + 0.115, y - 0.02], [x + 0.11, y - 0.14],
  ]); // prettier-ignore
}

function sideTorso({ waist, hip, front }: Proportions): CubicSegment[] {
  const girth = 0.5 * waist + 0.5 * hip;
  return closedCurve([
    [0.1, -1.98], [0.12, -1.82], [0.26, -1.62], [0.25 + 0.15 * girth, -1.25], [0.22 + 0.19 * girth, -0.85],
    [0.12 + 0.26 * waist, -0.4], [0.35 * waist + 0.02 * front, -0.06], [0.35 * waist + 0.02 * front, 0.2],
    [-0.345 * waist, 0.2], [-0.35 * waist, -0.06], [-0.1 - 0.27 * waist, -0.4], [-0.2 - 0.26 * girth, -0.9],
    [-0.22 - 0.26 * girth, -1.3], [-0.36, -1.6], [-0.2, -1.8], [-0.16, -1.98],
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

/** The bare parts of a figure from back to front. The leg is drawn only where the figure wears no trousers. */
export function bodyShapes(view: FigureView, proportions: Proportions): BodyShape[] {
  const hemY = levelY(LEVELS.hem, proportions);
  if (view === 'left' || view === 'right') {
    return [
      { part: 'foot', segments: sideFoot(-0.07, hemY) },
      { part: 'torso', segments: sideTorso(proportions) },
    ];
  }
  if (view === 'seated') {
    const legs = seatedLegs(proportions);
    return [
      { part: 'foot', segments: sideFoot(legs.kneeFrontX - 0.32, legs.floorY - 0.265) },
      { part: 'torso', segments: sideTorso(proportions) },
    ];
  }
  const leg = frontLeg(proportions);
  const foot = standingFoot(view, proportions);
  const arm = frontArm(proportions);
  return [
    { part: 'leg', segments: leg },
    { part: 'leg', segments: mirrored(leg) },
    { part: 'foot', segments: foot },
    { part: 'foot', segments: mirrored(foot) },
    { part: 'torso', segments: frontTorso(proportions) },
    { part: 'arm', segments: arm },
    { part: 'arm', segments: mirrored(arm) },
  ];
}

/** Height of the floor under the figure, in figure coordinates. */
export function floorY(view: FigureView, proportions: Proportions): number {
  if (view === 'seated') return seatedLegs(proportions).floorY;
  return levelY(LEVELS.hem, proportions) + 0.265;
}
