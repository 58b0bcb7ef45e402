declare const figureSpace: unique symbol;
declare const photoSpace: unique symbol;

/**
 * A place on the drawn figure. 1 is the crotch depth (waist to crotch level); y grows downward from the waist.
 * Front and back: x is 0 on the centre line and grows toward the wearer's left. Left, right and seated: x is 0 midway
 * between front and back at the waist and grows toward the wearer's front.
 */
export type FigurePoint = { readonly x: number; readonly y: number; readonly [figureSpace]: true };

/** A place on a photo as fractions (0–1) of its width and height, x from the left, y from the top. */
export type PhotoPoint = { readonly x: number; readonly y: number; readonly [photoSpace]: true };

export type Side = 'left' | 'right';

export function figurePoint(x: number, y: number): FigurePoint {
  return { x, y } as FigurePoint;
}

export function photoPoint(x: number, y: number): PhotoPoint {
  return { x, y } as PhotoPoint;
}

/** The point a fraction `t` (0–1) of the way from `a` to `b`. */
export function between(a: FigurePoint, b: FigurePoint, t: number): FigurePoint {
  return figurePoint(a.x + (b.x - a.x) * t, a.y + (b.y - a.y) * t);
}

/** The same place on the other side of the body (front and back views). Never yields −0, so mirrored drawings compare equal. */
export function mirrorPoint(point: FigurePoint): FigurePoint {
  return figurePoint(0 - point.x, point.y);
}
