import { armAxis } from './body';
import { curveSegments, mirrorSegments, reverseSegments, type CubicSegment } from './curve';
import type { FigureView } from './figure';
import { garmentRows } from './garment-front-back';
import type { Proportions } from './proportions';
import { levelY, standingWidths } from './standing';
import { LEVELS } from './zone-tables';

type Place = readonly [x: number, y: number];
type Stroke = readonly CubicSegment[];

function strokeThrough(...places: readonly Place[]): Stroke {
  return curveSegments({ knots: places.map(([x, y], v) => ({ v, x, y })) });
}

function onBothSides(strokes: readonly Stroke[]): Stroke[] {
  return [...strokes, ...strokes.map(mirrorSegments)];
}

/** The lines between the fingers of a hand at rest, and the fold at the wrist. */
export function handLines(proportions: Proportions): Stroke[] {
  const [x] = armAxis(proportions).wrist;
  return onBothSides([
    strokeThrough([x + 0.072, 0.78], [x + 0.066, 0.9], [x + 0.05, 1.0]),
    strokeThrough([x + 0.028, 0.78], [x + 0.026, 0.92], [x + 0.02, 1.03]),
    strokeThrough([x - 0.012, 0.78], [x - 0.012, 0.9], [x - 0.01, 1.0]),
    strokeThrough([x - 0.042, 0.86], [x - 0.05, 0.76], [x - 0.06, 0.68]),
  ]);
}

/** Toes from the front; the heel cords from behind. */
export function footLines(view: 'front' | 'back', proportions: Proportions): Stroke[] {
  const { hemAxis: x } = standingWidths(proportions);
  const y = levelY(LEVELS.hem, proportions);
  if (view === 'back') {
    return onBothSides([
      strokeThrough([x - 0.045, y + 0.03], [x - 0.035, y + 0.12]),
      strokeThrough([x + 0.045, y + 0.03], [x + 0.04, y + 0.12]),
    ]);
  }
  return onBothSides([
    strokeThrough([x - 0.045, y + 0.35], [x - 0.042, y + 0.29]),
    strokeThrough([x + 0.025, y + 0.345], [x + 0.024, y + 0.295]),
    strokeThrough([x + 0.085, y + 0.333], [x + 0.08, y + 0.288]),
    strokeThrough([x + 0.137, y + 0.31], [x + 0.128, y + 0.273]),
  ]);
}

/** Lightly drawn roundness: the seat over the thighs from behind, the knees from the front. */
export function formLines(view: FigureView, proportions: Proportions): Stroke[] {
  if (view !== 'back') return [];
  const rows = garmentRows('back', 'left', proportions);
  const at = (v: number, across: number): Place => {
    const { x, y } = rows(v)(across);
    return [x, y];
  };
  return onBothSides([strokeThrough(at(1.0, 0.1), at(1.035, 0.3), at(1.02, 0.56), at(0.97, 0.74))]);
}

/** A plain undergarment for the figure without trousers, closed. */
export function underwearOutline(proportions: Proportions): Stroke {
  const w = standingWidths(proportions);
  const [waistSide, legSide]: Place[] = [[0.985 * w.highHipHalf, 0.31], [w.hipHalf - 0.016, 0.72]]; // prettier-ignore
  const left = [
    ...strokeThrough([0, 0.34], [0.5 * w.highHipHalf, 0.335], waistSide!),
    ...strokeThrough(waistSide!, [0.5 * (w.highHipHalf + w.hipHalf) + 0.002, 0.51], legSide!),
    ...strokeThrough(
      legSide!,
      [0.66 * w.hipHalf, 0.845],
      [0.3 * w.hipHalf, 0.985],
      [0.075, 1.055],
      [0, 1.05],
    ),
  ];
  return [...left, ...reverseSegments(mirrorSegments(left))];
}

/** The knees of the bare figure from the front, the hollows behind them from the back. */
export function kneeLines(view: 'front' | 'back', proportions: Proportions): Stroke[] {
  const { kneeAxis: x } = standingWidths(proportions);
  const y = levelY(LEVELS.knee, proportions);
  if (view === 'back') {
    return onBothSides([strokeThrough([x - 0.1, y + 0.02], [x, y + 0.05], [x + 0.1, y + 0.02])]);
  }
  return onBothSides([
    strokeThrough([x - 0.09, y - 0.06], [x - 0.1, y + 0.04], [x - 0.055, y + 0.12]),
    strokeThrough([x + 0.09, y - 0.06], [x + 0.1, y + 0.04], [x + 0.055, y + 0.12]),
  ]);
}
