import sharp from 'sharp';
import { expect, it } from 'vitest';
import { encodePhoto } from '@/lib/photos/encode';

const MEGABYTE = 1024 * 1024;
const PICTURE_MB = (3000 * 3000 * 8) / MEGABYTE;
const peakMb = () => process.resourceUsage().maxRSS / 1024;

/** As dear as a picture of its size can be: two bytes a channel and interlaced, so that no decoder can read it in strips. */
const dear = () =>
  sharp({ create: { width: 3000, height: 3000, channels: 4, background: { r: 9, g: 99, b: 199, alpha: 1 } } })
    .toColourspace('rgb16')
    .png({ progressive: true, compressionLevel: 1 })
    .toBuffer();

it('eight dear pictures at once take the memory of two or three, not of eight', async () => {
  const bytes = await dear();
  expect((await sharp(bytes).metadata()).depth).toBe('ushort');
  const beforeMb = peakMb();
  const ends = await Promise.all(Array.from({ length: 8 }, () => encodePhoto(bytes)));
  expect(ends.filter((end) => 'fault' in end)).toEqual([]);
  expect(peakMb() - beforeMb).toBeLessThan(4 * PICTURE_MB);
}, 60_000);
