import { figurePoint } from '@/diagnosis/figure/point';
import { blurred, emptyField, type Field } from './field';
import type { Scene } from './scene';
import { softNoise } from './weave';

const FLOOR_DEPTH_PX = 78;
const SKIRTING_PX = 30;
const WALL = [204, 201, 194] as const;
const FLOOR = [158, 141, 122] as const;
const STOOL = [136, 108, 84] as const;

/** The shadow that the body throws on the wall behind it, moved away from the lamp. */
function wallShadow(body: Field): Field {
  const moved = emptyField(body.width, body.height);
  const [dx, dy] = [74, 22];
  for (let y = dy; y < body.height; y += 1) {
    for (let x = dx; x < body.width; x += 1) {
      moved.data[y * body.width + x] = body.data[(y - dy) * body.width + x - dx]!;
    }
  }
  return blurred(moved, 34);
}

/** The shadow on the floor: darkest where the feet touch it, thinning away from the lamp. */
function floorShadow(body: Field, floorPx: number): Field {
  const flat = emptyField(body.width, body.height);
  const touching = Math.round(floorPx) - 10;
  for (let depth = -26; depth < 40; depth += 1) {
    const y = Math.round(floorPx) + depth;
    for (let x = 0; x < body.width; x += 1) {
      let cover = 0;
      for (let away = 0; away <= 120; away += 6) {
        const from = x - away - Math.round(depth * 0.6);
        if (from < 0) break;
        cover = Math.max(cover, body.data[touching * body.width + from]! * (1 - away / 150));
      }
      flat.data[y * body.width + x] = cover * (depth < 0 ? 1 + depth / 40 : 1 - depth / 60);
    }
  }
  return blurred(flat, 12);
}

type Box = { left: number; right: number; top: number };

function stoolBox(scene: Scene): Box | null {
  if (scene.view !== 'seated') return null;
  const [a, b] = [scene.toPixel(figurePoint(-0.62, 1)), scene.toPixel(figurePoint(0.86, 1))];
  return { left: Math.min(a.x, b.x), right: Math.max(a.x, b.x), top: a.y };
}

function stoolShade(box: Box, x: number, y: number): number {
  const across = (x - box.left) / (box.right - box.left);
  const isLid = y < box.top + 26;
  return isLid ? 1.16 - 0.16 * across : 0.84 - 0.22 * across - (y < box.top + 40 ? 0.12 : 0);
}

/** A plain wall, a skirting board and a floor, lit from the left, with the body's soft shadows; RGB bytes. */
export function paintRoom(scene: Scene, body: Field, seed: number): Buffer {
  const { width, height } = body;
  const pixels = Buffer.alloc(width * height * 3);
  const [onWall, onFloor] = [wallShadow(body), floorShadow(body, scene.floorPx)];
  const mottle = softNoise(width, height, 210, 1, seed + 7);
  const boards = softNoise(width, height, 9, 0.25, seed + 8);
  const grain = softNoise(width, height, 2, 1, seed + 9);
  const floorTop = scene.floorPx - FLOOR_DEPTH_PX;
  const stool = stoolBox(scene);
  for (let y = 0; y < height; y += 1) {
    for (let x = 0; x < width; x += 1) {
      const i = y * width + x;
      const fall = 1.09 - 0.24 * (x / width) - 0.07 * (y / height);
      const isFloor = y >= floorTop;
      const isSkirting = !isFloor && y >= floorTop - SKIRTING_PX;
      const ledge = isSkirting && y < floorTop - SKIRTING_PX + 3 ? 0.9 : 1;
      const shadow = isFloor ? onFloor.data[i]! * 0.62 : onWall.data[i]! * 0.3;
      let light = fall * ledge * (1 - shadow) * (1 + mottle.data[i]! * 0.012 + grain.data[i]! * 0.012);
      let colour: readonly number[] = isFloor ? FLOOR : WALL;
      if (isFloor) light *= 1 + boards.data[i]! * 0.035 - (y - floorTop < 4 ? 0.22 : 0);
      if (isSkirting) light *= 1.05;
      if (stool && x >= stool.left && x < stool.right && y >= stool.top && y < scene.floorPx) {
        colour = STOOL;
        light = stoolShade(stool, x, y) * (1 + boards.data[i]! * 0.03);
      }
      for (let channel = 0; channel < 3; channel += 1) {
        pixels[i * 3 + channel] = Math.min(255, colour[channel]! * light);
      }
    }
  }
  return pixels;
}
