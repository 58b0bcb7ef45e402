import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { Figure } from '@/components/figure/Figure';
import { drawingSpace } from '@/components/figure/drawing-space';
import { figureZones } from '@/diagnosis/figure/figure';
import { figurePoint } from '@/diagnosis/figure/point';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';

const SHOWN = { view: 'front', proportions: REFERENCE_PROPORTIONS, title: 'Front of the figure' } as const;

afterEach(cleanup);

describe('the drawn figure', () => {
  it('is one named picture when nothing can be tapped', () => {
    render(<Figure {...SHOWN} />);
    expect(screen.getByRole('img', { name: 'Front of the figure' })).toBeInTheDocument();
    expect(screen.queryAllByRole('button')).toHaveLength(0);
  });

  it('offers every zone as a button in words, each name once, with the wearer’s side', () => {
    render(<Figure {...SHOWN} onTapZone={() => undefined} />);
    const names = screen.getAllByRole('button').map((button) => button.getAttribute('aria-label'));
    expect(names).toHaveLength(figureZones('front', REFERENCE_PROPORTIONS).length);
    expect(new Set(names).size).toBe(names.length);
    expect(names).toContain('front fork');
    expect(names).toContain('front thigh, your left');
  });

  it('hands a tapped zone on, and says which one is chosen', async () => {
    const onTapZone = vi.fn();
    render(<Figure {...SHOWN} onTapZone={onTapZone} highlighted={[{ zone: 'thigh-front', side: 'left' }]} />);
    const chosen = screen.getByRole('button', { name: 'front thigh, your left' });
    expect(chosen).toHaveAttribute('aria-pressed', 'true');
    expect(screen.getByRole('button', { name: 'front thigh, your right' })).toHaveAttribute(
      'aria-pressed',
      'false',
    );
    await userEvent.click(screen.getByRole('button', { name: 'knee, your right' }));
    expect(onTapZone).toHaveBeenCalledExactlyOnceWith({ zone: 'knee', side: 'right' });
  });

  it('is a single stop for Tab; arrows move over the body and Enter chooses', async () => {
    const onTapZone = vi.fn();
    const user = userEvent.setup();
    render(<Figure {...SHOWN} onTapZone={onTapZone} />);
    await user.tab();
    const first = document.activeElement!.getAttribute('aria-label');
    await user.keyboard('{ArrowDown}');
    const second = document.activeElement!.getAttribute('aria-label');
    expect(second).not.toBe(first);
    await user.keyboard('{Enter}');
    expect(onTapZone).toHaveBeenCalledTimes(1);
    await user.tab();
    expect(document.body).toHaveFocus();
  });

  it('reads out its marks', () => {
    const points = [figurePoint(0.1, 0.9), figurePoint(0.4, 0.7)];
    const label = 'tight line from the fork toward the hip, clear, your left';
    render(<Figure {...SHOWN} marks={[{ id: 'a', kind: 'tight', strength: 'clear', points, label }]} />);
    expect(screen.getByRole('img', { name: label })).toHaveAttribute('data-mark', 'tight');
  });

  it.each(['front', 'back', 'left', 'right', 'seated'] as const)(
    'frames the whole garment of the %s view, and finds a place of the drawing again',
    (view) => {
      const space = drawingSpace(view, REFERENCE_PROPORTIONS);
      for (const { polygon } of figureZones(view, REFERENCE_PROPORTIONS)) {
        for (const point of polygon) {
          const { x, y } = space.place(point);
          expect(x >= 0 && x <= space.width && y >= 0 && y <= space.height).toBe(true);
          const back = space.figureAt({ x, y });
          expect(Math.hypot(back.x - point.x, back.y - point.y)).toBeLessThan(1e-9);
        }
      }
    },
  );
});
