import { knot, type Curve } from './curve';
import type { Proportions } from './proportions';
import { LEVELS } from './zone-tables';

/** Where a seated figure's legs lie: x toward the front, the seat surface at y = 1 (one crotch depth below the waist). */
export function seatedLegs({ height, thigh, hip }: Proportions) {
  return {
    thighTopY: 1 - 0.3 * thigh - 0.26,
    kneeFrontX: 0.12 + 1.52 * height,
    thighBackX: -0.02 - 0.02 * hip,
    hemY: 1 + 1.2 * height,
    floorY: 1 + 1.5 * height,
  };
}

/** The front edge: abdomen, lap, top of the thigh, knee, shin. Parameters are the levels of the standing garment. */
export function seatedFrontCurve(proportions: Proportions): Curve {
  const { waist, hip, front, height } = proportions;
  const { thighTopY, kneeFrontX, hemY } = seatedLegs(proportions);
  const bellyX = 0.21 * waist + 0.215 * hip + 0.1 * front;
  const lapX = bellyX + 0.02;
  const along = (share: number) => lapX + (kneeFrontX - lapX) * share;
  return {
    knots: [
      knot(LEVELS.waist, 0.365 * waist + 0.03 * front, 0.03),
      knot(0.12, 0.385 * waist + 0.01 * hip + 0.06 * front, 0.145),
      knot(0.42, bellyX, Math.min(0.33, thighTopY - 0.08)),
      knot(0.62, lapX + 0.02, thighTopY),
      knot(0.86, along(0.22), thighTopY + 0.005),
      knot(LEVELS.thigh, along(0.5), thighTopY - 0.005),
      knot(1.8, along(0.86), thighTopY + 0.01),
      knot(LEVELS.knee, kneeFrontX, thighTopY + 0.2),
      knot(2.4, kneeFrontX + 0.005, thighTopY + 0.44),
      knot(3, kneeFrontX - 0.05, 1 + 0.62 * height),
      knot(LEVELS.hem, kneeFrontX - 0.08, hemY),
    ],
  };
}

/** The back edge: waist, seat, the underside on the chair, back of the knee, calf. */
export function seatedBackCurve(proportions: Proportions): Curve {
  const { waist, hip, seat, height, thigh } = proportions;
  const { kneeFrontX, hemY } = seatedLegs(proportions);
  const calf = 0.3 + 0.15 * thigh + 0.07 * hip;
  return {
    knots: [
      knot(LEVELS.waist, -0.365 * waist, -0.02),
      knot(0.12, -0.35 * waist - 0.03 * hip - 0.01 * seat, 0.11),
      knot(0.42, -0.16 * waist - 0.34 * hip - 0.045 * seat, 0.42),
      knot(0.68, -0.03 * waist - 0.53 * hip - 0.085 * seat, 0.74),
      knot(0.86, -0.46 * hip - 0.065 * seat, 0.95),
      knot(LEVELS.crotch, -0.26 * hip - 0.02 * seat, 1.005),
      knot(LEVELS.thigh, 0.12, 1),
      knot(1.8, kneeFrontX - calf - 0.24, 1),
      knot(LEVELS.knee, kneeFrontX - calf - 0.02, 1.035),
      knot(2.4, kneeFrontX - calf + 0.02, 1.2),
      knot(3, kneeFrontX - calf - 0.025, 1 + 0.66 * height),
      knot(LEVELS.hem, kneeFrontX - 0.42 - 0.06 * thigh - 0.09 * hip, hemY),
    ],
  };
}
