import { blurred, emptyField, inflated, type Field } from './field';
import { addFolds } from './fold-relief';
import type { Fold } from './folds';
import { castShadow, lambert } from './light';
import { paintRoom } from './room';
import type { Scene } from './scene';
import { softNoise, weave } from './weave';

export type Cloth = 'muslin' | 'grey-wool' | 'linen';
type Colour = readonly [red: number, green: number, blue: number];

const CLOTHS: Record<Cloth, { colour: Colour; weave: number; line: Colour; stitch: Colour }> = {
  muslin: { colour: [224, 211, 186], weave: 1, line: [62, 84, 128], stitch: [186, 78, 44] },
  'grey-wool': { colour: [122, 124, 131], weave: 1.7, line: [236, 236, 230], stitch: [240, 214, 150] },
  linen: { colour: [206, 190, 158], weave: 1.8, line: [58, 66, 84], stitch: [170, 66, 52] },
};
const TOP: Colour = [142, 149, 148];
const FORM: Colour = [205, 190, 174];
const HOLLOW: Colour = [74, 66, 58];

export type Layers = {
  readonly scene: Scene;
  readonly folds: readonly Fold[];
  readonly cloth: Cloth;
  readonly seed: number;
  readonly garment: Field;
  /** The garment with its legs drawn on below the hem, so that it does not round off there. */
  readonly tube: Field;
  readonly torso: Field;
  readonly arms: Field;
  readonly feet: Field;
  readonly seams: Field;
  readonly basting: Field;
  readonly balance: Field;
  readonly gap: Field;
};

function clothRelief({ scene, folds, tube, torso, seams, seed }: Layers): Field {
  const { width, height } = tube;
  const whole = emptyField(width, height);
  whole.data.forEach((_, i) => (whole.data[i] = Math.max(tube.data[i]!, torso.data[i]!)));
  const relief = inflated(whole, scene.view === 'front' || scene.view === 'back' ? 0.72 : 0.62);
  const wide = softNoise(width, height, 110, 2.6, seed + 1);
  const narrow = softNoise(width, height, 46, 2.1, seed + 2);
  const sunk = blurred(seams, 3);
  relief.data.forEach((_, i) => {
    relief.data[i]! += wide.data[i]! * 4.6 + narrow.data[i]! * 0.9 - sunk.data[i]! * 6;
  });
  addFolds(relief, folds);
  return blurred(relief, 1.4);
}

function mix(pixels: Buffer, at: number, colour: Colour, light: number, cover: number): void {
  for (let channel = 0; channel < 3; channel += 1) {
    // Shade is a little warmer than light, as beside a bulb.
    const tint = channel === 2 ? 0.965 + 0.035 * light : 1;
    const shown = Math.min(255, colour[channel]! * light * tint);
    pixels[at + channel] = pixels[at + channel]! * (1 - cover) + shown * cover;
  }
}

function paintForm(pixels: Buffer, mask: Field, colour: Colour, depth: number): void {
  const relief = inflated(mask, depth);
  mask.data.forEach((cover, i) => {
    if (cover === 0) return;
    mix(pixels, i * 3, colour, lambert(relief, i % mask.width, Math.floor(i / mask.width)), cover);
  });
}

function paintHollow(pixels: Buffer, { gap }: Layers): void {
  const edge = blurred(gap, 6);
  gap.data.forEach((cover, i) => {
    if (cover > 0) mix(pixels, i * 3, HOLLOW, 1.25 - 0.6 * edge.data[i]!, cover);
  });
}

function paintGarment(pixels: Buffer, layers: Layers): void {
  const { garment, cloth, seams, basting, balance, seed } = layers;
  const { width } = garment;
  const { colour, weave: strength, line, stitch } = CLOTHS[cloth];
  const relief = clothRelief(layers);
  const around = blurred(relief, 16);
  const threads = weave(width, garment.height, strength, seed + 3);
  garment.data.forEach((cover, i) => {
    if (cover === 0) return;
    const [x, y] = [i % width, Math.floor(i / width)];
    const hollow = Math.min(0.2, Math.max(-0.06, (around.data[i]! - relief.data[i]!) * 0.016));
    const shade = 1 - 0.34 * castShadow(relief, x, y);
    const light = lambert(relief, x, y) * shade * (1 - hollow) * threads.data[i]!;
    mix(pixels, i * 3, colour, light * (1 - 0.3 * seams.data[i]!), cover);
    mix(pixels, i * 3, line, light, cover * balance.data[i]! * 0.62);
    mix(pixels, i * 3, stitch, light, cover * basting.data[i]! * 0.85);
  });
}

/** The picture as RGB bytes, row by row: room, then what is farther before what is nearer. */
export function shadePhoto(layers: Layers): Buffer {
  const { scene, garment, torso, arms, feet, gap, seed } = layers;
  const body = emptyField(garment.width, garment.height);
  body.data.forEach((_, i) => {
    body.data[i] = Math.max(garment.data[i]!, torso.data[i]!, arms.data[i]!, feet.data[i]!);
  });
  const pixels = paintRoom(scene, body, seed);
  paintForm(pixels, feet, FORM, 0.8);
  paintForm(pixels, torso, TOP, 0.7);
  if (gap.data.some((cover) => cover > 0)) paintHollow(pixels, layers);
  paintGarment(pixels, layers);
  paintForm(pixels, arms, FORM, 0.85);
  return pixels;
}
