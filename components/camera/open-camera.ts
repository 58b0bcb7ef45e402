export type Opened = { ok: true; stream: MediaStream } | { ok: false; sentence: string };

const USE_GALLERY = 'Add a photo from the gallery, or with the phone’s own camera, instead.';
const SENTENCES: Record<string, string> = {
  NotAllowedError: `This page may not use the camera. ${USE_GALLERY} You can allow it in the browser’s settings for this page.`,
  NotFoundError: `No camera was found. ${USE_GALLERY}`,
  NotReadableError: `Another program holds the camera. Close it and try again, or add a photo from the gallery.`,
};
const INSECURE = `The camera works only where the address begins with https. ${USE_GALLERY}`;
const FAILED = `The camera could not be opened. ${USE_GALLERY}`;

export type Facing = 'environment' | 'user';

/** Opens the camera at the best it has. A refusal is a sentence that leads on to the gallery; only pictures, never sound. */
export async function openCamera(facing: Facing): Promise<Opened> {
  // On plain http away from the own machine browsers leave this out altogether.
  if (!window.isSecureContext || !navigator.mediaDevices?.getUserMedia)
    return { ok: false, sentence: INSECURE };
  try {
    const stream = await navigator.mediaDevices.getUserMedia({
      audio: false,
      video: { facingMode: facing, width: { ideal: 2400 }, height: { ideal: 2400 } },
    });
    return { ok: true, stream };
  } catch (error) {
    const name = error instanceof DOMException ? error.name : '';
    return { ok: false, sentence: SENTENCES[name] ?? FAILED };
  }
}

export const closeCamera = (stream: MediaStream) => stream.getTracks().forEach((track) => track.stop());
