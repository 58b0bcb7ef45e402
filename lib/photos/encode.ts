import 'server-only';
import { createHash } from 'node:crypto';
import sharp from 'sharp';
import { PHOTO_BYTES_MAX, type PhotoFault } from './faults';
import { sniff } from './sniff';
import { Turns } from './turns';

const PIXELS_MAX = 50_000_000;
const SECONDS_MAX = 20;
const MASTER_PX = 2400;
const VARIANT_PX = { '1600': 1600, '640': 640, '160': 160 } as const;

export const VARIANTS = ['master', '1600', '640', '160'] as const;
export type Variant = (typeof VARIANTS)[number];

export interface EncodedPhoto {
  files: Record<Variant, Buffer>;
  widthPx: number;
  heightPx: number;
  masterSha256: string;
}

// Every decoder is closed but the three that a photo may need: an SVG, PDF or TIFF never reaches its parser.
sharp.block({ operation: ['VipsForeignLoad'] });
sharp.unblock({ operation: ['VipsForeignLoadJpeg', 'VipsForeignLoadPng', 'VipsForeignLoadWebp'] });
sharp.cache(false);

const turns = new Turns(2, 12);

const open = (bytes: Buffer) =>
  sharp(bytes, { limitInputPixels: PIXELS_MAX, failOn: 'error', sequentialRead: true }).timeout({
    seconds: SECONDS_MAX,
  });

function faultOf(thrown: unknown): PhotoFault {
  const message = thrown instanceof Error ? thrown.message : '';
  if (/pixel limit/i.test(message)) return 'too-many-pixels';
  return /timeout/i.test(message) ? 'slow' : 'damaged';
}

async function encode(bytes: Buffer): Promise<EncodedPhoto> {
  const master = await open(bytes)
    .autoOrient()
    .flatten({ background: '#ffffff' })
    .resize({ width: MASTER_PX, height: MASTER_PX, fit: 'inside', withoutEnlargement: true })
    .toColourspace('srgb')
    .jpeg({ quality: 88 })
    .toBuffer({ resolveWithObject: true });
  const variant = (px: number) =>
    open(master.data)
      .resize({ width: px, height: px, fit: 'inside', withoutEnlargement: true })
      .webp({ quality: 82 })
      .toBuffer();
  const [large, middle, small] = await Promise.all(
    [VARIANT_PX['1600'], VARIANT_PX['640'], VARIANT_PX['160']].map(variant),
  );
  if (!large || !middle || !small) throw new Error('three variants go in, three come out');
  return {
    files: { master: master.data, '1600': large, '640': middle, '160': small },
    widthPx: master.info.width,
    heightPx: master.info.height,
    masterSha256: createHash('sha256').update(master.data).digest('hex'),
  };
}

/**
 * Reads a file as a photo and makes our own pictures of it: upright, sRGB, without any data on place, time or camera.
 * @param bytes the whole file, at most 25 MB and 50 megapixels
 * @returns master (JPEG, at most 2400 px) and variants (WebP), or why not
 */
export async function encodePhoto(bytes: Buffer): Promise<EncodedPhoto | { fault: PhotoFault }> {
  if (bytes.length > PHOTO_BYTES_MAX) return { fault: 'too-large' };
  const seen = sniff(bytes);
  if ('fault' in seen) return seen;
  const encoded = await turns.take(async (): Promise<EncodedPhoto | { fault: PhotoFault }> => {
    try {
      const { pages, format } = await open(bytes).metadata();
      if (format !== seen.kind) return { fault: 'not-a-photo' };
      if ((pages ?? 1) > 1) return { fault: 'animated' };
      return await encode(bytes);
    } catch (thrown) {
      return { fault: faultOf(thrown) };
    }
  });
  return encoded ?? { fault: 'busy' };
}
