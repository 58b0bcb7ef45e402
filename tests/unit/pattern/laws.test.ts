import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { trousers } from '@/diagnosis/garments/trousers';
import { cuttingLine } from '@/diagnosis/pattern/allowance';
import type { Block } from '@/diagnosis/pattern/blocks/block';
import { runChain } from '@/diagnosis/pattern/chains/run';
import { chainOf } from '@/diagnosis/pattern/chains/trousers';
import { flatten, crossesItself } from '@/diagnosis/pattern/geometry/outline';
import { distance, type XY } from '@/diagnosis/pattern/geometry/xy';
import { replay } from '@/diagnosis/pattern/history';
import { edgeLength } from '@/diagnosis/pattern/measure';
import { blendSizes } from '@/diagnosis/pattern/operators/blend';
import { dartDegrees, moveDartPoint, resizeDart, rotateDart } from '@/diagnosis/pattern/operators/dart';
import { extendPoint, reshapeCurve, reshapeSide, slopeHem } from '@/diagnosis/pattern/operators/fork';
import { hingedOverlap, hingedSpread, type Hinged } from '@/diagnosis/pattern/operators/hinged';
import { hipAtSide, kneeBothEdges, shiftKnee, shiftLeg, swingLeg } from '@/diagnosis/pattern/operators/leg';
import {
  calfBothEdges,
  hemBothEdges,
  shiftKneeLine,
  shiftSide,
} from '@/diagnosis/pattern/operators/lower-leg';
import { parallelSpread, parallelTuck, type Parallel } from '@/diagnosis/pattern/operators/parallel';
import {
  centreSeam,
  pivotCentre,
  raiseCentre,
  raiseSide,
  waistAtSide,
} from '@/diagnosis/pattern/operators/waist';
import type { Piece } from '@/diagnosis/pattern/piece';
import { cornersOf } from '@/diagnosis/pattern/truing';
import { walkSeams } from '@/diagnosis/pattern/walk';
import { anyAmount, anyBlock } from './arbitrary';

const RUNS = { numRuns: 40 };
const onLeg = fc.constantFrom('front' as const, 'back' as const);
const cubics = (piece: Piece) => piece.parts.map(({ cubic }) => cubic);
const edgesOf = (piece: Piece) => [...new Set(piece.parts.map(({ edge }) => edge))];

/** The farthest that the points of one outline lie from the other's drawn line, mm. */
function apart(a: Piece, b: Piece): number {
  const line = flatten(cubics(b), 0.0005);
  const away = (point: XY) =>
    Math.min(...line.map((from, index) => toSegment(point, from, line[(index + 1) % line.length]!)));
  return Math.max(...flatten(cubics(a), 1).map(away));
}
function toSegment(p: XY, a: XY, b: XY): number {
  const square = (b.x - a.x) ** 2 + (b.y - a.y) ** 2;
  const t = square === 0 ? 0 : ((p.x - a.x) * (b.x - a.x) + (p.y - a.y) * (b.y - a.y)) / square;
  const u = Math.min(1, Math.max(0, t));
  return distance(p, { x: a.x + (b.x - a.x) * u, y: a.y + (b.y - a.y) * u });
}

const hinge = (piece: Piece, share: number, amountMm: number): Hinged => ({
  hinge: { edge: 'side', y: piece.marks.hip!.y * share },
  target: 'centre',
  moves: 'centre-waist',
  amountMm,
});
const across = (piece: Piece, amountMm: number): Parallel => ({
  axis: 'y',
  at: piece.marks.hip!.y - 25,
  edges: ['centre', 'side'],
  moves: 'centre-waist',
  amountMm,
});

describe('a hinge, on any block', () => {
  const law = (
    operate: typeof hingedSpread,
    sign: 1 | -1,
  ) =>
    fc.property(anyBlock, onLeg, fc.double({ min: 0.6, max: 0.95, noNaN: true }), anyAmount(40), (block, id, share, mm) => {
      const before = block[id];
      const { piece } = operate(before, hinge(before, share, mm));
      for (const edge of edgesOf(before).filter((one) => one !== 'centre'))
        expect(Math.abs(edgeLength(piece, edge) - edgeLength(before, edge)), edge).toBeLessThan(1e-6);
      expect(Math.abs(edgeLength(piece, 'centre') - edgeLength(before, 'centre') - sign * mm)).toBeLessThan(0.01);
    }); // prettier-ignore
  it('spread keeps every stitching line to 1e-6 and gives the target the amount to 0.01 mm', () => {
    fc.assert(law(hingedSpread, 1), RUNS);
  });
  it('overlapped does the same the other way', () => {
    fc.assert(law(hingedOverlap, -1), RUNS);
  });
});

describe('an operator and its inverse restore the piece', () => {
  it('when slashes are spread and overlapped, or spread and tucked', () => {
    fc.assert(
      fc.property(anyBlock, onLeg, anyAmount(25), (block, id, mm) => {
        const before = block[id];
        const wedge = hinge(before, 0.8, mm);
        expect(apart(hingedOverlap(hingedSpread(before, wedge).piece, wedge).piece, before)).toBeLessThan(
          2e-3,
        );
        const strip = across(before, mm);
        expect(apart(parallelTuck(parallelSpread(before, strip).piece, strip).piece, before)).toBeLessThan(
          2e-3,
        );
      }),
      RUNS,
    );
  });

  const signed = {
    raiseCentre, raiseSide, pivotCentre, waistAtSide, extendPoint, reshapeCurve, reshapeSide, slopeHem, hipAtSide,
    kneeBothEdges, calfBothEdges, hemBothEdges, swingLeg, shiftKnee, shiftLeg, shiftKneeLine, shiftSide,
    centreSeam: (piece: Piece, mm: number) => centreSeam(piece, mm, 0.5),
  }; // prettier-ignore
  it.each(Object.entries(signed))('when %s is done and undone', (_, operate) => {
    fc.assert(
      fc.property(anyBlock, onLeg, anyAmount(8), (block, id, mm) => {
        const once = operate(block[id], mm).piece;
        const back = operate(once, -mm).piece;
        const names = block[id].parts.flatMap(({ start }) => start ?? []);
        const at = (piece: Piece, name: string) =>
          piece.parts.find(({ start }) => start === name)!.cubic.from;
        for (const name of names)
          expect(distance(at(back, name), at(block[id], name)), name).toBeLessThan(1e-2);
        for (const edge of edgesOf(block[id]))
          expect(Math.abs(edgeLength(back, edge) - edgeLength(block[id], edge)), edge).toBeLessThan(0.01);
      }),
      { numRuns: 15 },
    );
  });

  it('when a dart is deepened and let out, or made longer and shorter', () => {
    fc.assert(
      fc.property(anyAmount(20), (mm) => {
        fc.pre(true);
        const { back } = FIXED;
        const dart = { dart: 'dart-1', along: 'waist' };
        const deep = resizeDart(back, { ...dart, amountMm: mm }).piece;
        const restored = resizeDart(deep, { ...dart, amountMm: -mm }).piece;
        expect(edgeLength(restored, 'dart-1')).toBeCloseTo(edgeLength(back, 'dart-1'), 6);
        expect(edgeLength(restored, 'waist')).toBeCloseTo(edgeLength(back, 'waist'), 6);
        const long = moveDartPoint(back, { dart: 'dart-1', amountMm: mm }).piece;
        const short = moveDartPoint(long, { dart: 'dart-1', amountMm: -mm }).piece;
        expect(distance(short.marks['dart-1-point']!, back.marks['dart-1-point']!)).toBeLessThan(1e-9);
      }),
      RUNS,
    );
  });
});

const FIXED = fc
  .sample(anyBlock, { numRuns: 30, seed: 7 })
  .find(({ back }) => edgesOf(back).includes('dart-1'))!;

it('a dart turned to the side keeps its angle, its legs and every edge', () => {
  fc.assert(
    fc.property(fc.double({ min: 0.3, max: 0.9, noNaN: true }), (share) => {
      const { back } = FIXED;
      const to = { edge: 'side', y: back.marks.hip!.y * share };
      const { piece } = rotateDart(back, { dart: 'dart-1', to });
      for (const edge of edgesOf(back).filter((one) => one !== 'dart-1'))
        expect(edgeLength(piece, edge)).toBeCloseTo(edgeLength(back, edge), 6);
      expect(dartDegrees(piece, 'dart-1')).toBeCloseTo(dartDegrees(back, 'dart-1'), 1);
    }),
    RUNS,
  );
});

const drawn = trousers.corrections.flatMap(({ id, amounts }) => (amounts ? [{ id, amounts }] : []));
const needsDart = (id: string) => id.includes('back-dart');
const fits = (block: Block, id: string) => !needsDart(id) || edgesOf(block.back).includes('dart-1');
const anyChange = fc.constantFrom(...drawn);

describe('every correction, on any block, within its stop in total', () => {
  const doneOn = (check: (block: Block, after: Block, id: string, mm: number) => void) =>
    fc.property(anyBlock, anyChange, fc.double({ min: 0.05, max: 1, noNaN: true }), (block, { id, amounts }, share) => {
      fc.pre(fits(block, id));
      const mm = amounts.capTotalMm * share;
      check(block, runChain(block, chainOf(id)!, mm).after, id, mm);
    }); // prettier-ignore

  it('holds what it declares', () => {
    fc.assert(
      fc.property(anyBlock, anyChange, (block, { id, amounts }) => {
        fc.pre(fits(block, id));
        const { steps } = runChain(block, chainOf(id)!, amounts.capRoundMm);
        expect(steps.flatMap(({ proved }) => proved.filter(({ holds }) => !holds))).toEqual([]);
      }),
      { numRuns: 120 },
    );
  });

  it('closes its outline and never crosses itself', () => {
    fc.assert(
      doneOn((_, after, id) => {
        for (const piece of Object.values(after) as Piece[]) {
          const gaps = piece.parts.map(({ cubic }, index) =>
            distance(piece.parts.at(index - 1)!.cubic.to, cubic.from),
          );
          expect(Math.max(...gaps), id).toBeLessThan(1e-6);
          expect(crossesItself(cubics(piece)), id).toBe(false);
        }
      }),
      { numRuns: 80 },
    );
  });

  it('is trued: no edge keeps a corner that the change made', () => {
    fc.assert(
      doneOn((block, after, id) => {
        for (const piece of ['front', 'back'] as const) {
          const inside = cornersOf(after[piece]).filter(
            ({ at }) =>
              !after[piece].parts.some(({ start, cubic }) => start !== undefined && cubic.from === at),
          );
          expect(inside, id).toEqual([]);
          expect(cornersOf(block[piece])).toEqual([]);
        }
      }),
      { numRuns: 80 },
    );
  });
});

it('truing keeps every drafted difference: what the operator left a seam, the trued seam has to 1.5 mm', () => {
  fc.assert(
    fc.property(anyBlock, anyChange, (block, { id, amounts }) => {
      fc.pre(fits(block, id));
      const chain = chainOf(id)!;
      const trued = runChain(block, chain, amounts.capRoundMm).after;
      const raw = chain.reduce(
        (now, { piece, run, perMm }) => ({
          ...now,
          [piece]: run(now[piece], perMm * amounts.capRoundMm).piece,
        }),
        block,
      );
      const [a, b] = [walkSeams(block, trued), walkSeams(block, raw)];
      for (const [index, { nowMm }] of a.entries())
        expect(Math.abs(nowMm - b[index]!.nowMm), `${id} ${a[index]!.name}`).toBeLessThan(1.5);
    }),
    { numRuns: 80 },
  );
});

it('allowances stay parallel: every point of a cutting line lies its allowance off the stitching line, corners farther', () => {
  fc.assert(
    fc.property(anyBlock, onLeg, (block, id) => {
      const piece = {
        ...block[id],
        allowancesMm: Object.fromEntries(edgesOf(block[id]).map((edge) => [edge, 15])),
      };
      const line = flatten(cubics(piece), 0.001);
      const away = cuttingLine(piece).map((point) =>
        Math.min(...line.map((from, index) => toSegment(point, from, line[(index + 1) % line.length]!))),
      );
      expect(Math.min(...away)).toBeGreaterThan(15 - 0.05);
      expect(away.filter((mm) => mm > 15.05).length).toBeLessThan(12);
    }),
    { numRuns: 10 },
  );
});

describe('a history', () => {
  const history = [
    { correction: 'lengthen-depth', amountMm: 10 },
    { correction: 'extend-back-point', amountMm: 6 },
    { correction: 'let-out-hip-side', amountMm: 5 },
  ];
  const block = fc.sample(anyBlock, { numRuns: 1, seed: 3 })[0]!;
  const replayed = (entries: typeof history, on = block) => {
    const result = replay(on, entries);
    if (!result.ok) throw new Error(result.why);
    return result.block;
  };
  it('with its last change left out is what it was before that change', () => {
    expect(replayed(history.slice(0, 2))).toEqual(replayed(history.slice(0, -1)));
    expect(replayed(history)).not.toEqual(replayed(history.slice(0, 2)));
  });
  it('may be done in another order where the changes do not meet', () => {
    const [depth, point, hip] = history as [(typeof history)[0], (typeof history)[0], (typeof history)[0]];
    expect(apart(replayed([point, hip, depth]).back, replayed([depth, point, hip]).back)).toBeLessThan(0.6);
  });
  it('is carried to another size by the same amounts', () => {
    fc.assert(
      fc.property(anyBlock, (other) => {
        const gain = edgeLength(replayed(history, other).back, 'centre') - edgeLength(other.back, 'centre');
        expect(gain).toBeGreaterThan(9.5);
        expect(gain).toBeLessThan(10.5);
      }),
      { numRuns: 20 },
    );
  });
  it('answers with the place where a block is too small, and goes no further', () => {
    const answer = replay(block, [...history, { correction: 'shorten-back-dart', amountMm: 500 }]);
    expect(answer).toMatchObject({ ok: false, at: 3 });
  });
});

it('two sizes blend: each level has its own share, and the outline stays closed', () => {
  const [small, large] = fc.sample(anyBlock, { numRuns: 40, seed: 11 }).filter(({ back }) => edgesOf(back).includes('dart-1')) as [Block, Block]; // prettier-ignore
  const blended = blendSizes(small.back, large.back, [
    { y: 0, share: 0 },
    { y: small.back.marks.hip!.y, share: 1 },
  ]);
  const at = (piece: Piece, name: string) => piece.parts.find(({ start }) => start === name)!.cubic.from;
  expect(distance(at(blended, 'hip-out'), at(large.back, 'hip-out'))).toBeLessThan(1e-9);
  expect(distance(at(blended, 'centre-waist'), at(small.back, 'centre-waist'))).toBeLessThan(1e-9);
  expect(blended.parts.every(({ cubic }, index) => distance(blended.parts.at(index - 1)!.cubic.to, cubic.from) < 1e-9)).toBe(true); // prettier-ignore
});
