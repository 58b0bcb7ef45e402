import {
  curveReader,
  curveSegments,
  mirrorSegments,
  reverseSegments,
  straightSegment,
  type CubicSegment,
} from './curve';
import { landmark, type Garment, type Landmark, type NamedPath } from './garment';
import { rowSegment } from './row-segment';
import type { RowReader, Sheet } from './mesh';
import { between, figurePoint, mirrorPoint, type Side } from './point';
import type { Proportions } from './proportions';
import { inseamCurve, sideSeamCurve } from './standing';
import { BACK_ZONES, FRONT_ZONES, isSidedZone, LEVELS } from './zone-tables';

export type StandingView = 'front' | 'back';

const WAIST_DIP = { front: 0.045, back: 0.015 } as const;

/** Where a level and a fraction (0 centre front or inseam … 1 side seam) lie on one half, drawn as if it were the left. */
function halfRows(view: StandingView, side: Side, proportions: Proportions): RowReader {
  const sideSeam = curveReader(sideSeamCurve(side, proportions));
  const inseam = curveReader(inseamCurve(proportions));
  return (v) => {
    const inner = v <= LEVELS.crotch ? figurePoint(0, v) : inseam(v);
    const outer = sideSeam(v);
    const dip = WAIST_DIP[view] * Math.max(0, 1 - v / LEVELS.hip) ** 2;
    return (fraction) => {
      const flat = between(inner, outer, fraction);
      return figurePoint(flat.x, flat.y + dip * (1 - fraction * fraction));
    };
  };
}

/** The same places on the wearer's own side. */
export function garmentRows(view: StandingView, side: Side, proportions: Proportions): RowReader {
  const rows = halfRows(view, side, proportions);
  if (side === 'left') return rows;
  return (v) => {
    const at = rows(v);
    return (fraction) => mirrorPoint(at(fraction));
  };
}

/** Columns of the front: the pocket runs from the band outward to the side seam, the rest keep their share. */
function frontColumns(v: number): readonly number[] {
  const run = Math.min(1, Math.max(0, (v - 0.12) / 0.6));
  return [0, 0.17, 0.44, 0.6 + 0.1 * run, 0.8 + 0.07 * run, 1];
}

function backColumns(): readonly number[] {
  return [0, 0.17, 0.44, 0.68, 0.87, 1];
}

function sheetOf(view: StandingView, side: Side, proportions: Proportions): Sheet {
  const table = view === 'front' ? FRONT_ZONES : BACK_ZONES;
  return {
    side,
    rows: table.rows,
    columnsAt: view === 'front' ? frontColumns : backColumns,
    rowAt: garmentRows(view, side, proportions),
    zones: table.zones,
    joinedDownTo: LEVELS.crotch,
    isSided: isSidedZone,
  };
}

function halfEdges(view: StandingView, side: Side, proportions: Proportions) {
  const rows = halfRows(view, side, proportions);
  const waist = [rowSegment(rows(LEVELS.waist), 0, 1)];
  const sideSeam = curveSegments(sideSeamCurve(side, proportions));
  const hem = [straightSegment(rows(LEVELS.hem)(1), rows(LEVELS.hem)(0))];
  const inseam = reverseSegments(curveSegments(inseamCurve(proportions)));
  return { waist, sideSeam, hem, inseam };
}

/** Once round: centre waist, the wearer's left side, hem, inseam to the fork, then the same on the right and back. */
function garmentEdges(view: StandingView, proportions: Proportions): NamedPath[] {
  const left = halfEdges(view, 'left', proportions);
  const right = halfEdges(view, 'right', proportions);
  const back = (segments: readonly CubicSegment[]) => reverseSegments(mirrorSegments(segments));
  return [
    { name: 'waist-left', segments: left.waist },
    { name: 'side-seam-left', segments: left.sideSeam },
    { name: 'hem-left', segments: left.hem },
    { name: 'inseam-left', segments: left.inseam },
    { name: 'inseam-right', segments: back(right.inseam) },
    { name: 'hem-right', segments: back(right.hem) },
    { name: 'side-seam-right', segments: back(right.sideSeam) },
    { name: 'waist-right', segments: back(right.waist) },
  ];
}

function halfSeams(view: StandingView, side: Side, proportions: Proportions): NamedPath[] {
  const rows = garmentRows(view, side, proportions);
  const along = (name: string, levels: readonly number[], fraction: (v: number) => number): NamedPath => ({
    name: `${name}-${side}`,
    segments: curveSegments({ knots: levels.map((v) => ({ v, ...rows(v)(fraction(v)) })) }),
  });
  const shared = [
    { name: `band-edge-${side}`, segments: [rowSegment(rows(LEVELS.bandEdge), 0, 1)] },
    { name: `hem-stitching-${side}`, segments: [rowSegment(rows(3.48), 0, 1)] },
  ];
  if (view === 'front') {
    return [
      ...shared,
      along('pocket', [0.12, 0.3, 0.46, 0.6, 0.68], (v) => 0.7 + 0.3 * ((v - 0.12) / 0.56) ** 1.15),
      along('crease', [0.5, 0.8, 1.1, 1.5, 2.15, 2.65, 3.6], (v) => 0.5 - 0.02 * Math.min(1, v)),
    ];
  }
  return [
    ...shared,
    along('dart', [0.12, 0.25, 0.4], () => 0.5),
    along('crease', [1.15, 1.5, 2.15, 2.65, 3.6], () => 0.48),
  ];
}

function centreSeams(view: StandingView, proportions: Proportions): NamedPath[] {
  const rows = garmentRows(view, 'left', proportions);
  const top = rows(view === 'front' ? LEVELS.waist : LEVELS.bandEdge)(0);
  const centre = { name: `centre-${view}`, segments: [straightSegment(top, rows(LEVELS.crotch)(0))] };
  if (view === 'back') return [centre];
  const knots = [
    { v: 0, ...rows(LEVELS.bandEdge)(0.2) },
    { v: 1, ...rows(0.36)(0.195) },
    { v: 2, ...rows(0.5)(0.165) },
    { v: 3, ...rows(0.585)(0.09) },
    { v: 4, ...rows(0.63)(0) },
  ];
  return [centre, { name: 'fly', segments: curveSegments({ knots }) }];
}

function halfLandmarks(view: StandingView, side: Side, proportions: Proportions): Landmark[] {
  const rows = garmentRows(view, side, proportions);
  const own =
    view === 'front'
      ? [landmark('abdomen', side, rows(0.45)(0.45))]
      : [landmark('seat', side, rows(0.7)(0.5)), landmark('under-seat', side, rows(1.06)(0.5))];
  return [
    landmark('waist', side, rows(LEVELS.waist)(1)),
    landmark('high-hip', side, rows(LEVELS.highHip)(1)),
    landmark('hip', side, rows(LEVELS.hip)(1)),
    ...own,
    landmark('thigh', side, rows(LEVELS.thigh)(0.5)),
    landmark(view === 'front' ? 'knee' : 'behind-knee', side, rows(LEVELS.knee)(0.5)),
    landmark('calf', side, rows(LEVELS.calf)(0.5)),
    landmark('hem', side, rows(LEVELS.hem)(0.5)),
    landmark('ankle', side, rows(LEVELS.hem - 0.02)(0.5)),
  ];
}

/** Trousers on a standing figure, from the front or from behind. The back is not the front mirrored: x stays the wearer's. */
export function standingGarment(view: StandingView, proportions: Proportions): Garment {
  const sides: readonly Side[] = ['left', 'right'];
  const rows = garmentRows(view, 'left', proportions);
  return {
    edges: garmentEdges(view, proportions),
    seams: [
      ...centreSeams(view, proportions),
      ...sides.flatMap((side) => halfSeams(view, side, proportions)),
    ],
    landmarks: [
      landmark('waist-centre', null, rows(LEVELS.waist)(0)),
      landmark('fork', null, rows(LEVELS.crotch)(0)),
      ...sides.flatMap((side) => halfLandmarks(view, side, proportions)),
    ],
    sheets: sides.map((side) => sheetOf(view, side, proportions)),
  };
}
