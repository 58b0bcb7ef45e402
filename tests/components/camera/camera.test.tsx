import { act, cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { CameraPanel } from '@/components/camera/CameraPanel';
import { bestShot, type Shot } from '@/components/camera/take-frame';
import type * as TakeFrame from '@/components/camera/take-frame';
import type { PhotoQuality } from '@/diagnosis/photo/photo-quality';

const taking = vi.hoisted(() => ({ next: vi.fn<() => Promise<Shot | null>>() }));
vi.mock('@/components/camera/take-frame', async (original) => ({
  ...(await original<typeof TakeFrame>()),
  takeFrame: taking.next,
}));

const shot = (name: string, verdict: PhotoQuality['verdict'], sharpness: number): Shot => ({
  file: new File([name], name), url: `blob:${name}`, quality: { brightness: 0.5, sharpness, verdict },
}); // prettier-ignore
const stop = vi.fn();
const getUserMedia = vi.fn();

beforeEach(() => {
  stop.mockReset();
  taking.next.mockReset();
  getUserMedia.mockReset().mockResolvedValue({ getTracks: () => [{ stop }] });
  vi.stubGlobal('isSecureContext', true);
  Object.assign(navigator, { mediaDevices: { getUserMedia } });
  URL.revokeObjectURL = vi.fn();
});
afterEach(() => {
  cleanup();
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

function panel() {
  const [onTake, onClose] = [vi.fn(), vi.fn()];
  const shown = render(<CameraPanel ghost={{ id: 'g', revision: 1 }} onTake={onTake} onClose={onClose} />);
  return { onTake, onClose, ...shown };
}

it.each([
  ['the page may not', new DOMException('', 'NotAllowedError'), /may not use the camera.*gallery/],
  ['there is none', new DOMException('', 'NotFoundError'), /No camera was found.*gallery/],
  ['something else failed', new Error('odd'), /could not be opened.*gallery/],
])('leads to the gallery with a sentence when %s', async (_, error, sentence) => {
  getUserMedia.mockRejectedValue(error);
  const { onClose } = panel();
  expect(await screen.findByRole('alert')).toHaveTextContent(sentence);
  fireEvent.click(screen.getByRole('button', { name: 'Close the camera' }));
  expect(onClose).toHaveBeenCalledOnce();
});

it('says that a plain address has no camera, and asks for none', async () => {
  vi.stubGlobal('isSecureContext', false);
  panel();
  expect(await screen.findByRole('alert')).toHaveTextContent(/begins with https.*gallery/);
  expect(getUserMedia).not.toHaveBeenCalled();
});

it('asks for pictures without sound, and lets the camera go when it is closed', async () => {
  const { unmount } = panel();
  await waitFor(() => expect(getUserMedia).toHaveBeenCalledOnce());
  expect(getUserMedia.mock.calls[0]![0]).toMatchObject({
    audio: false,
    video: { facingMode: 'environment' },
  });
  await act(async () => {});
  unmount();
  expect(stop).toHaveBeenCalledOnce();
});

it('counts down, takes three, and gives on the one that is chosen', async () => {
  vi.useFakeTimers();
  taking.next
    .mockResolvedValueOnce(shot('one', 'blurred', 0.001))
    .mockResolvedValueOnce(shot('two', 'good', 0.03))
    .mockResolvedValueOnce(shot('three', 'good', 0.02));
  const { onTake } = panel();
  fireEvent.click(screen.getByRole('radio', { name: '5 seconds' }));
  fireEvent.click(screen.getByRole('button', { name: 'Take three' }));
  await act(() => vi.advanceTimersByTimeAsync(4000));
  expect(screen.getByText('1')).toBeInTheDocument();
  expect(taking.next).not.toHaveBeenCalled();
  await act(() => vi.advanceTimersByTimeAsync(3500));
  expect(taking.next).toHaveBeenCalledTimes(3);
  expect(screen.getByText(/^Not sharp/)).toBeInTheDocument();
  fireEvent.click(screen.getByRole('button', { name: 'Use number 2' }));
  expect(onTake.mock.calls[0]![0]).toMatchObject({ name: 'two' });
});

it('takes nothing once it was stopped', async () => {
  vi.useFakeTimers();
  panel();
  fireEvent.click(screen.getByRole('button', { name: 'Take three' }));
  await act(() => vi.advanceTimersByTimeAsync(2000));
  fireEvent.click(screen.getByRole('button', { name: 'Stop' }));
  await act(() => vi.advanceTimersByTimeAsync(20_000));
  expect(taking.next).not.toHaveBeenCalled();
});

it('shows where one stood before, until told not to', () => {
  const { container } = panel();
  const ghost = () => container.querySelector('img[src*="/api/photos/g/"]');
  expect(ghost()).not.toBeNull();
  fireEvent.click(screen.getByRole('checkbox', { name: /where you stood/ }));
  expect(ghost()).toBeNull();
});

it('takes a readable photo for the best before a sharper one that is too dark', () => {
  const [dark, good] = [shot('dark', 'dark', 0.5), shot('good', 'good', 0.02)];
  expect(bestShot([dark, good, shot('better', 'good', 0.03)])?.file.name).toBe('better');
  expect(bestShot([dark, good])).toBe(good);
  expect(bestShot([])).toBeNull();
});
