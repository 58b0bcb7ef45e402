import { v7 } from 'uuid';

const SIDE_PX_MAX = 2400;
const MEGABYTES_MAX = 4;

/** A file that waited on the device comes back as a bare Blob in some browsers; the compressor wants a File. */
const asFile = (file: Blob) => (file instanceof File ? file : new File([file], 'photo', { type: file.type }));

const loadCompressor = () => import('browser-image-compression');

/** Fetches what prepares photos while there is a connection, so that a round can be photographed without one. */
export const readyToPrepare = (): Promise<boolean> =>
  loadCompressor().then(
    () => true,
    () => false,
  );

/**
 * Makes a photo small enough for poor wifi, upright, before it is sent. A file that this browser cannot open goes as it is: the
 * server says in a sentence what it is.
 */
export async function preparePhoto(file: Blob): Promise<Blob> {
  try {
    const { default: compress } = await loadCompressor();
    return await compress(asFile(file), {
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
