import sharp, { type Sharp } from 'sharp';

export type Orientation = 1 | 2 | 3 | 4 | 5 | 6 | 7 | 8;

/** Where the markers lie on the upright picture, as fractions, and their colours. */
export const MARKERS = [
  { x: 0.1, y: 0.1, rgb: [200, 30, 30] },
  { x: 0.9, y: 0.1, rgb: [30, 160, 40] },
  { x: 0.1, y: 0.9, rgb: [30, 60, 200] },
  { x: 0.5, y: 0.5, rgb: [230, 200, 20] },
] as const;

async function upright(widthPx: number, heightPx: number): Promise<Buffer> {
  const squares = MARKERS.map(({ x, y, rgb: [r, g, b] }) => ({
    input: { create: { width: 60, height: 60, channels: 3 as const, background: { r, g, b } } },
    left: Math.round(x * widthPx) - 30,
    top: Math.round(y * heightPx) - 30,
  }));
  const ground = {
    create: {
      width: widthPx,
      height: heightPx,
      channels: 3 as const,
      background: { r: 222, g: 214, b: 200 },
    },
  };
  return sharp(ground).composite(squares).png().toBuffer();
}

/** The pixels as a camera held that way stores them: turned back by what its orientation tag will undo. */
function asStored(picture: Sharp, orientation: Orientation): Sharp {
  switch (orientation) {
    case 1:
      return picture;
    case 2:
      return picture.flop();
    case 3:
      return picture.rotate(180);
    case 4:
      return picture.flip();
    case 5:
      return picture.rotate(270).flop();
    case 6:
      return picture.rotate(270);
    case 7:
      return picture.rotate(90).flop();
    case 8:
      return picture.rotate(90);
  }
}

/**
 * A JPEG as a phone writes it: with markers, an orientation tag, a camera's name and a place (GPS), none of which may outlive
 * its upload.
 */
export async function phoneJpeg(orientation: Orientation, widthPx = 900, heightPx = 1200): Promise<Buffer> {
  const stored = await asStored(sharp(await upright(widthPx, heightPx)), orientation)
    .png()
    .toBuffer();
  return sharp(stored)
    .withExif({
      IFD0: { Make: 'Invented', Model: 'Test camera', Copyright: 'RUCKLE-EXIF-MARK' },
      IFD3: {
        GPSLatitudeRef: 'N',
        GPSLatitude: '51/1 30/1 3230/100',
        GPSLongitudeRef: 'W',
        GPSLongitude: '0/1 7/1 4366/100',
      },
    })
    .withMetadata({ orientation })
    .jpeg({ quality: 92 })
    .toBuffer();
}
