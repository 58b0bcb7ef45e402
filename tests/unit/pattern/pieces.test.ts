import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { draftBand } from '@/diagnosis/pattern/blocks/band';
import { draftFly } from '@/diagnosis/pattern/blocks/fly';
import { cutYoke } from '@/diagnosis/pattern/blocks/yoke';
import { chainOf } from '@/diagnosis/pattern/chains/trousers';
import { runChain } from '@/diagnosis/pattern/chains/run';
import { bandWants, fitBand } from '@/diagnosis/pattern/fit-band';
import { areaOf, crossesItself } from '@/diagnosis/pattern/geometry/outline';
import { distance } from '@/diagnosis/pattern/geometry/xy';
import { edgeLength } from '@/diagnosis/pattern/measure';
import type { Piece } from '@/diagnosis/pattern/piece';
import { walkSeams } from '@/diagnosis/pattern/walk';
import { anyBlock } from './arbitrary';

const cubics = (piece: Piece) => piece.parts.map(({ cubic }) => cubic);
const isClosed = (piece: Piece) =>
  piece.parts.every(({ cubic }, index) => distance(piece.parts.at(index - 1)!.cubic.to, cubic.from) < 1e-6);
const RUNS = { numRuns: 30 };

describe('a block', () => {
  it('has sides that meet, a back inseam drafted 6 mm shorter, and a band that fits its waist', () => {
    fc.assert(
      fc.property(anyBlock, (block) => {
        const of = Object.fromEntries(walkSeams(block, block).map((one) => [one.id, one]));
        expect(of['side-top']!.nowMm + of['side-foot']!.nowMm).toBeCloseTo(0, 4);
        expect(of['inseam-top']!.nowMm).toBeCloseTo(6, 4);
        expect(of['inseam-foot']!.nowMm).toBeCloseTo(0, 6);
        expect(of.band!.nowMm).toBeCloseTo(0, 4);
        expect(of['inseam-top']!.verdict).toBe('ease');
      }),
      RUNS,
    );
  });
  it('closes, runs clockwise and does not cross itself', () => {
    fc.assert(
      fc.property(anyBlock, (block) => {
        for (const piece of Object.values(block) as Piece[]) {
          expect(isClosed(piece)).toBe(true);
          expect(areaOf(cubics(piece))).toBeGreaterThan(0);
          expect(crossesItself(cubics(piece))).toBe(false);
        }
      }),
      RUNS,
    );
  });
});

describe('a yoke', () => {
  it('has a seam as long as the back’s, the sewn waist, no dart, and loses no paper but the dart', () => {
    fc.assert(
      fc.property(anyBlock, fc.double({ min: 40, max: 90, noNaN: true }), (block, centreMm) => {
        const { yoke, back } = cutYoke(block.back, { centreMm, sideMm: 35 });
        expect(edgeLength(yoke, 'yoke-seam')).toBeCloseTo(edgeLength(back, 'yoke-seam'), 6);
        expect(edgeLength(yoke, 'waist')).toBeCloseTo(edgeLength(block.back, 'waist'), 6);
        expect(edgeLength(yoke, 'dart-1')).toBe(0);
        for (const edge of ['centre', 'side'])
          expect(edgeLength(yoke, edge) + edgeLength(back, edge)).toBeCloseTo(
            edgeLength(block.back, edge),
            6,
          );
        expect(isClosed(yoke) && isClosed(back)).toBe(true);
        expect(crossesItself(cubics(yoke))).toBe(false);
      }),
      RUNS,
    );
  });
});

describe('a fly facing', () => {
  it('lies along the centre of its own front, and grows with it', () => {
    fc.assert(
      fc.property(anyBlock, (block) => {
        const { after } = runChain(block, chainOf('raise-centre-front')!, 12);
        const [before, now] = [draftFly(block.front), draftFly(after.front)];
        expect(edgeLength(now, 'centre') - edgeLength(before, 'centre')).toBeCloseTo(12, 4);
        expect(isClosed(now)).toBe(true);
        expect(crossesItself(cubics(now))).toBe(false);
      }),
      RUNS,
    );
  });
});

describe('a band', () => {
  it('curved either way has the lengths that it was drafted to', () => {
    fc.assert(
      fc.property(fc.double({ min: -40, max: 60, noNaN: true }), fc.double({ min: 250, max: 700, noNaN: true }), (contourMm, lowerMm) => {
        fc.pre(Math.abs(contourMm) >= 0.5);
        const band = draftBand({ lowerMm, heightMm: 40, contourMm });
        expect(edgeLength(band, 'lower')).toBeCloseTo(lowerMm, 3);
        expect(edgeLength(band, 'lower') - edgeLength(band, 'upper')).toBeCloseTo(contourMm, 3);
        expect(isClosed(band)).toBe(true);
      }),
      RUNS,
    ); // prettier-ignore
  });
  it('is drawn anew to a changed waist, its contour kept: then nothing is left to name', () => {
    fc.assert(
      fc.property(anyBlock, fc.double({ min: 3, max: 12, noNaN: true }), (block, mm) => {
        const { after } = runChain(block, chainOf('let-out-waist-front')!, mm);
        expect(bandWants(block, after)).toBeGreaterThan(0.8 * mm);
        const fitted = fitBand(block, after);
        expect(bandWants(block, fitted)).toBeCloseTo(0, 3);
        expect(walkSeams(block, fitted).find(({ id }) => id === 'band')!.verdict).toBe('as-drafted');
      }),
      RUNS,
    );
  });
});
