import type { PhotoDto } from '@/db/queries/photos';
import type { View } from '@/diagnosis/garments/schema';
import { PHOTO_BYTES_MAX, PHOTO_FAULTS } from '@/lib/photos/faults';
import { makeUploadKey, preparePhoto } from './prepare-photo';
import { sendUpload, type UploadEnd } from './send-upload';
import { dropUpload, keepUpload, listUploads, type WaitingUpload } from './upload-store';

export interface UploadLine {
  key: string;
  name: string;
  state: 'preparing' | 'waiting' | 'sending' | 'refused';
  /** How much is sent, 0 to 1. */
  part: number;
  message: string;
}

interface Options {
  userId: string;
  roundId: string;
  onLines: (lines: UploadLine[]) => void;
  onAdded: (photo: PhotoDto) => void;
}

const WAIT_MS_FIRST = 2000;
const WAIT_MS_MAX = 60_000;

const lineOf = ({ key, name }: WaitingUpload): UploadLine => ({
  key,
  name,
  state: 'waiting',
  part: 0,
  message: '',
});

/** One tab sends at a time; where the browser has no locks, the upload key still makes one photo of two sendings. */
async function alone(name: string, signal: AbortSignal, work: () => Promise<void>): Promise<void> {
  if (!navigator.locks) return work();
  try {
    await navigator.locks.request(name, { signal }, work);
  } catch (thrown) {
    if (!signal.aborted) throw thrown;
  }
}

/**
 * Sends the photos of one round that wait on this device, one after another, until the server has each or has refused it. A photo
 * leaves the device in those two cases and when the person takes it back; never because a page was closed.
 */
export class UploadSender {
  #lines: UploadLine[] = [];
  #sending: { key: string; abort: AbortController } | null = null;
  #timer: ReturnType<typeof setTimeout> | undefined;
  #isWanted = false;
  #isRunning = false;
  #failuresInARow = 0;
  readonly #leaving = new AbortController();
  readonly #isOnline = () => this.resume();

  constructor(private readonly options: Options) {
    window.addEventListener('online', this.#isOnline);
  }

  /** Takes up what waits, now. */
  resume(): void {
    clearTimeout(this.#timer);
    this.#isWanted = true;
    if (!this.#isRunning) void this.#run();
  }

  async add(files: File[], view: View, isMirrored: boolean): Promise<void> {
    const { userId, roundId } = this.options;
    const added = files.map((file) => ({
      key: makeUploadKey(),
      roundId,
      name: file.name,
      view,
      isMirrored,
      file,
      isPrepared: false,
    }));
    this.#show([...this.#lines, ...added.map(lineOf)]);
    for (const upload of added) await keepUpload(userId, upload);
    this.resume();
  }

  /** The person takes a photo back, or puts the line of a refused one away. */
  async cancel(key: string): Promise<void> {
    await dropUpload(this.options.userId, key);
    if (this.#sending?.key === key) this.#sending.abort.abort();
    this.#show(this.#lines.filter((line) => line.key !== key));
  }

  /** The page goes away; what waits stays on the device. */
  close(): void {
    window.removeEventListener('online', this.#isOnline);
    clearTimeout(this.#timer);
    this.#leaving.abort();
    this.#sending?.abort.abort();
  }

  #show(lines: UploadLine[]): void {
    this.#lines = lines;
    if (!this.#leaving.signal.aborted) this.options.onLines(lines);
  }

  #edit(key: string, change: Partial<UploadLine>): void {
    this.#show(this.#lines.map((line) => (line.key === key ? { ...line, ...change } : line)));
  }

  async #run(): Promise<void> {
    this.#isRunning = true;
    const { userId, roundId } = this.options;
    const { signal } = this.#leaving;
    try {
      while (this.#isWanted && !signal.aborted) {
        this.#isWanted = false;
        await alone(`ruckle-uploads-${userId}-${roundId}`, signal, () => this.#sendAll());
      }
    } finally {
      this.#isRunning = false;
    }
  }

  /** The device's list is read anew under the lock: another tab may have sent some of it. */
  async #sendAll(): Promise<void> {
    const waiting = await listUploads(this.options.userId, this.options.roundId);
    const had = new Map(this.#lines.map((line) => [line.key, line]));
    this.#show([
      ...this.#lines.filter(({ state }) => state === 'refused'),
      ...waiting.map((upload) => had.get(upload.key) ?? lineOf(upload)),
    ]);
    let waitMs: number | null = null;
    for (const upload of waiting) {
      if (this.#leaving.signal.aborted) return;
      const retry = await this.#sendOne(upload);
      if (!retry) continue;
      waitMs = Math.max(waitMs ?? 0, retry.afterMs);
      if (retry.isForAll) break;
    }
    this.#failuresInARow = waitMs === null ? 0 : this.#failuresInARow + 1;
    if (waitMs === null || this.#leaving.signal.aborted) return;
    const backoffMs = Math.min(WAIT_MS_MAX, WAIT_MS_FIRST * 2 ** (this.#failuresInARow - 1));
    this.#timer = setTimeout(() => this.resume(), Math.max(waitMs, backoffMs));
  }

  async #prepare(upload: WaitingUpload): Promise<WaitingUpload> {
    if (upload.isPrepared) return upload;
    this.#edit(upload.key, { state: 'preparing', message: '' });
    const prepared = { ...upload, file: await preparePhoto(upload.file), isPrepared: true };
    if (this.#isListed(upload.key)) await keepUpload(this.options.userId, prepared);
    return prepared;
  }

  #isListed(key: string): boolean {
    return this.#lines.some((line) => line.key === key);
  }

  /** Null when this photo is settled: with the server, refused, or taken back. */
  async #sendOne(upload: WaitingUpload): Promise<{ afterMs: number; isForAll: boolean } | null> {
    const { key } = upload;
    const { userId, onAdded } = this.options;
    if (!this.#isListed(key)) return null;
    const prepared = await this.#prepare(upload);
    if (this.#leaving.signal.aborted || !this.#isListed(key)) return null;
    const abort = new AbortController();
    this.#sending = { key, abort };
    this.#edit(key, { state: 'sending', part: 0, message: '' });
    const end: UploadEnd =
      prepared.file.size > PHOTO_BYTES_MAX
        ? { kind: 'refused', message: PHOTO_FAULTS['too-large'].message }
        : await sendUpload(prepared, (part) => this.#edit(key, { part }), abort.signal);
    this.#sending = null;
    if (end.kind === 'cancelled') return null;
    if (end.kind === 'again') {
      this.#edit(key, { state: 'waiting', part: 0, message: end.message });
      return end;
    }
    await dropUpload(userId, key);
    if (end.kind === 'refused') this.#edit(key, { state: 'refused', message: end.message });
    else {
      this.#show(this.#lines.filter((line) => line.key !== key));
      if (!this.#leaving.signal.aborted) onAdded(end.photo);
    }
    return null;
  }
}
