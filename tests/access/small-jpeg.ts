import sharp from 'sharp';

/** A plain picture, as bytes of a JPEG file. */
export const smallJpeg = (): Promise<Buffer> =>
  sharp({ create: { width: 80, height: 120, channels: 3, background: '#c9b79c' } })
    .jpeg()
    .toBuffer();
