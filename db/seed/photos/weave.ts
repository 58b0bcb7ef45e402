import { emptyField, sampled, type Field } from './field';
import { seededRandom } from './random';

/** Smooth random values about 0, −1…1, whose bumps are `size` pixels wide and `stretch` times as tall. */
export function softNoise(
  width: number,
  height: number,
  sizePx: number,
  stretch: number,
  seed: number,
): Field {
  const random = seededRandom(seed);
  const coarse = emptyField(Math.ceil(width / sizePx) + 2, Math.ceil(height / (sizePx * stretch)) + 2);
  coarse.data.forEach((_, i) => (coarse.data[i] = random() * 2 - 1));
  const smooth = (value: number) => {
    const whole = Math.floor(value);
    const part = value - whole;
    return whole + part * part * (3 - 2 * part);
  };
  const field = emptyField(width, height);
  for (let y = 0; y < height; y += 1) {
    for (let x = 0; x < width; x += 1) {
      field.data[y * width + x] = sampled(coarse, smooth(x / sizePx), smooth(y / (sizePx * stretch)));
    }
  }
  return field;
}

/** Brightness of a plain weave about 1: warp and weft, uneven threads, a little grain. `strength` 1 is an unbleached muslin. */
export function weave(width: number, height: number, strength: number, seed: number): Field {
  const random = seededRandom(seed);
  const thread = () => (random() + random() - 1) * 0.022;
  const warp = Float32Array.from({ length: width }, thread);
  const weft = Float32Array.from({ length: height }, thread);
  const field = emptyField(width, height);
  for (let y = 0; y < height; y += 1) {
    for (let x = 0; x < width; x += 1) {
      const crossing = (x + y) % 2 === 0 ? 0.012 : -0.012;
      const grain = (random() - 0.5) * 0.05;
      field.data[y * width + x] = 1 + strength * (warp[x]! + weft[y]! + crossing + grain);
    }
  }
  return field;
}
