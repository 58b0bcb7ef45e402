import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { figureToPhoto, photoToFigure, placeFigure, type FigurePlacement } from '@/diagnosis/figure/align';
import { figurePoint, photoPoint } from '@/diagnosis/figure/point';
import { applyAffine, layOver, SAME_PLACE } from '@/diagnosis/photo/lay-over';

const share = fc.double({ min: 0.1, max: 0.9, noNaN: true });
const placement = fc
  .record({ view: fc.constant('back' as const), mirrored: fc.boolean(), widthPx: fc.integer({ min: 600, max: 2400 }), heightPx: fc.integer({ min: 600, max: 2400 }), x1: share, y1: share, x2: share, y2: share })
  .map(({ x1, y1, x2, y2, ...frame }) =>
    placeFigure(frame, [{ figure: figurePoint(0, 0), photo: photoPoint(x1, y1) }, { figure: figurePoint(0, 1), photo: photoPoint(x2, y2) }]),
  )
  .filter((made): made is FigurePlacement => made !== null && made.unitWidths > 0.02); // prettier-ignore

const inWidths = ({ frame }: FigurePlacement, { x, y }: { x: number; y: number }) => ({
  x,
  y: (y * frame.heightPx) / frame.widthPx,
});

describe('one photo laid over another', () => {
  it('brings every place of the body onto the same place of the body, mirrored or not', () => {
    fc.assert(
      fc.property(placement, placement, share, share, (a, b, x, y) => {
        const place = photoPoint(x, y);
        const wanted = inWidths(b, figureToPhoto(b, photoToFigure(a, place)));
        const found = applyAffine(layOver(a, b), inWidths(a, place));
        expect(found.x).toBeCloseTo(wanted.x, 6);
        expect(found.y).toBeCloseTo(wanted.y, 6);
      }),
    );
  });

  it('leaves a photo where it is when laid over itself', () => {
    fc.assert(
      fc.property(placement, (a) => {
        layOver(a, a).forEach((value, i) => expect(value).toBeCloseTo(SAME_PLACE[i]!, 9));
      }),
    );
  });
});
