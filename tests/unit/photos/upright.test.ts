import sharp from 'sharp';
import { beforeAll, describe, expect, it } from 'vitest';
import { type EncodedPhoto, encodePhoto, VARIANTS } from '@/lib/photos/encode';
import { withXmp, XMP_MARK } from '../../support/jpeg-segments';
import { MARKERS, type Orientation, phoneJpeg } from '../../support/jpegs';

const ORIENTATIONS: Orientation[] = [1, 2, 3, 4, 5, 6, 7, 8];
const METADATA = ['Exif', 'RUCKLE-EXIF-MARK', 'http://ns.adobe.com', XMP_MARK, 'Photoshop', 'EXIF', 'XMP '];

const rawOf = (bytes: Buffer) => sharp(bytes).removeAlpha().raw().toBuffer({ resolveWithObject: true });

async function encoded(bytes: Buffer): Promise<EncodedPhoto> {
  const photo = await encodePhoto(bytes);
  if ('fault' in photo) throw new Error(photo.fault);
  return photo;
}

/** The mean absolute difference of two pictures of one size, in levels of 255. */
async function meanDifference(one: Buffer, other: Buffer): Promise<number> {
  const [a, b] = await Promise.all([rawOf(one), rawOf(other)]);
  expect([a.info.width, a.info.height]).toEqual([b.info.width, b.info.height]);
  let sum = 0;
  for (let i = 0; i < a.data.length; i += 1) sum += Math.abs((a.data[i] ?? 0) - (b.data[i] ?? 0));
  return sum / a.data.length;
}

describe('a photo from a phone held any way', () => {
  let reference: Buffer;
  beforeAll(async () => {
    reference = await phoneJpeg(1);
  });

  it.each(ORIENTATIONS)(
    '%i: stands upright, within one level of the picture that was taken',
    async (orientation) => {
      const sent = await phoneJpeg(orientation);
      expect((await sharp(sent).metadata()).orientation).toBe(orientation);
      const { files, widthPx, heightPx } = await encoded(sent);
      expect([widthPx, heightPx]).toEqual([900, 1200]);
      expect(await meanDifference(files.master, reference)).toBeLessThanOrEqual(1);
    },
  );

  it.each(ORIENTATIONS)('%i: every marker is where it was, in every size', async (orientation) => {
    const { files } = await encoded(await phoneJpeg(orientation));
    for (const variant of VARIANTS) {
      const { data, info } = await rawOf(files[variant]);
      for (const { x, y, rgb } of MARKERS) {
        const at = (Math.floor(y * info.height) * info.width + Math.floor(x * info.width)) * 3;
        rgb.forEach((level, channel) =>
          expect(Math.abs((data[at + channel] ?? 0) - level), `${variant} ${x} ${y}`).toBeLessThanOrEqual(10),
        );
      }
    }
  });

  it.each(ORIENTATIONS)('%i: no place, time, camera or profile is left in any size', async (orientation) => {
    const sent = withXmp(await phoneJpeg(orientation));
    for (const mark of ['Exif', 'RUCKLE-EXIF-MARK', XMP_MARK]) expect(sent.includes(mark)).toBe(true);
    const { files } = await encoded(sent);
    for (const variant of VARIANTS) {
      const { exif, xmp, iptc, icc, orientation: turned } = await sharp(files[variant]).metadata();
      expect({ exif, xmp, iptc, icc, turned }, variant).toEqual({});
      for (const mark of METADATA) expect(files[variant].includes(mark), `${variant}: ${mark}`).toBe(false);
    }
  });
});

describe('the sizes that are kept', () => {
  it('are none larger than their bound, and none larger than what came', async () => {
    const large = await encoded(await phoneJpeg(6, 3000, 4000));
    expect([large.widthPx, large.heightPx]).toEqual([1800, 2400]);
    const sides = await Promise.all(
      VARIANTS.map(async (variant) => {
        const { width, height, format } = await sharp(large.files[variant]).metadata();
        return [format, width, height];
      }),
    );
    expect(sides).toEqual([
      ['jpeg', 1800, 2400],
      ['webp', 1200, 1600],
      ['webp', 480, 640],
      ['webp', 120, 160],
    ]);
    const small = await encoded(await phoneJpeg(1, 300, 400));
    expect([small.widthPx, small.heightPx]).toEqual([300, 400]);
  });

  it('show a wide-gamut picture in the colours of every screen', async () => {
    const red = sharp({ create: { width: 200, height: 200, channels: 3, background: '#c83c28' } });
    const wide = await red.withIccProfile('p3').jpeg({ quality: 100, chromaSubsampling: '4:4:4' }).toBuffer();
    expect((await sharp(wide).metadata()).icc).toBeDefined();
    const { data } = await rawOf((await encoded(wide)).files.master);
    [200, 60, 40].forEach((level, i) => expect(Math.abs((data[i] ?? 0) - level)).toBeLessThanOrEqual(3));
  });
});
