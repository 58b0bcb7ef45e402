import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { UploadEnd } from '@/components/photos/send-upload';
import { type UploadLine, UploadSender } from '@/components/photos/upload-sender';
import { countUploads, listUploads, type WaitingUpload } from '@/components/photos/upload-store';
import { PHOTO_BYTES_MAX } from '@/lib/photos/faults';
import type { PhotoDto } from '@/db/queries/photos';

type Send = (
  upload: WaitingUpload,
  onProgress: (part: number) => void,
  signal: AbortSignal,
) => Promise<UploadEnd>;
const server = vi.hoisted(() => ({ send: vi.fn<Send>() }));
vi.mock('@/components/photos/send-upload', () => ({ sendUpload: server.send }));
vi.mock('@/components/photos/prepare-photo', async () => {
  const { v7 } = await import('uuid');
  return { makeUploadKey: () => v7(), preparePhoto: async (file: Blob) => file };
});

const AGAIN: UploadEnd = { kind: 'again', afterMs: 0, isForAll: false, message: 'Busy.' };
const OFFLINE: UploadEnd = { kind: 'again', afterMs: 0, isForAll: true, message: 'No connection.' };
const photoOf = ({ key }: WaitingUpload) => ({ id: key }) as PhotoDto;
const added = async (upload: WaitingUpload): Promise<UploadEnd> => ({
  kind: 'added',
  photo: photoOf(upload),
});
/** Ends only when it is cut off, as a sending over a dead line does. */
const hanging: Send = (_upload, _onProgress, signal) =>
  new Promise((resolve) => signal.addEventListener('abort', () => resolve({ kind: 'cancelled' })));

let roundId = '';
let rounds = 0;
let senders: UploadSender[] = [];
function open() {
  const seen = { lines: [] as UploadLine[], added: [] as string[] };
  const sender = new UploadSender({
    userId: 'u',
    roundId,
    onLines: (lines) => (seen.lines = lines),
    onAdded: ({ id }) => seen.added.push(id),
  });
  senders.push(sender);
  return { sender, seen };
}
const file = (name: string, bytes = 10) => new File([new Uint8Array(bytes)], name, { type: 'image/jpeg' });
const sentNames = () => server.send.mock.calls.map(([{ name }]) => name);

beforeEach(() => {
  vi.useFakeTimers();
  server.send.mockReset().mockImplementation(added);
  rounds += 1;
  roundId = `r${rounds}`;
});
afterEach(() => {
  for (const sender of senders) sender.close();
  senders = [];
  vi.useRealTimers();
});

describe('photos on their way', () => {
  it('go out in the order in which they were chosen, each once, and then wait no longer', async () => {
    const { sender, seen } = open();
    await sender.add([file('a'), file('b'), file('c')], 'front', true);
    await vi.advanceTimersByTimeAsync(0);
    expect(sentNames()).toEqual(['a', 'b', 'c']);
    expect(server.send.mock.calls[0]?.[0]).toMatchObject({ view: 'front', isMirrored: true });
    expect(seen.added).toHaveLength(3);
    expect(seen.lines).toEqual([]);
    expect(await listUploads('u', roundId)).toEqual([]);
  });

  it('are tried again under the same key, ever more rarely, until the server has them', async () => {
    server.send.mockResolvedValueOnce(OFFLINE).mockResolvedValueOnce(OFFLINE).mockResolvedValueOnce(OFFLINE);
    const { sender, seen } = open();
    await sender.add([file('a')], 'back', false);
    await vi.advanceTimersByTimeAsync(0);
    expect(seen.lines).toMatchObject([{ name: 'a', state: 'waiting', message: 'No connection.' }]);
    for (const [waitMs, sendings] of [
      [1900, 1],
      [200, 2],
      [3800, 2],
      [200, 3],
      [7800, 3],
      [200, 4],
    ] as const) {
      await vi.advanceTimersByTimeAsync(waitMs);
      expect(server.send).toHaveBeenCalledTimes(sendings);
    }
    expect(new Set(server.send.mock.calls.map(([{ key }]) => key)).size).toBe(1);
    expect(seen.added).toHaveLength(1);
  });

  it('go out at once when the network is back', async () => {
    server.send.mockResolvedValueOnce(OFFLINE);
    const { sender, seen } = open();
    await sender.add([file('a')], 'back', false);
    await vi.advanceTimersByTimeAsync(0);
    window.dispatchEvent(new Event('online'));
    await vi.advanceTimersByTimeAsync(0);
    expect(seen.added).toHaveLength(1);
  });

  it('that are refused say why and hold up nobody', async () => {
    server.send.mockResolvedValueOnce({ kind: 'refused', message: 'Not a photo.' });
    const { sender, seen } = open();
    await sender.add([file('bad'), file('good')], 'front', false);
    await vi.advanceTimersByTimeAsync(0);
    expect(seen.lines).toMatchObject([{ name: 'bad', state: 'refused', message: 'Not a photo.' }]);
    expect(seen.added).toHaveLength(1);
    expect(await listUploads('u', roundId)).toEqual([]);
  });

  it('over 25 MB are refused before they are sent', async () => {
    const { sender, seen } = open();
    await sender.add([file('huge', PHOTO_BYTES_MAX + 1)], 'front', false);
    await vi.advanceTimersByTimeAsync(0);
    expect(server.send).not.toHaveBeenCalled();
    expect(seen.lines).toMatchObject([{ state: 'refused', message: expect.stringMatching(/25 MB/) }]);
  });

  it('that fail on the server every time do not keep back the ones behind them', async () => {
    server.send.mockImplementation((upload) =>
      upload.name === 'odd' ? Promise.resolve(AGAIN) : added(upload),
    );
    const { sender, seen } = open();
    await sender.add([file('odd'), file('good')], 'front', false);
    await vi.advanceTimersByTimeAsync(0);
    expect(seen.added).toHaveLength(1);
    expect(seen.lines).toMatchObject([{ name: 'odd', state: 'waiting' }]);
  });

  it('stay on the device when their page is left while they are sent, and go out when it is opened again', async () => {
    server.send.mockImplementationOnce(hanging);
    const first = open();
    await first.sender.add([file('a'), file('b')], 'front', false);
    await vi.advanceTimersByTimeAsync(0);
    first.sender.close();
    await vi.advanceTimersByTimeAsync(0);
    expect((await listUploads('u', roundId)).map(({ name }) => name)).toEqual(['a', 'b']);
    const second = open();
    second.sender.resume();
    await vi.advanceTimersByTimeAsync(0);
    expect(second.seen.added).toHaveLength(2);
    expect(first.seen.added).toEqual([]);
    expect(await countUploads('u')).toBe(0);
  });

  it('that are taken back are cut off and gone, the others go on', async () => {
    server.send.mockImplementationOnce(hanging);
    const { sender, seen } = open();
    await sender.add([file('a'), file('b')], 'front', false);
    await vi.advanceTimersByTimeAsync(0);
    const [line] = seen.lines;
    expect(line?.state).toBe('sending');
    await sender.cancel(line?.key ?? '');
    await vi.advanceTimersByTimeAsync(0);
    expect(sentNames()).toEqual(['a', 'b']);
    expect(seen.added).toHaveLength(1);
    expect(await listUploads('u', roundId)).toEqual([]);
  });

  it('added while others are sent go out after them without being asked', async () => {
    let release = () => {};
    server.send.mockImplementationOnce(
      (upload) =>
        new Promise((resolve) => (release = () => resolve({ kind: 'added', photo: photoOf(upload) }))),
    );
    const { sender, seen } = open();
    await sender.add([file('a')], 'front', false);
    await vi.advanceTimersByTimeAsync(0);
    await sender.add([file('b')], 'back', false);
    release();
    await vi.advanceTimersByTimeAsync(0);
    expect(sentNames()).toEqual(['a', 'b']);
    expect(seen.added).toHaveLength(2);
  });
});
