import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { PieceChangeView } from '@/components/pattern/PieceChangeView';
import type { Side } from '@/diagnosis/case-schema';

const view = (correction: string, amountMm: number, side: Side = 'both', unit: 'cm' | 'in' = 'cm') => (
  <PieceChangeView
    correction={correction}
    name="This change"
    amountMm={amountMm}
    side={side}
    body={{ hipMm: 1000, waistMm: 780 }}
    unit={unit}
  />
);
const pictures = () => screen.getAllByRole('img');
const heavyLine = () => pictures()[0]!.querySelector('path[stroke="var(--chalk)"]')!.getAttribute('d');

afterEach(cleanup);

describe('a change on the piece', () => {
  it('is drawn on each piece that it concerns, named and to scale', () => {
    render(view('let-out-hip-side', 10));
    expect(pictures().map((picture) => picture.getAttribute('aria-label'))).toEqual([
      'This change: the front before and after, 10 mm',
      'This change: the back before and after, 10 mm',
    ]);
    expect(within(pictures()[0]!).getByText('50 mm')).toBeInTheDocument();
  });

  it('redraws as the amount changes, picture and words together', () => {
    const { rerender } = render(view('wedge-into-back', 6));
    const before = heavyLine();
    expect(screen.getByText(/Spread by 6 mm at the centre/)).toBeInTheDocument();
    rerender(view('wedge-into-back', 12));
    expect(heavyLine()).not.toBe(before);
    expect(screen.getByText(/Spread by 12 mm at the centre/)).toBeInTheDocument();
    expect(screen.getByText('centre +12 mm')).toBeInTheDocument();
  });

  it('shows hinge and slash, and says which seam kept its length', () => {
    render(view('wedge-into-back', 12));
    expect(pictures()[0]!.querySelectorAll('circle')).toHaveLength(1);
    expect(screen.getByText(/the side on its stitching line: .*, as before/)).toBeInTheDocument();
    expect(screen.getByText(/the centre: .* before, .* after \(\+12 mm\)/)).toBeInTheDocument();
  });

  it('speaks the reader’s unit: no millimetres for inches', () => {
    const { container } = render(view('extend-back-point', 9.525, 'both', 'in'));
    expect(container.textContent).toContain('3/8 in');
    expect(container.textContent).not.toMatch(/\d mm/);
  });

  it('walks the seams: a drafted difference is eased, one that the change made is named', () => {
    render(view('let-out-waist-front', 12));
    expect(screen.getByText(/inseam, fork to knee: drafted 6 mm apart, to be eased/)).toBeInTheDocument();
    expect(screen.getByText(/waist and band: make each half of the band 12 mm longer/)).toBeInTheDocument();
  });

  it('says that a block stands in, and on which leg a sided change is done', () => {
    render(view('swing-leg-in', 10, 'left'));
    expect(screen.getByText(/A block drafted to these measures stands in/)).toBeInTheDocument();
    expect(screen.getByText('Only the pieces of your left leg; mark them so.')).toBeInTheDocument();
  });

  it('says so when the block is too small for an amount, and draws nothing for a change that is no drawing', () => {
    const { container, rerender } = render(view('shorten-back-dart', 400));
    expect(screen.getByText(/Draw it on your own piece/)).toBeInTheDocument();
    rerender(view('no-such-change', 10));
    expect(container).toBeEmptyDOMElement();
  });
});
