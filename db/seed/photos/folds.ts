import type { FigureView } from '@/diagnosis/figure/figure';
import { garmentRows } from '@/diagnosis/figure/garment-front-back';
import { sideRows } from '@/diagnosis/figure/garment-side';
import { curveReader } from '@/diagnosis/figure/curve';
import type { FigurePoint, PhotoPoint, Side } from '@/diagnosis/figure/point';
import type { Proportions } from '@/diagnosis/figure/proportions';
import { FOLD_RECIPES, type FoldKind, type FoldPath, type FoldSignId, type Place } from './fold-recipes';
import type { Scene } from './scene';

/** 1 faint, 2 clear, 3 pulling. */
export type FoldStrength = 1 | 2 | 3;

/** A reading to show in the cloth; without a side it shows on both. */
export type FoldWish = {
  readonly sign: FoldSignId;
  readonly strength: FoldStrength;
  readonly side?: Side;
};

export type Fold = {
  readonly sign: FoldSignId;
  readonly kind: FoldKind;
  readonly strength: FoldStrength;
  /** The wearer's side; null where the fold crosses the centre line. */
  readonly side: Side | null;
  readonly widthPx: number;
  readonly pixels: readonly { readonly x: number; readonly y: number }[];
  /** The crest of the fold, as fractions of the photo. */
  readonly points: readonly PhotoPoint[];
};

const STEPS = 18;

/** Where a level and a fraction across lie in a view; a negative fraction is on the wearer's other side. */
export function clothPlace(view: FigureView, proportions: Proportions, side: Side) {
  if (view === 'front' || view === 'back') {
    const other: Side = side === 'left' ? 'right' : 'left';
    const [own, opposite] = [garmentRows(view, side, proportions), garmentRows(view, other, proportions)];
    return ([v, across]: Place): FigurePoint => (across < 0 ? opposite(v)(-across) : own(v)(across));
  }
  const rows = sideRows(view, proportions);
  return ([v, across]: Place): FigurePoint => rows(v)(across);
}

function foldOf(scene: Scene, wish: FoldWish, path: FoldPath, side: Side, isCentred: boolean): Fold {
  const place = clothPlace(scene.view, scene.proportions, side);
  const knots = path.places.map((at, v) => ({ v, ...place(at) }));
  const read = curveReader({ knots });
  const points = Array.from({ length: STEPS + 1 }, (_, i) => read(((knots.length - 1) * i) / STEPS));
  return {
    sign: wish.sign,
    kind: path.kind,
    strength: wish.strength,
    side: isCentred ? null : side,
    widthPx: path.width * scene.unitPx,
    pixels: points.map(scene.toPixel),
    points: points.map(scene.toPhoto),
  };
}

/** Every fold that the wishes put into this view; a wish that this view cannot show adds none. */
export function foldsOf(scene: Scene, wishes: readonly FoldWish[]): Fold[] {
  const { view } = scene;
  return wishes.flatMap((wish) => {
    const recipe: Partial<Record<FigureView, readonly FoldPath[]>> = FOLD_RECIPES[wish.sign];
    const shownSides: readonly Side[] =
      view === 'front' || view === 'back' ? ['left', 'right'] : [view === 'right' ? 'right' : 'left'];
    const sides = shownSides.filter((side) => wish.side === undefined || wish.side === side);
    return (recipe[view] ?? []).flatMap((path) =>
      path.sided
        ? sides.map((side) => foldOf(scene, wish, path, side, false))
        : [foldOf(scene, wish, path, 'left', true)],
    );
  });
}
