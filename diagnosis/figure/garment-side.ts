import { curveSegments, curveReader, reverseSegments, straightSegment, type Curve } from './curve';
import { landmark, type Garment, type Landmark, type NamedPath } from './garment';
import { rowSegment } from './row-segment';
import type { RowReader } from './mesh';
import { between, figurePoint, type Side } from './point';
import type { Proportions } from './proportions';
import { seatedBackCurve, seatedFrontCurve } from './seated';
import { backEdgeCurve, frontEdgeCurve, sideLift } from './standing';
import { LEVELS, SIDE_ZONES } from './zone-tables';

export type SideView = 'left' | 'right' | 'seated';

const COLUMNS = [0, 0.2, 0.42, 0.58, 0.8, 1];
const SEAM = 0.5;

/** A seated figure is drawn from the wearer's left. */
export function shownSide(view: SideView): Side {
  return view === 'right' ? 'right' : 'left';
}

function edgeCurves(view: SideView, proportions: Proportions): { front: Curve; back: Curve } {
  return view === 'seated'
    ? { front: seatedFrontCurve(proportions), back: seatedBackCurve(proportions) }
    : { front: frontEdgeCurve(proportions), back: backEdgeCurve(proportions) };
}

/** Where a level and a fraction (0 front edge … 1 back edge) lie; a higher hip lifts the waist at the side seam. */
export function sideRows(view: SideView, proportions: Proportions): RowReader {
  const { front, back } = edgeCurves(view, proportions);
  const [frontEdge, backEdge] = [curveReader(front), curveReader(back)];
  const lift = sideLift(shownSide(view), proportions);
  return (v) => {
    const [from, to] = [frontEdge(v), backEdge(v)];
    const raised = lift * Math.max(0, 1 - v / LEVELS.hip) ** 1.5 * 4;
    return (fraction) => {
      const flat = between(from, to, fraction);
      return figurePoint(flat.x, flat.y - raised * fraction * (1 - fraction));
    };
  };
}

function sideEdges(rows: RowReader, curves: { front: Curve; back: Curve }): NamedPath[] {
  return [
    { name: 'waist', segments: [rowSegment(rows(LEVELS.waist), 0, 1)] },
    { name: 'back-edge', segments: curveSegments(curves.back) },
    { name: 'hem', segments: [straightSegment(rows(LEVELS.hem)(1), rows(LEVELS.hem)(0))] },
    { name: 'front-edge', segments: reverseSegments(curveSegments(curves.front)) },
  ];
}

function sideSeams(rows: RowReader): NamedPath[] {
  const along = (name: string, levels: readonly number[], fraction: (v: number) => number): NamedPath => ({
    name,
    segments: curveSegments({ knots: levels.map((v) => ({ v, ...rows(v)(fraction(v)) })) }),
  });
  const seamRows = [0.12, 0.3, 0.42, 0.6, 0.72, 0.86, 1, 1.3, 1.7, 1.95, 2.15, 2.4, 2.65, 3, 3.3, 3.6];
  return [
    { name: 'band-edge', segments: [rowSegment(rows(LEVELS.bandEdge), 0, 1)] },
    along('side-seam', seamRows, () => SEAM),
    along('pocket', [0.12, 0.3, 0.46, 0.6, 0.68], (v) => 0.25 + 0.25 * ((v - 0.12) / 0.56) ** 1.1),
    { name: 'hem-stitching', segments: [straightSegment(rows(3.48)(0), rows(3.48)(1))] },
  ];
}

function sideLandmarks(view: SideView, rows: RowReader): Landmark[] {
  const level = view === 'seated' ? [] : [landmark('fork', null, rows(LEVELS.crotch)(SEAM))];
  const lap = view === 'seated' ? [landmark('lap', null, rows(0.62)(0))] : [];
  return [
    landmark('waist-front', null, rows(LEVELS.waist)(0)),
    landmark('waist', null, rows(LEVELS.waist)(SEAM)),
    landmark('waist-back', null, rows(LEVELS.waist)(1)),
    landmark('abdomen', null, rows(LEVELS.highHip)(0)),
    landmark('high-hip', null, rows(LEVELS.highHip)(SEAM)),
    landmark('seat', null, rows(0.68)(1)),
    landmark('hip', null, rows(LEVELS.hip)(SEAM)),
    ...lap,
    ...level,
    landmark('under-seat', null, rows(1)(1)),
    landmark('thigh', null, rows(LEVELS.thigh)(SEAM)),
    landmark('knee', null, rows(LEVELS.knee)(0)),
    landmark('behind-knee', null, rows(LEVELS.knee)(1)),
    landmark('calf', null, rows(LEVELS.calf)(1)),
    landmark('ankle', null, rows(LEVELS.hem - 0.02)(SEAM)),
    landmark('hem', null, rows(LEVELS.hem)(SEAM)),
    landmark('hem-front', null, rows(LEVELS.hem)(0)),
    landmark('hem-back', null, rows(LEVELS.hem)(1)),
  ];
}

/** Trousers seen from the side, standing or seated. */
export function sideGarment(view: SideView, proportions: Proportions): Garment {
  const rows = sideRows(view, proportions);
  return {
    edges: sideEdges(rows, edgeCurves(view, proportions)),
    seams: sideSeams(rows),
    landmarks: sideLandmarks(view, rows),
    sheets: [
      {
        side: shownSide(view),
        rows: SIDE_ZONES.rows,
        columnsAt: () => COLUMNS,
        rowAt: rows,
        zones: SIDE_ZONES.zones,
        joinedDownTo: null,
        isSided: () => true,
      },
    ],
  };
}
