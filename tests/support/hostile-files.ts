import { crc32, deflateSync } from 'node:zlib';
import sharp from 'sharp';
import type { PhotoFault } from '@/lib/photos/faults';
import { withSegment, withXmp } from './jpeg-segments';
import { phoneJpeg } from './jpegs';

/** What becomes of a file: our own clean pictures of it, or a refusal with this sentence's name (several where either will do). */
export interface HostileFile {
  name: string;
  make: () => Buffer | Promise<Buffer>;
  ends: 'taken' | PhotoFault | readonly PhotoFault[];
}

export const SCRIPT_MARK = '<script>ruckle()</script>';

const PNG_SIGNATURE = Buffer.from('\x89PNG\r\n\x1a\n', 'latin1');

function pngChunk(type: string, data: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(type, 'latin1'), data]);
  const chunk = Buffer.alloc(body.length + 8);
  chunk.writeUInt32BE(data.length, 0);
  body.copy(chunk, 4);
  chunk.writeUInt32BE(crc32(body), body.length + 4);
  return chunk;
}

/** A PNG whose header claims a size, with as much or as little picture behind it as is given. */
function pngOf(widthPx: number, heightPx: number, deflated: Buffer, extra: Buffer[] = []): Buffer {
  const header = Buffer.alloc(13);
  header.writeUInt32BE(widthPx, 0);
  header.writeUInt32BE(heightPx, 4);
  header.set([8, 2, 0, 0, 0], 8);
  return Buffer.concat([
    PNG_SIGNATURE,
    pngChunk('IHDR', header),
    ...extra,
    pngChunk('IDAT', deflated),
    pngChunk('IEND', Buffer.alloc(0)),
  ]);
}

const pixels = (widthPx: number, heightPx: number) => deflateSync(Buffer.alloc(heightPx * (widthPx * 3 + 1)));

const plain = (widthPx = 300, heightPx = 400, channels: 3 | 4 = 3) =>
  sharp({
    create: {
      width: widthPx,
      height: heightPx,
      channels,
      background: { r: 180, g: 160, b: 140, alpha: 0.5 },
    },
  });

const jpeg = () => plain().jpeg().toBuffer();
const png = () => plain().png().toBuffer();
const webp = () => plain().webp().toBuffer();

/** Frame headers of a JPEG carry height and width in their sixth to ninth byte (ITU T.81, B.2.2). */
async function jpegClaiming(widthPx: number, heightPx: number): Promise<Buffer> {
  const bytes = Buffer.from(await jpeg());
  const frame = bytes.indexOf(Buffer.from([0xff, 0xc0]));
  bytes.writeUInt16BE(heightPx, frame + 5);
  bytes.writeUInt16BE(widthPx, frame + 7);
  return bytes;
}

async function moving(): Promise<Buffer> {
  const frames = await Promise.all(
    ['#a00', '#0a0', '#00a'].map((background) =>
      sharp({ create: { width: 80, height: 80, channels: 3, background } })
        .png()
        .toBuffer(),
    ),
  );
  return sharp(frames, { join: { animated: true } })
    .webp({ loop: 0, delay: [50, 50, 50] })
    .toBuffer();
}

async function movingGif(): Promise<Buffer> {
  return sharp(await moving(), { animated: true })
    .gif()
    .toBuffer();
}

const isoFile = (brand: string) =>
  Buffer.concat([
    Buffer.from([0, 0, 0, 24]),
    Buffer.from(`ftyp${brand}\0\0\0\0mif1${brand}`, 'latin1'),
    Buffer.alloc(64),
  ]);

const text = (words: string) => () => Buffer.from(words);
const cut = (make: () => Promise<Buffer>, part: number) => async () => {
  const whole = await make();
  return whole.subarray(0, Math.floor(whole.length * part));
};
const followedBy = (make: () => Promise<Buffer>, tail: Buffer) => async () =>
  Buffer.concat([await make(), tail]);

async function spoiled(): Promise<Buffer> {
  const bytes = Buffer.from(await plain(1200, 1600).png().toBuffer());
  bytes.fill(0x55, Math.floor(bytes.length / 2), Math.floor(bytes.length / 2) + 400);
  return bytes;
}

const SVG = `<svg xmlns="http://www.w3.org/2000/svg" onload="ruckle()">${SCRIPT_MARK}</svg>`;
const ZIP = Buffer.concat([Buffer.from('PK\x03\x04', 'latin1'), Buffer.alloc(200)]);
const HUGE_ICC = Buffer.concat([Buffer.from('ICC_PROFILE\0\x01\x01', 'latin1'), Buffer.alloc(65_000, 0x41)]);
const HUGE_EXIF = Buffer.concat([
  Buffer.from('Exif\0\0MM\0*\0\0\0\x08\xff\xff', 'latin1'),
  Buffer.alloc(65_000, 0xff),
]);

async function manySegments(marker: number, payload: Buffer): Promise<Buffer> {
  let bytes: Buffer = await jpeg();
  for (let i = 0; i < 60; i += 1) bytes = withSegment(bytes, marker, payload);
  return bytes;
}

/** Forty files that somebody might send instead of a photo, or hidden in one. */
export const HOSTILE_FILES: readonly HostileFile[] = [
  { name: 'nothing at all', make: text(''), ends: 'empty' },
  { name: 'one byte', make: () => Buffer.from([0xff]), ends: 'not-a-photo' },
  { name: 'a megabyte of zeroes', make: () => Buffer.alloc(1_000_000), ends: 'not-a-photo' },
  { name: 'plain words', make: text('not a picture'), ends: 'not-a-photo' },
  { name: 'an SVG with a script', make: text(SVG), ends: 'not-a-photo' },
  { name: 'an SVG behind an XML line', make: text(`<?xml version="1.0"?>${SVG}`), ends: 'not-a-photo' },
  { name: 'a page with a script', make: text(`<!doctype html>${SCRIPT_MARK}`), ends: 'not-a-photo' },
  { name: 'a PDF', make: text('%PDF-1.7\n1 0 obj\n<<>>\nendobj'), ends: 'not-a-photo' },
  { name: 'a zip', make: () => ZIP, ends: 'not-a-photo' },
  { name: 'a program', make: () => Buffer.from('\x7fELF\x02\x01\x01', 'latin1'), ends: 'not-a-photo' },
  { name: 'a shell script', make: text('#!/bin/sh\necho'), ends: 'not-a-photo' },
  { name: 'a moving GIF', make: movingGif, ends: 'not-a-photo' },
  { name: 'a TIFF', make: () => plain().tiff().toBuffer(), ends: 'not-a-photo' },
  {
    name: 'a bitmap header',
    make: () => Buffer.concat([Buffer.from('BM'), Buffer.alloc(120)]),
    ends: 'not-a-photo',
  },
  { name: 'a HEIC', make: () => isoFile('heic'), ends: 'heic' },
  { name: 'an AVIF', make: () => isoFile('avif'), ends: 'heic' },
  { name: 'a film', make: () => isoFile('isom'), ends: 'not-a-photo' },
  { name: 'a moving WebP', make: moving, ends: 'animated' },
  {
    name: 'a JPEG that is only its first three bytes',
    make: () => Buffer.from([0xff, 0xd8, 0xff]),
    ends: 'damaged',
  },
  { name: 'a page behind a JPEG’s first bytes', make: () => Buffer.concat([Buffer.from([0xff, 0xd8, 0xff, 0xe0]), Buffer.from(SCRIPT_MARK)]), ends: 'damaged' }, // prettier-ignore
  {
    name: 'an SVG behind a PNG’s first bytes',
    make: () => Buffer.concat([PNG_SIGNATURE, Buffer.from(SVG)]),
    ends: 'damaged',
  },
  { name: 'a RIFF that calls itself WebP and is sound', make: () => Buffer.from('RIFF\x24\0\0\0WEBPfmt \x10\0\0\0', 'latin1'), ends: 'damaged' }, // prettier-ignore
  { name: 'half a JPEG', make: cut(jpeg, 0.5), ends: 'damaged' },
  { name: 'a JPEG without its last tenth', make: cut(() => phoneJpeg(6), 0.9), ends: 'damaged' },
  { name: 'half a PNG', make: cut(png, 0.5), ends: 'damaged' },
  { name: 'half a WebP', make: cut(webp, 0.5), ends: 'damaged' },
  { name: 'a PNG with its middle overwritten', make: spoiled, ends: 'damaged' },
  {
    name: 'a PNG that claims 50 000 × 50 000',
    make: () => pngOf(50_000, 50_000, pixels(10, 10)),
    ends: 'too-many-pixels',
  },
  { name: 'a PNG that claims more than any number', make: () => pngOf(0x7fff_ffff, 0x7fff_ffff, pixels(10, 10)), ends: ['too-many-pixels', 'damaged'] }, // prettier-ignore
  {
    name: 'a JPEG that claims 65 000 × 65 000',
    make: () => jpegClaiming(65_000, 65_000),
    ends: 'too-many-pixels',
  },
  {
    name: 'a JPEG that claims no height',
    make: () => jpegClaiming(300, 0),
    ends: ['damaged', 'too-many-pixels'],
  },
  {
    name: 'a small PNG of 60 megapixels',
    make: () => pngOf(6000, 10_000, pixels(6000, 10_000)),
    ends: 'too-many-pixels',
  },
  {
    name: 'a PNG that claims 49 megapixels and has a line',
    make: () => pngOf(7000, 7000, pixels(7000, 1)),
    ends: 'damaged',
  },
  {
    name: 'a JPEG with a page behind it',
    make: followedBy(jpeg, Buffer.from(`<html>${SCRIPT_MARK}`)),
    ends: 'taken',
  },
  { name: 'a JPEG with a page in its comment', make: async () => withSegment(await jpeg(), 0xfe, Buffer.from(SCRIPT_MARK)), ends: 'taken' }, // prettier-ignore
  { name: 'a PNG with a script in its text', make: () => pngOf(300, 400, pixels(300, 400), [pngChunk('tEXt', Buffer.from(`Comment\0${SCRIPT_MARK}`, 'latin1'))]), ends: 'taken' }, // prettier-ignore
  { name: 'a JPEG that is a zip as well', make: followedBy(jpeg, ZIP), ends: 'taken' },
  {
    name: 'a JPEG with four megabytes of colour profile',
    make: () => manySegments(0xe2, HUGE_ICC),
    ends: 'taken',
  },
  {
    name: 'a JPEG with four megabytes of broken EXIF',
    make: () => manySegments(0xe1, HUGE_EXIF),
    ends: 'taken',
  },
  { name: 'a JPEG in CMYK', make: () => plain().toColourspace('cmyk').jpeg().toBuffer(), ends: 'taken' },
  {
    name: 'a PNG of 16 bits',
    make: () => plain(300, 400, 4).toColourspace('rgb16').png().toBuffer(),
    ends: 'taken',
  },
  {
    name: 'a JPEG with its place in EXIF and XMP',
    make: async () => withXmp(await phoneJpeg(5)),
    ends: 'taken',
  },
];
