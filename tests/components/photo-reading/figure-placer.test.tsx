import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { FigurePlacer } from '@/components/photo-reading/FigurePlacer';
import type { LandmarkInput } from '@/db/queries/landmarks';

const PHOTO = { id: 'p', view: 'front' as const, isMirrored: false, revision: 1, widthPx: 1500, heightPx: 2000, version: 1 }; // prettier-ignore
const ON_SCREEN = { left: 0, top: 0, right: 300, bottom: 400, width: 300, height: 400, x: 0, y: 0, toJSON: () => '' }; // prettier-ignore

beforeEach(() => {
  vi.spyOn(HTMLElement.prototype, 'getBoundingClientRect').mockReturnValue(ON_SCREEN);
  vi.stubGlobal(
    'ResizeObserver',
    class {
      constructor(private readonly told: () => void) {}
      observe = () => this.told();
      disconnect = () => {};
    },
  );
});
afterEach(() => {
  cleanup();
  vi.restoreAllMocks();
  vi.unstubAllGlobals();
});

function placer(tapped: LandmarkInput[] = [], isKept = true) {
  const onKeep = vi.fn(async (_: LandmarkInput[]) => isKept);
  const onClose = vi.fn();
  render(<FigurePlacer photo={PHOTO} tapped={tapped} message="" onKeep={onKeep} onClose={onClose} />);
  const picture = screen.getByRole('img');
  return { onKeep, onClose, tap: (clientX: number, clientY: number) => fireEvent.click(picture, { clientX, clientY }) }; // prettier-ignore
}
const keep = () => screen.getByRole('button', { name: 'Keep it there' });

it('asks for two points one after the other, and keeps them where they were tapped', async () => {
  const { onKeep, onClose, tap } = placer();
  expect(screen.getByRole('status')).toHaveTextContent('Tap the middle of the waist');
  expect(keep()).toBeDisabled();
  tap(150, 80);
  expect(screen.getByRole('status')).toHaveTextContent('Tap the fork');
  tap(153, 160);
  await userEvent.click(keep());
  expect(onKeep).toHaveBeenCalledWith([
    { landmark: 'waist-centre', x: 0.5, y: 0.2 },
    { landmark: 'fork', x: 0.51, y: 0.4 },
  ]);
  expect(onClose).toHaveBeenCalledOnce();
});

it('is all done by keys: start in the middle, then the arrows, with Shift ten times as far', async () => {
  const { onKeep } = placer();
  await userEvent.click(screen.getByRole('button', { name: 'Start in the middle' }));
  screen.getByRole('button', { name: 'fork' }).focus();
  await userEvent.keyboard('{ArrowRight}{Shift>}{ArrowDown}{/Shift}');
  await userEvent.click(keep());
  const fork = onKeep.mock.calls[0]![0].find(({ landmark }) => landmark === 'fork')!;
  expect(fork.x).toBeCloseTo(0.5 + 1 / 300, 5);
  expect(fork.y).toBeCloseTo(0.45 + 10 / 400, 5);
});

it('moves a point without dragging: choose it, then tap where it belongs', async () => {
  const { onKeep, tap } = placer([
    { landmark: 'waist-centre', x: 0.5, y: 0.2 },
    { landmark: 'fork', x: 0.5, y: 0.4 },
  ]);
  await userEvent.click(screen.getByRole('button', { name: 'hip, your left, not set by hand' }));
  tap(210, 140);
  await userEvent.click(keep());
  expect(onKeep.mock.calls[0]![0]).toContainEqual({ landmark: 'hip-left', x: 0.7, y: 0.35 });
});

it('stays open when it could not be kept, and can be left as it was', async () => {
  const { onClose } = placer([{ landmark: 'waist-centre', x: 0.5, y: 0.2 }, { landmark: 'fork', x: 0.5, y: 0.4 }], false); // prettier-ignore
  await userEvent.click(keep());
  expect(onClose).not.toHaveBeenCalled();
  await userEvent.click(screen.getByRole('button', { name: 'Leave it as it was' }));
  expect(onClose).toHaveBeenCalledOnce();
});
