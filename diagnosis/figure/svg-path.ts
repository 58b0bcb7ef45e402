import type { CubicSegment } from './curve';
import type { FigurePoint } from './point';

type XY = { readonly x: number; readonly y: number };

const DIGITS = 2;

/** SVG path data of connected cubics, each point first carried to the drawing's coordinates; `close` adds the closing line. */
export function cubicPath(
  segments: readonly CubicSegment[],
  place: (point: FigurePoint) => XY,
  close = false,
): string {
  const text = (point: FigurePoint) => {
    const { x, y } = place(point);
    return `${x.toFixed(DIGITS)} ${y.toFixed(DIGITS)}`;
  };
  const curves = segments.map(
    ({ control1, control2, to }) => `C${text(control1)} ${text(control2)} ${text(to)}`,
  );
  return `M${text(segments[0]!.from)}${curves.join('')}${close ? 'Z' : ''}`;
}
