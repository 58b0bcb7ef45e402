import { describe, expect, it } from 'vitest';
import { judgePhoto, type GreyPicture } from '@/diagnosis/photo/photo-quality';
import { seeded } from '../../support/marked-photos';

const SIDE = 120;
const picture = (at: (x: number, y: number) => number): GreyPicture => ({
  width: SIDE,
  height: SIDE,
  grey: Array.from({ length: SIDE * SIDE }, (_, i) => at(i % SIDE, Math.floor(i / SIDE))),
});
/** A light wall, and before it cloth with folds a few pixels wide and a little grain. */
const chance = seeded(7);
const CLOTH = picture((x, y) =>
  x < 40 || x > 85
    ? 205 + chance.between(-2, 2)
    : 90 + (Math.floor((x + y / 3) / 6) % 2) * 50 + chance.between(-4, 4),
);

/** Each pixel the mean of its neighbourhood, as a moved camera makes it. */
const blurred = ({ grey }: GreyPicture, reach: number) =>
  picture((x, y) => {
    let [sum, count] = [0, 0];
    for (let dy = -reach; dy <= reach; dy += 1)
      for (let dx = -reach; dx <= reach; dx += 1) {
        const [px, py] = [Math.min(SIDE - 1, Math.max(0, x + dx)), Math.min(SIDE - 1, Math.max(0, y + dy))];
        sum += grey[py * SIDE + px]!;
        count += 1;
      }
    return sum / count;
  });
const scaled = ({ grey }: GreyPicture, by: number) => picture((x, y) => grey[y * SIDE + x]! * by);

describe('whether a photo can be read', () => {
  it('takes a sharp one in fair light', () => {
    expect(judgePhoto(CLOTH).verdict).toBe('good');
  });

  it('turns down one that is out of focus, and finds less detail the more it is', () => {
    expect(judgePhoto(blurred(CLOTH, 5)).verdict).toBe('blurred');
    const [none, some, much] = [CLOTH, blurred(CLOTH, 1), blurred(CLOTH, 5)].map((one) => judgePhoto(one).sharpness); // prettier-ignore
    expect(none).toBeGreaterThan(some!);
    expect(some).toBeGreaterThan(much!);
  });

  it('tells darkness and glare from blur, and does not call a dim sharp photo blurred', () => {
    expect(judgePhoto(scaled(CLOTH, 0.2)).verdict).toBe('dark');
    expect(judgePhoto(picture(() => 245)).verdict).toBe('glaring');
    expect(judgePhoto(scaled(CLOTH, 0.5)).sharpness).toBeCloseTo(judgePhoto(CLOTH).sharpness, 6);
  });

  it('finds nothing sharp on a blank picture', () => {
    expect(judgePhoto(picture(() => 128))).toMatchObject({ sharpness: 0, verdict: 'blurred' });
  });
});
