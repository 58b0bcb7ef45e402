import sharp from 'sharp';
import { figureGarment, type FigureView } from '@/diagnosis/figure/figure';
import type { PhotoPoint } from '@/diagnosis/figure/point';
import type { Proportions } from '@/diagnosis/figure/proportions';
import {
  balanceLines,
  bastingStitches,
  bodyShape,
  gapShape,
  garmentShape,
  seamLines,
  tubeShape,
} from './drawing';
import { foldsOf, type Fold, type FoldWish } from './folds';
import { coverage, PHOTO_HEIGHT_PX, PHOTO_WIDTH_PX, sceneOf } from './scene';
import { shadePhoto, type Cloth } from './shade';

export type PhotoSpec = {
  readonly view: FigureView;
  readonly proportions: Proportions;
  readonly cloth: Cloth;
  /** What the cloth shows; a sign that this view cannot show leaves no fold. */
  readonly signs: readonly FoldWish[];
  readonly seed: number;
};

export type PhotoPlan = {
  readonly widthPx: number;
  readonly heightPx: number;
  readonly folds: readonly Fold[];
  /** Landmarks by id, as fractions of the photo. */
  readonly landmarks: Readonly<Record<string, PhotoPoint>>;
};

const JPEG_QUALITY = 88;

/** Where everything on the photo lies, without drawing it: for marks that sit exactly on their folds. */
export function planPhoto({ view, proportions, signs }: PhotoSpec): PhotoPlan {
  const scene = sceneOf(view, proportions);
  const places = figureGarment(view, proportions).landmarks;
  return {
    widthPx: PHOTO_WIDTH_PX,
    heightPx: PHOTO_HEIGHT_PX,
    folds: foldsOf(scene, signs),
    landmarks: Object.fromEntries(places.map(({ id, at }) => [id, scene.toPhoto(at)])),
  };
}

/** A drawn wearer in a muslin, lit from the side, as a JPEG without metadata. The same spec gives the same picture. */
export async function renderPhoto(spec: PhotoSpec): Promise<Buffer> {
  const scene = sceneOf(spec.view, spec.proportions);
  const folds = foldsOf(scene, spec.signs);
  const [garment, tube, torso, arms, feet, seams, basting, balance, gap] = await Promise.all([
    coverage(garmentShape(scene)),
    coverage(tubeShape(scene)),
    coverage(bodyShape(scene, ['torso'])),
    coverage(bodyShape(scene, ['arm'])),
    coverage(bodyShape(scene, ['foot'])),
    coverage(seamLines(scene)),
    coverage(bastingStitches(scene)),
    coverage(balanceLines(scene)),
    coverage(gapShape(folds)),
  ]);
  const pixels = shadePhoto({ scene, folds, cloth: spec.cloth, seed: spec.seed, garment, tube, torso, arms, feet, seams, basting, balance, gap }); // prettier-ignore
  return sharp(pixels, { raw: { width: PHOTO_WIDTH_PX, height: PHOTO_HEIGHT_PX, channels: 3 } })
    .jpeg({ quality: JPEG_QUALITY })
    .toBuffer();
}
