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

/** Brightness of a plain weave about 1: threads that swell and thin along their length, slubs, a little grain. `strength` 1 is an unbleached muslin. */
export function weave(width: number, height: number, strength: number, seed: number): Field {
  const random = seededRandom(seed);
  const weft = softNoise(width, height, 26, 0.085, seed + 1);
  const warp = softNoise(width, height, 2.2, 14, seed + 2);
  const field = emptyField(width, height);
  for (let i = 0; i < field.data.length; i += 1) {
    const grain = (random() - 0.5) * 0.05;
    field.data[i] = 1 + strength * (weft.data[i]! * 0.022 + warp.data[i]! * 0.018 + grain);
  }
  return field;
}
