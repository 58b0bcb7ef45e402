import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';

const TRACES = ['Exif\0', 'RUCKLE-EXIF-MARK', 'Test camera', 'GPSLatitude', 'http://ns.adobe.com/xap'];

/** Traces of a camera, a place or an author in some bytes. */
export const tracesIn = (bytes: Buffer): string[] =>
  TRACES.filter((trace) => bytes.includes(Buffer.from(trace, 'latin1')));

/** Every file below a folder with its bytes. */
export async function filesBelow(folder: string): Promise<{ path: string; bytes: Buffer }[]> {
  const entries = await readdir(folder, { withFileTypes: true });
  const lists = await Promise.all(
    entries.map(async (entry) => {
      const path = join(folder, entry.name);
      return entry.isDirectory() ? filesBelow(path) : [{ path, bytes: await readFile(path) }];
    }),
  );
  return lists.flat();
}
