import { v7 } from 'uuid';

const SIDE_PX_MAX = 2400;
const MEGABYTES_MAX = 4;

/**
 * Makes a photo small enough for poor wifi, upright, before it is sent. A file that this browser cannot open goes as it is: the
 * server says in a sentence what it is.
 */
export async function preparePhoto(file: File): Promise<Blob> {
  const { default: compress } = await import('browser-image-compression');
  try {
    return await compress(file, {
      maxSizeMB: MEGABYTES_MAX,
      maxWidthOrHeight: SIDE_PX_MAX,
      initialQuality: 0.92,
      fileType: 'image/jpeg',
      // Its own worker would load code from another host.
      useWebWorker: false,
    });
  } catch {
    return file;
  }
}

export const makeUploadKey = (): string => v7();
