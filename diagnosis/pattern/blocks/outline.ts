import { splitCubic, straight, type Cubic } from '../geometry/cubic';
import { between, distance, minus, plus, times, unit, xy, type XY } from '../geometry/xy';
import { part, type Part } from '../piece';

/** The corners of a leg piece, as drafted. */
export interface Corners {
  readonly sideWaist: XY;
  readonly centreWaist: XY;
  readonly hipIn: XY;
  readonly crotchPoint: XY;
  readonly kneeIn: XY;
  readonly hemIn: XY;
  readonly hemOut: XY;
  readonly kneeOut: XY;
  readonly hipOut: XY;
}

/** Where along the crotch cubic the notch lies; above it the seam belongs to the centre. */
const NOTCH_AT = 0.3;
/** How full the crotch curve is: 1 would run into its corner. */
const FULLNESS = 0.62;

const toward = (from: XY, direction: XY, mm: number) => plus(from, times(unit(direction), mm));
const level = xy(1, 0);

/** The waist: square to the centre line and nearly square to the side. */
export function waistCubic({ sideWaist, centreWaist, hipIn }: Corners): Cubic {
  const third = distance(sideWaist, centreWaist) / 3;
  const down = minus(hipIn, centreWaist);
  const square = xy(-down.y, down.x);
  return {
    from: sideWaist,
    control1: between(sideWaist, toward(centreWaist, square, third), 1 / 2),
    control2: toward(centreWaist, square, third),
    to: centreWaist,
  };
}

/** From the hip line round to the point: goes on as the centre line does, and meets the inseam nearly square. */
export function crotchCubic({ centreWaist, hipIn, crotchPoint }: Corners): Cubic {
  const down = unit(minus(hipIn, centreWaist));
  const corner = plus(hipIn, times(down, (crotchPoint.y - hipIn.y) / down.y));
  return {
    from: hipIn,
    control1: between(hipIn, corner, FULLNESS),
    control2: between(crotchPoint, corner, FULLNESS),
    to: crotchPoint,
  };
}

/** Fork to knee, a little hollow, running into the lower leg. */
export function inseamCubic({ crotchPoint, kneeIn, hemIn }: Corners, hollowMm: number): Cubic {
  const third = distance(crotchPoint, kneeIn) / 3;
  return {
    from: crotchPoint,
    control1: plus(between(crotchPoint, kneeIn, 1 / 3), times(level, -hollowMm)),
    control2: toward(kneeIn, minus(kneeIn, hemIn), third),
    to: kneeIn,
  };
}

/** Knee to hip at the side. */
export function thighSideCubic({ kneeOut, hemOut, hipOut }: Corners): Cubic {
  const third = distance(kneeOut, hipOut) / 3;
  return {
    from: kneeOut,
    control1: toward(kneeOut, minus(kneeOut, hemOut), third),
    control2: plus(hipOut, xy(0, third)),
    to: hipOut,
  };
}

/** Hip to waist at the side. */
export function hipSideCubic({ hipOut, sideWaist }: Corners): Cubic {
  const third = distance(hipOut, sideWaist) / 3;
  return {
    from: hipOut,
    control1: plus(hipOut, xy(0, -third)),
    control2: toward(sideWaist, minus(plus(hipOut, xy(0, -third)), sideWaist), third),
    to: sideWaist,
  };
}

/** Everything below the waist, clockwise from centre waist to side waist. */
export function outlineBelowWaist(corners: Corners, hollowMm: number): Part[] {
  const { centreWaist, hipIn, kneeIn, hemIn, hemOut, kneeOut } = corners;
  const [upper, lower] = splitCubic(crotchCubic(corners), NOTCH_AT);
  return [
    part('centre', straight(centreWaist, hipIn), 'centre-waist'),
    part('centre', upper, 'hip-in'),
    part('curve', lower, 'notch'),
    part('inseam', inseamCubic(corners, hollowMm), 'crotch-point'),
    part('inseam', straight(kneeIn, hemIn), 'knee-in'),
    part('hem', straight(hemIn, hemOut), 'hem-in'),
    part('side', straight(hemOut, kneeOut), 'hem-out'),
    part('side', thighSideCubic(corners), 'knee-out'),
    part('side', hipSideCubic(corners), 'hip-out'),
  ];
}
