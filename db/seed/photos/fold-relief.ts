import type { Field } from './field';
import type { Fold } from './folds';

/** Height of a fold's crest over the cloth for each strength, in fold widths. */
const RISE = { tight: [0, 0.3, 0.6, 0.95], slack: [0, 0.42, 0.75, 1.05], gap: [0, 0, 0, 0] } as const;

type Nearest = { readonly distance: number; readonly signed: number; readonly along: number };

function nearestOn(pixels: Fold['pixels'], x: number, y: number): Nearest {
  let best = { distance: Infinity, signed: 0, along: 0 };
  for (let i = 0; i + 1 < pixels.length; i += 1) {
    const [a, b] = [pixels[i]!, pixels[i + 1]!];
    const [dx, dy] = [b.x - a.x, b.y - a.y];
    const t = Math.min(1, Math.max(0, ((x - a.x) * dx + (y - a.y) * dy) / (dx * dx + dy * dy)));
    const [ox, oy] = [x - a.x - t * dx, y - a.y - t * dy];
    const distance = Math.hypot(ox, oy);
    if (distance < best.distance) {
      const isBelow = Math.abs(dx) > Math.abs(dy) ? oy > 0 : ox > 0;
      best = { distance, signed: isBelow ? distance : -distance, along: (i + t) / (pixels.length - 1) };
    }
  }
  return best;
}

/** A taut line: a narrow ridge with a trough on either side, strongest where it is anchored. */
function tautProfile(distance: number, width: number, along: number): number {
  const d = distance / width;
  const taper = Math.min(1, along * 9 + 0.15) * Math.min(1, (1 - along) * 4) * (1 - 0.35 * along);
  return (1 - 0.75 * d * d) * Math.exp((-d * d) / 2) * taper;
}

/** A slack fold: a soft wave that leans over, steep beneath, with a shallow trough below it. */
function slackProfile(signed: number, width: number, along: number): number {
  const d = signed / width;
  const wave = Math.exp(-((d / (d > 0 ? 0.7 : 1.5)) ** 2)) - 0.55 * Math.exp(-(((d - 1.35) / 0.75) ** 2));
  const taper = Math.sin(Math.PI * Math.min(1, Math.max(0, along))) ** 0.6;
  return wave * taper;
}

/** Adds the folds to a height field, in pixels of height. */
export function addFolds(relief: Field, folds: readonly Fold[]): void {
  for (const fold of folds) {
    if (fold.kind === 'gap') continue;
    const reach = fold.widthPx * 4;
    const rise = RISE[fold.kind][fold.strength] * fold.widthPx;
    const [xs, ys] = [fold.pixels.map(({ x }) => x), fold.pixels.map(({ y }) => y)];
    const [left, right] = [
      Math.max(0, Math.min(...xs) - reach),
      Math.min(relief.width - 1, Math.max(...xs) + reach),
    ];
    const [top, bottom] = [
      Math.max(0, Math.min(...ys) - reach),
      Math.min(relief.height - 1, Math.max(...ys) + reach),
    ];
    for (let y = Math.floor(top); y <= bottom; y += 1) {
      for (let x = Math.floor(left); x <= right; x += 1) {
        const { distance, signed, along } = nearestOn(fold.pixels, x, y);
        if (distance > reach) continue;
        const profile =
          fold.kind === 'tight'
            ? tautProfile(distance, fold.widthPx, along)
            : slackProfile(signed, fold.widthPx, along);
        relief.data[y * relief.width + x]! += profile * rise;
      }
    }
  }
}
