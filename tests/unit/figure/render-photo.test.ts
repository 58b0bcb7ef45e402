import sharp from 'sharp';
import { describe, expect, it } from 'vitest';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';
import { FOLD_RECIPES, type FoldSignId } from '@/db/seed/photos/fold-recipes';
import { planPhoto, renderPhoto, type PhotoSpec } from '@/db/seed/photos/render-photo';

const SPEC: PhotoSpec = {
  view: 'back',
  proportions: REFERENCE_PROPORTIONS,
  cloth: 'muslin',
  signs: [{ sign: 'slack-under-seat', strength: 3 }],
  seed: 5,
};
const TIMEOUT_MS = 120_000;

async function greyOf(jpeg: Buffer) {
  return sharp(jpeg).greyscale().raw().toBuffer({ resolveWithObject: true });
}

describe('a drawn demo photo', () => {
  it(
    'is the same for the same spec, carries no metadata, and shows its folds where the plan says',
    async () => {
      const [photo, again] = [await renderPhoto(SPEC), await renderPhoto(SPEC)];
      expect(photo.equals(again)).toBe(true);
      const clean = await renderPhoto({ ...SPEC, signs: [] });
      const { width, height, exif, xmp, format } = await sharp(photo).metadata();
      expect([format, width, height, exif, xmp]).toEqual(['jpeg', 1200, 1600, undefined, undefined]);

      const [withFolds, without] = [await greyOf(photo), await greyOf(clean)];
      const change = (x: number, y: number) => {
        let greatest = 0;
        for (let dy = -14; dy <= 14; dy += 1) {
          const at = (Math.round(y * 1600) + dy) * 1200 + Math.round(x * 1200);
          greatest = Math.max(greatest, Math.abs(withFolds.data[at]! - without.data[at]!));
        }
        return greatest;
      };
      for (const { points } of planPhoto(SPEC).folds) {
        const middle = points[Math.floor(points.length / 2)]!;
        expect(change(middle.x, middle.y)).toBeGreaterThan(25);
      }
      expect(change(0.46, 0.8)).toBeLessThan(25);
      expect(change(0.1, 0.5)).toBeLessThan(12);
    },
    TIMEOUT_MS,
  );

  it('keeps every fold of every recipe and every landmark inside the picture', () => {
    for (const sign of Object.keys(FOLD_RECIPES) as FoldSignId[]) {
      for (const view of ['front', 'back', 'left', 'right', 'seated'] as const) {
        const plan = planPhoto({ ...SPEC, view, signs: [{ sign, strength: 2 }] });
        const places = [...plan.folds.flatMap(({ points }) => points), ...Object.values(plan.landmarks)];
        for (const { x, y } of places) expect(x > 0.02 && x < 0.98 && y > 0.02 && y < 0.98).toBe(true);
        const wanted: Partial<Record<string, readonly unknown[]>> = FOLD_RECIPES[sign];
        expect(plan.folds.length > 0).toBe(wanted[view] !== undefined);
      }
    }
  });

  it('puts a one-sided fold on the wearer’s side: left is on the left of a back view, on the right of a front view', () => {
    const xOf = (view: 'front' | 'back') =>
      planPhoto({ ...SPEC, view, signs: [{ sign: 'pull-into-inner-thigh', strength: 2, side: 'left' }] })
        .folds.map(({ points }) => points.at(-1)!.x); // prettier-ignore
    for (const x of xOf('back')) expect(x).toBeLessThan(0.5);
    for (const x of xOf('front')) expect(x).toBeGreaterThan(0.5);
  });
});
