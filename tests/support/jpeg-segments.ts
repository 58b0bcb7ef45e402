/** Puts a marker segment right behind the start of a JPEG. A segment's length counts its own two bytes (ITU T.81, B.1.1.4). */
export function withSegment(jpeg: Buffer, marker: number, payload: Buffer): Buffer {
  const head = Buffer.from([0xff, marker, 0, 0]);
  head.writeUInt16BE(payload.length + 2, 2);
  return Buffer.concat([jpeg.subarray(0, 2), head, payload, jpeg.subarray(2)]);
}

const COMMENT = 0xfe;
const SEGMENT_BYTES = 60_000;
const SEGMENT_BYTES_MIN = 4;

/** The same picture, made exactly this many bytes long by comments full of nothing. */
export function paddedTo(jpeg: Buffer, bytes: number): Buffer {
  const parts: Buffer[] = [];
  let missing = bytes - jpeg.length;
  while (missing > 0) {
    // What would be left must not be too short to be a segment of its own.
    const segment = missing < SEGMENT_BYTES + SEGMENT_BYTES_MIN ? missing : SEGMENT_BYTES;
    const head = Buffer.from([0xff, COMMENT, 0, 0]);
    head.writeUInt16BE(segment - 2, 2);
    parts.push(head, Buffer.alloc(segment - 4, 0x20));
    missing -= segment;
  }
  return Buffer.concat([jpeg.subarray(0, 2), ...parts, jpeg.subarray(2)]);
}

export const XMP_MARK = 'RUCKLE-XMP-MARK';

export const withXmp = (jpeg: Buffer): Buffer =>
  withSegment(
    jpeg,
    0xe1,
    Buffer.from(
      `http://ns.adobe.com/xap/1.0/\0<x:xmpmeta xmlns:x="adobe:ns:meta/"><a>${XMP_MARK}</a></x:xmpmeta>`,
    ),
  );
