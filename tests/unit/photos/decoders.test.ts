import sharp, { type Sharp } from 'sharp';
import { describe, expect, it } from 'vitest';

const picture = () => sharp({ create: { width: 20, height: 20, channels: 3, background: '#a86' } });
const SVG = '<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"><rect width="9" height="9"/></svg>';

const MADE: Record<string, () => Promise<Buffer>> = {
  jpeg: () => picture().jpeg().toBuffer(),
  png: () => picture().png().toBuffer(),
  webp: () => picture().webp().toBuffer(),
  gif: () => picture().gif().toBuffer(),
  tiff: () => picture().tiff().toBuffer(),
  avif: () => picture().avif().toBuffer(),
  svg: async () => Buffer.from(SVG),
};
const OPEN = ['jpeg', 'png', 'webp'];

describe('the decoders of a process that takes photos in', () => {
  it.each(Object.keys(MADE))(
    '%s: is read only if a photo may be one, whatever the check before lets through',
    async (kind) => {
      const bytes = await MADE[kind]?.();
      const read = (from: Sharp) => from.metadata().then(({ format }) => format, () => 'shut'); // prettier-ignore
      await import('@/lib/photos/encode');
      expect(await read(sharp(bytes))).toBe(OPEN.includes(kind) ? kind : 'shut');
    },
  );
});
