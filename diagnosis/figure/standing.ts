import { knot, type Curve } from './curve';
import type { Side } from './point';
import type { Proportions } from './proportions';
import { LEVELS } from './zone-tables';

/** How far the waist rises on the higher side; it runs to nothing at crotch level. */
const HIGHER_SIDE_LIFT = 0.06;
const INSEAM_CLEARANCE = 0.022;

/** y of a level: below the crotch the legs stretch with `height`. */
export function levelY(v: number, { height }: Proportions): number {
  return v <= 1 ? v : 1 + (v - 1) * height;
}

export function sideLift(side: Side, { hipHigherSide }: Proportions): number {
  return hipHigherSide === side ? HIGHER_SIDE_LIFT : 0;
}

/** Half widths and leg axes seen from the front or the back, as distances from the centre line. */
export function standingWidths(proportions: Proportions) {
  const { hip, waist, thigh, legLine } = proportions;
  // Two thighs side by side are never wider than the hips: cloth hangs straight down from the widest place.
  const hipHalf = 0.662 * hip;
  const waistHalf = 0.525 * waist;
  const legWidth = Math.min(0.635 * (0.35 + 0.65 * thigh) * (0.55 + 0.45 * hip), hipHalf);
  const axis = 0.325 + 0.13 * (hip - 1) + 0.06 * (thigh - 1);
  const kneeHalf = 0.258 + 0.1 * (thigh - 1) + 0.08 * (hip - 1);
  const hemHalf = 0.25 + 0.05 * (thigh - 1) + 0.09 * (hip - 1);
  return {
    hipHalf,
    waistHalf,
    highHipHalf: 0.45 * waistHalf + 0.55 * hipHalf + 0.014,
    thighTop: 0.5 * hipHalf + 0.5 * (0.03 + legWidth),
    thighOuter: 0.32 * hipHalf + 0.68 * (0.035 + 0.95 * legWidth),
    kneeHalf,
    hemHalf,
    kneeAxis: Math.max(axis + 0.055 * legLine, kneeHalf + INSEAM_CLEARANCE),
    hemAxis: Math.max(axis - 0.05 * legLine, hemHalf + INSEAM_CLEARANCE),
  };
}

/** The side seam of the wearer's left, or the mirror image of the right one: always x > 0. */
export function sideSeamCurve(side: Side, proportions: Proportions): Curve {
  const w = standingWidths(proportions);
  const lift = sideLift(side, proportions);
  const y = (v: number) => levelY(v, proportions) - lift * Math.max(0, 1 - v) ** 1.5;
  return {
    knots: [
      knot(LEVELS.waist, w.waistHalf, y(0)),
      knot(0.12, 0.8 * w.waistHalf + 0.2 * w.highHipHalf + 0.002, y(0.12)),
      knot(LEVELS.highHip, w.highHipHalf, y(LEVELS.highHip)),
      knot(LEVELS.hip, w.hipHalf, y(LEVELS.hip)),
      knot(LEVELS.crotch, w.thighTop, 1),
      knot(LEVELS.thigh, w.thighOuter, y(LEVELS.thigh)),
      knot(LEVELS.knee, w.kneeAxis + w.kneeHalf, y(LEVELS.knee)),
      knot(LEVELS.calf, 0.62 * (w.kneeAxis + w.kneeHalf) + 0.38 * (w.hemAxis + w.hemHalf), y(LEVELS.calf)),
      knot(LEVELS.hem, w.hemAxis + w.hemHalf, y(LEVELS.hem)),
    ],
  };
}

/** The inner leg seam from the fork to the hem, x ≥ 0. */
export function inseamCurve(proportions: Proportions): Curve {
  const w = standingWidths(proportions);
  const y = (v: number) => levelY(v, proportions);
  const kneeInner = w.kneeAxis - w.kneeHalf;
  return {
    knots: [
      knot(LEVELS.crotch, 0, 1),
      knot(1.1, Math.min(0.016, kneeInner * 0.5), y(1.1)),
      knot(LEVELS.thigh, Math.min(0.034, kneeInner * 0.8), y(LEVELS.thigh)),
      knot(LEVELS.knee, kneeInner, y(LEVELS.knee)),
      knot(LEVELS.calf, 0.62 * kneeInner + 0.38 * (w.hemAxis - w.hemHalf), y(LEVELS.calf)),
      knot(LEVELS.hem, w.hemAxis - w.hemHalf, y(LEVELS.hem)),
    ],
  };
}

/** Front edge of the garment seen from the side, x toward the wearer's front. */
export function frontEdgeCurve(proportions: Proportions): Curve {
  const { hip, waist, front, thigh } = proportions;
  const y = (v: number) => levelY(v, proportions);
  return {
    knots: [
      knot(LEVELS.waist, 0.365 * waist + 0.03 * front, 0.03),
      knot(0.12, 0.37 * waist + 0.02 * hip + 0.055 * front, 0.145),
      knot(LEVELS.highHip, 0.2 * waist + 0.215 * hip + 0.1 * front, 0.44),
      knot(LEVELS.hip, 0.06 * waist + 0.345 * hip + 0.055 * front, LEVELS.hip),
      knot(LEVELS.crotch, 0.25 * hip + 0.12 * thigh + 0.01 * front, 1),
      knot(LEVELS.thigh, 0.1 * hip + 0.245 * thigh, y(LEVELS.thigh)),
      knot(LEVELS.knee, 0.04 + 0.155 * thigh + 0.06 * hip, y(LEVELS.knee)),
      knot(LEVELS.calf, 0.095 + 0.06 * thigh + 0.06 * hip, y(LEVELS.calf)),
      knot(LEVELS.hem, 0.1 + 0.035 * thigh + 0.055 * hip, y(LEVELS.hem)),
    ],
  };
}

/** Back edge of the garment seen from the side, x < 0. */
export function backEdgeCurve(proportions: Proportions): Curve {
  const { hip, waist, seat, thigh } = proportions;
  const y = (v: number) => levelY(v, proportions);
  return {
    knots: [
      knot(LEVELS.waist, -0.365 * waist, -0.02),
      knot(0.12, -0.35 * waist - 0.03 * hip - 0.005 * seat, 0.11),
      knot(LEVELS.highHip, -0.16 * waist - 0.315 * hip - 0.045 * seat, 0.41),
      knot(0.68, -0.03 * waist - 0.5 * hip - 0.09 * seat, 0.68),
      knot(0.9, -0.38 * hip - 0.11 * thigh - 0.06 * seat, 0.9),
      knot(1.12, -0.14 * hip - 0.275 * thigh - 0.02 * seat, y(1.12)),
      knot(1.5, -0.06 * hip - 0.295 * thigh, y(1.5)),
      knot(LEVELS.knee, -0.115 - 0.12 * thigh - 0.07 * hip, y(LEVELS.knee)),
      knot(LEVELS.calf, -0.145 - 0.11 * thigh - 0.07 * hip, y(LEVELS.calf)),
      knot(LEVELS.hem, -0.175 - 0.06 * thigh - 0.08 * hip, y(LEVELS.hem)),
    ],
  };
}
