import { lengthOf, solve } from '../geometry/cubic';
import { xy, type XY } from '../geometry/xy';
import type { Piece } from '../piece';
import type { BlockMeasures } from './measures';
import { hipSideCubic, inseamCubic, outlineBelowWaist, thighSideCubic, type Corners } from './outline';
import {
  backExtension,
  cutForStretch,
  frontExtension,
  frontSeat,
  hipAboveFork,
  kneeAboveHemMm,
  legHalf,
} from './published';
import { waistPaperMm, waistWithDart } from './waist';

/** Common practice, mm: what print leaves to the drafter. */
const PRACTICE = {
  depthEase: 10,
  frontLean: 10,
  frontDrop: 8,
  backRaise: 30,
  frontDart: { intake: 12, length: 90, place: 0.45 },
  backDart: { intake: 20, length: 120, place: 0.5 },
  hollow: { front: 6, back: 12 },
  /** The back inseam is drafted shorter and stretched on (usual 3–10). */
  inseamEase: 6,
  thighBelowFork: 25,
  thighBelowPoint: 10,
  abdomenBelowWaist: 85,
  allowance: 15,
} as const;

interface Levels {
  readonly hip: number;
  readonly fork: number;
  readonly knee: number;
  readonly hem: number;
}

interface Frame {
  readonly levels: Levels;
  readonly frontHip: number;
  readonly backHip: number;
  readonly sewnWaist: number;
  readonly kneeHalf: number;
  readonly hemHalf: number;
  readonly hip: number;
  readonly slope: number;
  /** 1 where the waist is at least a fifth smaller than the hip, 0 where it is as wide: then nothing is darted away. */
  readonly shaping: number;
}

function frameOf(measures: BlockMeasures): Frame {
  const { stretch } = measures;
  const hip = cutForStretch(measures.hipMm + measures.easeHipMm, stretch);
  const body = cutForStretch(measures.hipMm, stretch);
  const fork = measures.depthMm + PRACTICE.depthEase;
  // The front takes a quarter of the body (standards:D02); all ease goes to the back, so that the side seam lies forward.
  const frontHip = Math.min(frontSeat(body), hip / 4);
  return {
    levels: {
      hip: fork - hipAboveFork(body),
      fork,
      knee: fork + measures.inseamMm - kneeAboveHemMm(measures.inseamMm),
      hem: fork + measures.inseamMm,
    },
    frontHip,
    backHip: hip / 2 - frontHip,
    sewnWaist: cutForStretch(measures.waistMm + measures.easeWaistMm, stretch) / 4,
    kneeHalf: legHalf(measures.kneeMm),
    hemHalf: legHalf(measures.hemMm),
    hip: body,
    shaping: Math.min(1, Math.max(0, (1 - measures.waistMm / measures.hipMm) / 0.2)),
    slope: Math.tan((measures.backSlopeDeg * Math.PI) / 180),
  };
}

/** Corners that both pieces draw alike, round a middle line at x = 0. */
const legCorners = ({ levels, kneeHalf, hemHalf }: Frame) => ({
  kneeIn: xy(kneeHalf, levels.knee),
  hemIn: xy(hemHalf, levels.hem),
  hemOut: xy(-hemHalf, levels.hem),
  kneeOut: xy(-kneeHalf, levels.knee),
});

function frontCorners(frame: Frame): Corners {
  const { levels, frontHip } = frame;
  const half = (frontHip + frontExtension(frame.hip)) / 2;
  const centre = -half + frontHip;
  const at = (sideX: number): Corners => ({
    ...legCorners(frame),
    sideWaist: xy(sideX, 0),
    centreWaist: xy(centre - PRACTICE.frontLean, PRACTICE.frontDrop),
    hipIn: xy(centre, levels.hip),
    crotchPoint: xy(half, levels.fork),
    hipOut: xy(-half, levels.hip),
  });
  const wanted = frame.sewnWaist + PRACTICE.frontDart.intake * frame.shaping;
  return at(solve((x) => waistPaperMm(at(x)) - wanted, -half - 200, centre - 40));
}

const inseamMm = (corners: Corners, hollowMm: number) => lengthOf(inseamCubic(corners, hollowMm));
const sideMm = (corners: Corners) => lengthOf(thighSideCubic(corners)) + lengthOf(hipSideCubic(corners));

/** The back is drawn to the front: its point is dropped until the inseam is the ease shorter, its side waist raised until the sides agree. */
function backCorners(frame: Frame, front: Corners): Corners {
  const { levels, backHip } = frame;
  const width = backHip + backExtension(frame.hip);
  const side = -width / 2 + 10;
  const centre = side + backHip;
  const topY = -PRACTICE.backRaise;
  const draw = (sideWaist: XY, dropMm: number): Corners => ({
    ...legCorners(frame),
    sideWaist,
    centreWaist: xy(centre - frame.slope * (levels.hip - topY), topY),
    hipIn: xy(centre, levels.hip),
    crotchPoint: xy(side + width, levels.fork + dropMm),
    hipOut: xy(side, levels.hip),
  });
  const wantedInseam = inseamMm(front, PRACTICE.hollow.front) - PRACTICE.inseamEase;
  const dropMm = solve(
    (drop) => inseamMm(draw(xy(side, 0), drop), PRACTICE.hollow.back) - wantedInseam,
    -40,
    120,
  );
  const wantedWaist = frame.sewnWaist + PRACTICE.backDart.intake * frame.shaping;
  const waistAt = (y: number) =>
    solve((x) => waistPaperMm(draw(xy(x, y), dropMm)) - wantedWaist, side - 250, centre - 60);
  const y = solve((height) => sideMm(draw(xy(waistAt(height), height), dropMm)) - sideMm(front), -60, 60);
  return draw(xy(waistAt(y), y), dropMm);
}

const ALLOWANCES = Object.fromEntries(
  ['waist', 'dart-1', 'centre', 'curve', 'inseam', 'hem', 'side'].map((edge) => [
    edge,
    edge === 'hem' ? 40 : edge === 'curve' ? 10 : PRACTICE.allowance,
  ]),
);

function assemble(id: 'front' | 'back', corners: Corners, frame: Frame, thighY: number): Piece {
  const { levels } = frame;
  const dart = id === 'front' ? PRACTICE.frontDart : PRACTICE.backDart;
  const { parts, point } = waistWithDart(corners, {
    sewnMm: frame.sewnWaist,
    place: dart.place,
    lengthMm: dart.length,
  });
  const at = (y: number) => xy(0, y);
  return {
    id,
    parts: [...parts, ...outlineBelowWaist(corners, PRACTICE.hollow[id])],
    marks: {
      abdomen: at(PRACTICE.abdomenBelowWaist),
      hip: at(levels.hip),
      'low-seat': at((levels.hip + levels.fork) / 2),
      crotch: at(levels.fork),
      thigh: at(thighY),
      'mid-thigh': at((levels.fork + levels.knee) / 2),
      knee: at(levels.knee),
      calf: at(levels.knee + (levels.hem - levels.knee) / 3),
      'grain-top': at(levels.hip),
      'grain-foot': at(levels.hem - 60),
      ...(point ? { 'dart-1-point': point } : {}),
    },
    folds: [],
    allowancesMm: ALLOWANCES,
  };
}

/**
 * Front and back of a pair of trousers, on the stitching line, drafted from body measures (mm). Widths, levels and points by the
 * published figures in `published.ts` (standards:D02, D03, D08, D09); leans, darts, hollows and the eased inseam are common
 * practice. With `stretch` the girths are cut smaller and no length is changed.
 */
export function draftTrousers(measures: BlockMeasures): { front: Piece; back: Piece } {
  const frame = frameOf(measures);
  const front = frontCorners(frame);
  const back = backCorners(frame, front);
  // Both pieces share one thigh line, which must pass the inseam of the back below its dropped point.
  const thighY = Math.max(
    frame.levels.fork + PRACTICE.thighBelowFork,
    back.crotchPoint.y + PRACTICE.thighBelowPoint,
  );
  return {
    front: assemble('front', front, frame, thighY),
    back: assemble('back', back, frame, thighY),
  };
}
