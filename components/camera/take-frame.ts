import { judgePhoto, type PhotoQuality } from '@/diagnosis/photo/photo-quality';

export interface Shot {
  file: File;
  /** An object address to show it by; whoever holds the shot gives it back. */
  url: string;
  quality: PhotoQuality;
}

const JUDGED_PX = 320;

function drawn(video: HTMLVideoElement, width: number): CanvasRenderingContext2D | null {
  const canvas = document.createElement('canvas');
  canvas.width = width;
  canvas.height = Math.max(3, Math.round((width * video.videoHeight) / Math.max(1, video.videoWidth)));
  const context = canvas.getContext('2d', { willReadFrequently: width <= JUDGED_PX });
  context?.drawImage(video, 0, 0, canvas.width, canvas.height);
  return context;
}

function qualityOf(video: HTMLVideoElement): PhotoQuality | null {
  const context = drawn(video, JUDGED_PX);
  if (!context) return null;
  const { width, height } = context.canvas;
  const { data } = context.getImageData(0, 0, width, height);
  const grey = Float32Array.from({ length: width * height }, (_, i) => 0.299 * data[4 * i]! + 0.587 * data[4 * i + 1]! + 0.114 * data[4 * i + 2]!); // prettier-ignore
  return judgePhoto({ width, height, grey });
}

/** What the camera sees now, as a JPEG that was never in a gallery; null while it sees nothing yet. */
export async function takeFrame(video: HTMLVideoElement): Promise<Shot | null> {
  const quality = video.videoWidth > 0 ? qualityOf(video) : null;
  const context = quality && drawn(video, video.videoWidth);
  if (!quality || !context) return null;
  const blob = await new Promise<Blob | null>((done) => context.canvas.toBlob(done, 'image/jpeg', 0.92));
  if (!blob) return null;
  const file = new File([blob], 'photo.jpg', { type: 'image/jpeg' });
  return { file, url: URL.createObjectURL(file), quality };
}

/** The best of a burst: one that can be read before one that cannot, then the sharper. */
export function bestShot(shots: readonly Shot[]): Shot | null {
  const rank = ({ quality }: Shot) => (quality.verdict === 'good' ? 1000 : 0) + quality.sharpness;
  return shots.reduce<Shot | null>(
    (best, shot) => (best === null || rank(shot) > rank(best) ? shot : best),
    null,
  );
}
