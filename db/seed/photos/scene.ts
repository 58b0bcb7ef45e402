import sharp from 'sharp';
import { floorY } from '@/diagnosis/figure/body';
import { pictureDirection, type FigureView } from '@/diagnosis/figure/figure';
import { photoPoint, type FigurePoint, type PhotoPoint } from '@/diagnosis/figure/point';
import type { Proportions } from '@/diagnosis/figure/proportions';
import type { Field } from './field';

export const PHOTO_WIDTH_PX = 1200;
export const PHOTO_HEIGHT_PX = 1600;

const FLOOR_FROM_TOP = 0.925;

export type Scene = {
  readonly view: FigureView;
  readonly proportions: Proportions;
  readonly unitPx: number;
  readonly floorPx: number;
  readonly toPixel: (point: FigurePoint) => { x: number; y: number };
  readonly toPhoto: (point: FigurePoint) => PhotoPoint;
};

/** Where the camera stands: level, at hip height, far enough that the picture is taken as parallel. */
export function sceneOf(view: FigureView, proportions: Proportions): Scene {
  const floorPx = PHOTO_HEIGHT_PX * FLOOR_FROM_TOP;
  const floor = floorY(view, proportions);
  const unitPx = Math.min(view === 'seated' ? 372 : 300, floorPx / (floor + 1.12));
  const middleX = view === 'seated' ? 0.56 : 0;
  const direction = pictureDirection(view);
  const toPixel = ({ x, y }: FigurePoint) => ({
    x: PHOTO_WIDTH_PX / 2 + direction * (x - middleX) * unitPx,
    y: floorPx + (y - floor) * unitPx,
  });
  const toPhoto = (point: FigurePoint) => {
    const { x, y } = toPixel(point);
    return photoPoint(x / PHOTO_WIDTH_PX, y / PHOTO_HEIGHT_PX);
  };
  return { view, proportions, unitPx, floorPx, toPixel, toPhoto };
}

/** How much of each pixel the shapes cover, 0–1. `content` is SVG drawn in white. */
export async function coverage(content: string): Promise<Field> {
  const svg =
    `<svg xmlns="http://www.w3.org/2000/svg" width="${PHOTO_WIDTH_PX}" height="${PHOTO_HEIGHT_PX}">` +
    `<rect width="100%" height="100%" fill="black"/>${content}</svg>`;
  const { data } = await sharp(Buffer.from(svg)).greyscale().raw().toBuffer({ resolveWithObject: true });
  return {
    width: PHOTO_WIDTH_PX,
    height: PHOTO_HEIGHT_PX,
    data: Float32Array.from(data, (level) => level / 255),
  };
}
