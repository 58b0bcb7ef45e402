import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { figureToPhoto, photoToFigure, placeFigure, type PhotoFrame } from '@/diagnosis/figure/align';
import { landmarks } from '@/diagnosis/figure/figure';
import { figurePoint, photoPoint } from '@/diagnosis/figure/point';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';
import { applySimilarity, fitSimilarity, invertSimilarity } from '@/diagnosis/figure/similarity';

type Place = [x: number, y: number];
const pairsOf = (from: Place[], to: Place[]) =>
  from.map(([x, y], i) => ({ from: { x, y }, to: { x: to[i]![0], y: to[i]![1] } }));

describe('the least-squares similarity', () => {
  // S. Umeyama, "Least-squares estimation of transformation parameters between two point patterns", 1991: the example
  // whose best unguarded fit is a reflection (standards:P01).
  it('turns Umeyama’s three points without reflecting them', () => {
    const fit = fitSimilarity(pairsOf([[0, 0], [1, 0], [0, 2]], [[0, 0], [-1, 0], [0, 2]]))!; // prettier-ignore
    expect(fit.scale).toBeCloseTo(0.72111, 5);
    expect(fit.map.a / fit.scale).toBeCloseTo(0.83205, 5);
    expect(-fit.map.b / fit.scale).toBeCloseTo(0.5547, 5);
    expect(fit.map.tx).toBeCloseTo(-0.8, 10);
    expect(fit.map.ty).toBeCloseTo(0.4, 10);
    expect(fit.rms ** 2).toBeCloseTo(0.533333, 6);
  });

  // Constructed; the noisy fit was computed by two independent libraries that agree (standards:P02).
  const SQUARE: Place[] = [[0, 0], [100, 0], [100, 200], [0, 200]]; // prettier-ignore
  const TURNED: Place[] = [[30, -15], [152.26845, 10.988961], [100.290527, 255.525862], [-21.977923, 229.5369]]; // prettier-ignore

  it('recovers scale 1.25, 12 degrees and the shift (30, −15)', () => {
    const fit = fitSimilarity(pairsOf(SQUARE, TURNED))!;
    expect(fit.scale).toBeCloseTo(1.25, 6);
    expect(fit.turnDeg).toBeCloseTo(12, 5);
    expect(fit.map.tx).toBeCloseTo(30, 5);
    expect(fit.map.ty).toBeCloseTo(-15, 5);
    expect(fit.rms).toBeLessThan(1e-5);
  });

  it('fits the same four points with noise in the least-squares sense', () => {
    const noise: Place[] = [[1, 0], [0, -1], [-1, 1], [0, 0]]; // prettier-ignore
    const fit = fitSimilarity(
      pairsOf(SQUARE, TURNED.map(([x, y], i): Place => [x + noise[i]![0], y + noise[i]![1]])),
    )!; // prettier-ignore
    expect(fit.scale).toBeCloseTo(1.252793, 6);
    expect(fit.turnDeg).toBeCloseTo(12.159923, 5);
    expect(fit.map.tx).toBeCloseTo(30.3, 5);
    expect(fit.map.ty).toBeCloseTo(-15.4, 5);
    expect(fit.rms).toBeCloseTo(0.866025, 5);
  });

  // The documentation example of a well-known Procrustes routine, where a reflection makes the disparity 0 (standards:P05).
  it('does not reach zero where only a reflection would', () => {
    const fit = fitSimilarity(
      pairsOf([[1, 3], [1, 2], [1, 1], [2, 1]], [[4, -2], [4, -4], [4, -6], [2, -6]]),
    )!; // prettier-ignore
    expect(fit.rms).toBeGreaterThan(0.1);
  });

  it('refuses one point, and points that coincide', () => {
    expect(fitSimilarity(pairsOf([[1, 2]], [[3, 4]]))).toBeNull();
    expect(fitSimilarity(pairsOf([[5, 5], [5, 5]], [[0, 0], [1, 1]]))).toBeNull(); // prettier-ignore
    expect(fitSimilarity(pairsOf([[0, 0], [1, 1]], [[5, 5], [5, 5]]))).toBeNull(); // prettier-ignore
  });

  it('is undone by its inverse', () => {
    const amount = fc.double({ min: -50, max: 50, noNaN: true });
    fc.assert(
      fc.property(amount, amount, amount, amount, amount, amount, (a, b, tx, ty, x, y) => {
        fc.pre(Math.hypot(a, b) > 0.01);
        const back = applySimilarity(
          invertSimilarity({ a, b, tx, ty }),
          applySimilarity({ a, b, tx, ty }, { x, y }),
        );
        expect(back.x).toBeCloseTo(x, 6);
        expect(back.y).toBeCloseTo(y, 6);
      }),
    );
  });
});

const frame = (over: Partial<PhotoFrame>): PhotoFrame => ({
  view: 'front', widthPx: 1200, heightPx: 1600, mirrored: false, ...over,
}); // prettier-ignore

describe('a figure placed on a photo', () => {
  const at = (id: string) => landmarks('front', REFERENCE_PROPORTIONS).find((one) => one.id === id)!.at;
  const waist = at('waist-centre');
  const fork = at('fork');

  it('carries every point there and back, from any view, turned, mirrored or not', () => {
    const share = fc.double({ min: 0, max: 1, noNaN: true });
    const view = fc.constantFrom('front', 'back', 'left', 'right', 'seated');
    fc.assert(
      fc.property(view, fc.boolean(), share, share, share, share, share, share, (v, mirrored, x1, y1, x2, y2, x, y) => {
        fc.pre(Math.hypot(x1 - x2, y1 - y2) > 0.05);
        const placement = placeFigure(frame({ view: v, mirrored }), [
          { figure: waist, photo: photoPoint(x1, y1) },
          { figure: fork, photo: photoPoint(x2, y2) },
        ])!;
        expect(placement.rms).toBeLessThan(1e-9);
        const back = figureToPhoto(placement, photoToFigure(placement, photoPoint(x, y)));
        expect(back.x).toBeCloseTo(x, 9);
        expect(back.y).toBeCloseTo(y, 9);
      }),
    );
  }); // prettier-ignore

  it('keeps the wearer’s left: right of the picture from the front, left from behind, swapped in a mirror', () => {
    const upright = [
      { figure: figurePoint(0, 0), photo: photoPoint(0.5, 0.2) },
      { figure: figurePoint(0, 1), photo: photoPoint(0.5, 0.4) },
    ];
    const xOf = (over: Partial<PhotoFrame>) =>
      photoToFigure(placeFigure(frame(over), upright)!, photoPoint(0.7, 0.3)).x;
    expect(xOf({ view: 'front' })).toBeCloseTo(0.75, 9);
    expect(xOf({ view: 'back' })).toBeCloseTo(-0.75, 9);
    expect(xOf({ view: 'front', mirrored: true })).toBeCloseTo(-0.75, 9);
    expect(xOf({ view: 'back', mirrored: true })).toBeCloseTo(0.75, 9);
    expect(xOf({ view: 'left' })).toBeCloseTo(-0.75, 9);
    expect(xOf({ view: 'right' })).toBeCloseTo(0.75, 9);
  });

  it('measures alike across and down on a photo that is not square', () => {
    const placement = placeFigure(frame({}), [
      { figure: figurePoint(0, 0), photo: photoPoint(0.5, 0.25) },
      { figure: figurePoint(0, 1), photo: photoPoint(0.5, 0.5) },
    ])!;
    const beside = figureToPhoto(placement, figurePoint(1, 0));
    expect((beside.x - 0.5) * 1200).toBeCloseTo(0.25 * 1600, 6);
    expect(placement.unitWidths * 1200).toBeCloseTo(400, 6);
    expect(placement.turnDeg).toBeCloseTo(0, 9);
  });

  it('gives nothing for a single landmark', () => {
    expect(placeFigure(frame({}), [{ figure: waist, photo: photoPoint(0.5, 0.2) }])).toBeNull();
  });
});
