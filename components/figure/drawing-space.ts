import { armAxis, floorY } from '@/diagnosis/figure/body';
import { pictureDirection, type FigureView } from '@/diagnosis/figure/figure';
import { figurePoint, type FigurePoint } from '@/diagnosis/figure/point';
import type { Proportions } from '@/diagnosis/figure/proportions';
import { seatedLegs } from '@/diagnosis/figure/seated';

type XY = { x: number; y: number };

/** One crotch depth in units of the drawing's viewBox. */
export const UNIT = 100;

const TOP = -1.2;
const MARGIN = 0.1;

export type DrawingSpace = {
  readonly viewBox: string;
  readonly width: number;
  readonly height: number;
  /** From figure coordinates to the viewBox. */
  readonly place: (point: FigurePoint) => XY;
  /** From the viewBox back to figure coordinates. */
  readonly figureAt: (place: XY) => FigurePoint;
};

function reach(view: FigureView, proportions: Proportions): { from: number; to: number } {
  if (view === 'front' || view === 'back') {
    const hand = armAxis(proportions).wrist[0] + 0.16;
    return { from: -hand, to: hand };
  }
  const back = -0.42 * Math.max(proportions.waist, proportions.hip) - 0.22;
  if (view === 'seated') return { from: back - 0.08, to: seatedLegs(proportions).kneeFrontX + 0.36 };
  return { from: back, to: Math.max(0.66, 0.45 * proportions.waist + 0.14) };
}

/** The frame that a view of the figure is drawn in, and the way between it and figure coordinates. */
export function drawingSpace(view: FigureView, proportions: Proportions): DrawingSpace {
  const direction = pictureDirection(view);
  const { from, to } = reach(view, proportions);
  const left = direction === 1 ? from : -to;
  const width = (to - from + 2 * MARGIN) * UNIT;
  const height = (floorY(view, proportions) + 0.12 - TOP + MARGIN) * UNIT;
  return {
    viewBox: `0 0 ${width.toFixed(1)} ${height.toFixed(1)}`,
    width,
    height,
    place: ({ x, y }) => ({ x: (direction * x - left + MARGIN) * UNIT, y: (y - TOP) * UNIT }),
    figureAt: ({ x, y }) => figurePoint(direction * (x / UNIT + left - MARGIN), y / UNIT + TOP),
  };
}
