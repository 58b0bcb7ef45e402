import type { PhotoFault } from './faults';

export type PhotoKind = 'jpeg' | 'png' | 'webp';

const ascii = (bytes: Uint8Array, from: number, to: number) =>
  String.fromCharCode(...bytes.subarray(from, to));
/** ISO/IEC 23008-12 (HEIF) and the AV1 image format: the major brands that phones and cameras write. */
const HEIF_BRANDS = new Set('heic heix heim heis hevc hevx hevm hevs mif1 mif2 msf1 avif avis'.split(' '));

/** What a file is by its first bytes, whatever it is called and whatever was claimed. */
export function sniff(bytes: Uint8Array): { kind: PhotoKind } | { fault: PhotoFault } {
  if (bytes.length === 0) return { fault: 'empty' };
  if (bytes[0] === 0xff && bytes[1] === 0xd8 && bytes[2] === 0xff) return { kind: 'jpeg' };
  if (ascii(bytes, 0, 8) === '\x89PNG\r\n\x1a\n') return { kind: 'png' };
  if (ascii(bytes, 0, 4) === 'RIFF' && ascii(bytes, 8, 12) === 'WEBP') return { kind: 'webp' };
  if (ascii(bytes, 4, 8) === 'ftyp' && HEIF_BRANDS.has(ascii(bytes, 8, 12))) return { fault: 'heic' };
  return { fault: 'not-a-photo' };
}
