import { act, cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { MarkFates } from '@/components/compare/MarkFates';
import { PhotoPairs } from '@/components/compare/PhotoPairs';
import { withinFrame } from '@/components/compare/useLinkedView';
import type { MarkedPhotoDto } from '@/db/queries/marked-photos';

const TALL = { widthPx: 1000, heightPx: 2000 };
const placedAt = (x: number, y: number, depth: number) => [
  { landmark: 'waist-centre', x, y },
  { landmark: 'fork', x, y: y + depth },
];
const photo = (id: string, over: Partial<MarkedPhotoDto> = {}): MarkedPhotoDto => ({
  id, roundId: 'r', view: 'front', isMirrored: false, revision: 1, ...TALL, marks: [], landmarks: placedAt(0.5, 0.2, 0.1), ...over,
}); // prettier-ignore
const mark = (id: string, severity: number, points: { x: number; y: number }[]) => ({ id, kind: 'tight' as const, severity, side: 'both' as const, points, note: '' }); // prettier-ignore
const LINE = [{ x: 0.52, y: 0.29 }, { x: 0.6, y: 0.27 }]; // prettier-ignore

let isStill = false;
beforeEach(() => {
  isStill = false;
  vi.stubGlobal('matchMedia', () => ({ matches: isStill, addEventListener: () => {}, removeEventListener: () => {} })); // prettier-ignore
});
afterEach(() => {
  cleanup();
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

const pairs = (before = photo('a'), after = photo('b')) =>
  render(<PhotoPairs before={{ number: 1, photos: [before] }} after={{ number: 2, photos: [after] }} />);
const frames = () => screen.getAllByRole('application');
const pictures = () => frames().map((frame) => [...frame.querySelectorAll('image')].map((image) => image.getAttribute('href')!.split('/')[3])); // prettier-ignore

it('brings both photos nearer together, by button and by key, and moves them together', async () => {
  pairs();
  await userEvent.click(screen.getByRole('button', { name: 'Nearer' }));
  const boxes = () => frames().map((frame) => frame.getAttribute('viewBox'));
  expect(boxes()[0]).toBe(boxes()[1]);
  expect(boxes()[0]).not.toBe('0 0 1 2');
  frames()[1]!.focus();
  await userEvent.keyboard('{ArrowRight}');
  expect(boxes()[0]).toBe(boxes()[1]);
  await userEvent.keyboard('0');
  expect(boxes()).toEqual(['0 0 1 2', '0 0 1 2']);
});

it('turns the later photo until its waist and fork lie on those of the earlier', () => {
  pairs(photo('a'), photo('b', { landmarks: placedAt(0.4, 0.3, 0.2) }));
  const later = frames()[1]!.querySelector('image')!.parentElement!.getAttribute('transform')!;
  const [a, b, , , e, f] = later.slice(7, -1).split(' ').map(Number) as [number, number, number, number, number, number]; // prettier-ignore
  // Twice as large, its waist at (0.4, 0.6) of widths: half the size, brought to (0.5, 0.4).
  expect([a, b]).toEqual([expect.closeTo(0.5, 9), expect.closeTo(0, 9)]);
  expect([0.5 * 0.4 + e, 0.5 * 0.6 + f]).toEqual([expect.closeTo(0.5, 9), expect.closeTo(0.4, 9)]);
});

it('says what is missing where the figure was not placed, and lays nothing over', () => {
  pairs(photo('a'), photo('b', { landmarks: [] }));
  expect(screen.getByText(/Place the figure on this view in both rounds/)).toBeInTheDocument();
  expect(screen.queryByRole('radio', { name: 'Blink' })).toBeNull();
});

it('swipes and thins with one slider, which keys move', async () => {
  pairs();
  await userEvent.click(screen.getByRole('radio', { name: 'Swipe' }));
  expect(pictures()).toEqual([['a', 'b']]);
  fireEvent.change(screen.getByRole('slider'), { target: { value: '25' } });
  expect(frames()[0]!.querySelector('line')!.getAttribute('x1')).toBe('0.25');
  await userEvent.click(screen.getByRole('radio', { name: 'Over one another' }));
  expect(frames()[0]!.querySelector('[opacity]')!.getAttribute('opacity')).toBe('0.25');
});

it('blinks at most twice a second, and stops when held', () => {
  vi.useFakeTimers();
  pairs();
  fireEvent.click(screen.getByRole('radio', { name: 'Blink' }));
  expect(pictures()).toEqual([['a']]);
  act(() => void vi.advanceTimersByTime(499));
  expect(pictures()).toEqual([['a']]);
  act(() => void vi.advanceTimersByTime(1));
  expect(pictures()).toEqual([['a', 'b']]);
  fireEvent.click(screen.getByRole('button', { name: 'Hold' }));
  act(() => void vi.advanceTimersByTime(5000));
  expect(pictures()).toEqual([['a', 'b']]);
});

it('never blinks by itself for those who asked for less motion; a button shows the other', () => {
  isStill = true;
  vi.useFakeTimers();
  pairs();
  fireEvent.click(screen.getByRole('radio', { name: 'Blink' }));
  act(() => void vi.advanceTimersByTime(5000));
  expect(pictures()).toEqual([['a']]);
  expect(screen.queryByRole('button', { name: 'Hold' })).toBeNull();
  fireEvent.click(screen.getByRole('button', { name: 'Show the other' }));
  expect(pictures()).toEqual([['a', 'b']]);
});

it('keeps what is in sight within the photo', () => {
  expect(withinFrame({ zoom: 2, x: 0, y: 1 })).toEqual({ zoom: 2, x: 0.25, y: 0.75 });
  expect(withinFrame({ zoom: 0.3, x: 0.1, y: 0.9 })).toEqual({ zoom: 1, x: 0.5, y: 0.5 });
});

it('says what became of the marks on the body, and how many cannot be compared', () => {
  const before = [photo('a', { marks: [mark('m', 3, LINE)] }), photo('c', { view: 'close-up', marks: [mark('n', 2, LINE)] })]; // prettier-ignore
  render(<MarkFates before={before} after={[photo('b', { marks: [mark('o', 1, LINE)] })]} />);
  const eased = screen.getByRole('heading', { name: 'Eased (1)' }).parentElement!;
  expect(within(eased).getByRole('listitem')).toHaveTextContent(/^Front: Tight line .*front fork.*your left/);
  expect(screen.getByText(/One mark lies on photos without the figure/)).toBeInTheDocument();
});
