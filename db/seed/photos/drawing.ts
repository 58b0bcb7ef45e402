import { bodyShapes, type BodyPart } from '@/diagnosis/figure/body';
import { cubicPath } from '@/diagnosis/figure/svg-path';
import { figureGarment } from '@/diagnosis/figure/figure';
import type { FigurePoint } from '@/diagnosis/figure/point';
import { clothPlace, type Fold } from './folds';
import type { Place } from './fold-recipes';
import type { Scene } from './scene';

const WHITE = 'fill="white" stroke="none"';

/** The trousers as one white shape. */
export function garmentShape(scene: Scene): string {
  const segments = figureGarment(scene.view, scene.proportions).edges.flatMap((edge) => edge.segments);
  return `<path d="${cubicPath(segments, scene.toPixel, true)}" ${WHITE}/>`;
}

/** The trousers with their legs carried on below the hem. */
export function tubeShape(scene: Scene): string {
  const hems = figureGarment(scene.view, scene.proportions).edges.filter(({ name }) =>
    name.startsWith('hem'),
  );
  const added = hems.map(({ segments }) => {
    const [a, b] = [scene.toPixel(segments[0]!.from), scene.toPixel(segments.at(-1)!.to)];
    const drop = scene.unitPx * 0.4;
    return `<polygon points="${a.x},${a.y - 2} ${b.x},${b.y - 2} ${b.x},${b.y + drop} ${a.x},${a.y + drop}" ${WHITE}/>`;
  });
  return garmentShape(scene) + added.join('');
}

/** Parts of the body as white shapes. */
export function bodyShape(scene: Scene, parts: readonly BodyPart[]): string {
  return bodyShapes(scene.view, scene.proportions)
    .filter(({ part }) => parts.includes(part))
    .map(({ segments }) => `<path d="${cubicPath(segments, scene.toPixel, true)}" ${WHITE}/>`)
    .join('');
}

function strokes(scene: Scene, named: (name: string) => boolean, attributes: string): string {
  return figureGarment(scene.view, scene.proportions)
    .seams.filter(({ name }) => named(name))
    .map(
      ({ segments }) =>
        `<path d="${cubicPath(segments, scene.toPixel)}" fill="none" stroke="white" ${attributes}/>`,
    )
    .join('');
}

/** Seams, pocket and fly of the sewn trousers; creases are not pressed into a muslin. */
export function seamLines(scene: Scene): string {
  return strokes(scene, (name) => !name.startsWith('crease'), 'stroke-width="2.6" stroke-linecap="round"');
}

/** The long stitches that hold a muslin together at band and hem. */
export function bastingStitches(scene: Scene): string {
  const isBasted = (name: string) => name.startsWith('band-edge') || name.startsWith('hem-stitching');
  return strokes(scene, isBasted, 'stroke-width="2.4" stroke-dasharray="13 7" stroke-linecap="round"');
}

function polyline(scene: Scene, points: readonly FigurePoint[], attributes: string): string {
  const text = points.map(scene.toPixel).map(({ x, y }) => `${x.toFixed(1)},${y.toFixed(1)}`);
  return `<polyline points="${text.join(' ')}" fill="none" stroke="white" ${attributes}/>`;
}

/** The balance lines drawn on a muslin: hip line and crotch level round it, grain down each leg. */
export function balanceLines(scene: Scene): string {
  const isHalved = scene.view === 'front' || scene.view === 'back';
  const place = clothPlace(scene.view, scene.proportions, 'left');
  const other = clothPlace(scene.view, scene.proportions, 'right');
  const line = (places: readonly Place[], at = place) =>
    polyline(scene, places.map(at), 'stroke-width="2.8"');
  const from = isHalved ? -1 : 0;
  const across = (v: number): Place[] =>
    Array.from({ length: 25 }, (_, i) => [v, from + ((1 - from) * i) / 24]);
  const down = (top: number, bottom: number, f: number): Place[] =>
    Array.from({ length: 25 }, (_, i) => [top + ((bottom - top) * i) / 24, f]);
  const grain = isHalved
    ? line(down(0.45, 3.4, 0.49)) + line(down(0.45, 3.4, 0.49), other)
    : line(down(0.35, 3.3, 0.27)) + line(down(0.35, 3.3, 0.74));
  return line(across(0.72)) + line(across(0.985)) + grain;
}

/** The opening between a gaping band and the body: a crescent above the band. */
export function gapShape(folds: readonly Fold[]): string {
  return folds
    .filter(({ kind }) => kind === 'gap')
    .map(({ pixels, strength, widthPx }) => {
      const rise = widthPx * (0.35 + 0.4 * strength);
      const upper = pixels.map(({ x, y }, i) => ({
        x,
        y: y - rise * Math.sin((Math.PI * i) / (pixels.length - 1)) ** 0.8,
      }));
      const ring = [...pixels, ...upper.reverse()].map(({ x, y }) => `${x.toFixed(1)},${y.toFixed(1)}`);
      return `<polygon points="${ring.join(' ')}" ${WHITE}/>`;
    })
    .join('');
}
