import { describe, expect, it } from 'vitest';
import { draftBand } from '@/diagnosis/pattern/blocks/band';
import { blockMeasures } from '@/diagnosis/pattern/blocks/measures';
import { cutForStretch, backExtension, frontExtension, frontSeat, frontWaistMm, hipAboveFork, kneeAboveHemMm, legHalf, oldBackWaistIn, oldKneeBelowForkIn, riseOf, slopeDegrees, taughtExtensions } from '@/diagnosis/pattern/blocks/published'; // prettier-ignore
import { draftTrousers } from '@/diagnosis/pattern/blocks/trousers';
import {
  lengthOf,
  parameterAtLength,
  pointAt,
  splitCubic,
  straight,
  type Cubic,
} from '@/diagnosis/pattern/geometry/cubic';
import { areaOf, crossesItself } from '@/diagnosis/pattern/geometry/outline';
import { turn, xy } from '@/diagnosis/pattern/geometry/xy';
import { cuttingLine } from '@/diagnosis/pattern/allowance';
import { edgeLength, read, widthAt } from '@/diagnosis/pattern/measure';
import { dartDegrees } from '@/diagnosis/pattern/operators/dart';
import { hingedOverlap, hingedSpread } from '@/diagnosis/pattern/operators/hinged';
import { extendPoint } from '@/diagnosis/pattern/operators/fork';
import { raiseCentre } from '@/diagnosis/pattern/operators/waist';
import { part, pointOf, type Piece } from '@/diagnosis/pattern/piece';

const cubic = (...[a, b, c, d]: [number, number][]): Cubic => ({
  from: xy(...a!),
  control1: xy(...b!),
  control2: xy(...c!),
  to: xy(...d!),
});
/** Length by Simpson's rule on many steps: slow, plain, and another way than the one under test. */
function simpson(one: Cubic, steps = 20_000): number {
  const speed = (t: number) => {
    const [a, b] = [pointAt(one, t - 1e-6), pointAt(one, t + 1e-6)];
    return Math.hypot(b.x - a.x, b.y - a.y) / 2e-6;
  };
  let sum = speed(0) + speed(1);
  for (let step = 1; step < steps; step++) sum += (step % 2 ? 4 : 2) * speed(step / steps);
  return sum / (3 * steps);
}
const polygon = (points: [number, number][]): Cubic[] =>
  points.map((point, index) => straight(xy(...point), xy(...points[(index + 1) % points.length]!)));

describe('lengths of curves (standards:D19, D20; numerical integration, confirmed there by another library)', () => {
  const crotch = cubic([0, 10], [0, 4], [1, 1], [6, 0]);
  it('give the worked figures to nine digits', () => {
    expect(lengthOf(crotch)).toBeCloseTo(13.033832084, 8);
    const [first, second] = splitCubic(crotch, 0.5);
    expect(first.to).toEqual({ x: 1.125, y: 3.125 });
    expect(lengthOf(first)).toBeCloseTo(7.033366889, 8);
    expect(lengthOf(second)).toBeCloseTo(6.000465195, 8);
    expect(lengthOf(cubic([0, 0], [0, 4], [4, 4], [4, 0]))).toBeCloseTo(8, 9);
    expect(lengthOf(cubic([0, 1], [0.55228475, 1], [1, 0.55228475], [1, 0]))).toBeCloseTo(1.571016698, 8);
  });
  it('of a quadratic drawn as a cubic too', () => {
    const raised = cubic([0, 0], [2 / 3, 4 / 3], [4 / 3, 4 / 3], [2, 0]);
    expect(lengthOf(raised)).toBeCloseTo(2.957885715, 8);
  });
  it('agree with fine integration where a curve turns sharply or doubles back', () => {
    for (const one of [
      cubic([0, 0], [100, 0], [-40, 60], [60, 60]),
      cubic([0, 0], [300, 10], [-200, 20], [100, 400]),
      cubic([5, 5], [5, 5], [80, 90], [200, 3]),
    ])
      expect(Math.abs(lengthOf(one) - simpson(one))).toBeLessThan(1e-5);
  });
  it('are halved where the walked length says', () => {
    const t = parameterAtLength(crotch, 7.033366889);
    expect(t).toBeCloseTo(0.5, 8);
  });
});

describe('areas and offsets (standards:D18, D21; computed)', () => {
  const five: [number, number][] = [[0, 0], [10, 0], [12, 6], [5, 9], [-1, 5]]; // prettier-ignore
  it('area 86 and perimeter 36.25045 of the five-sided figure', () => {
    const sides = polygon(five);
    expect(areaOf(sides)).toBeCloseTo(86, 9);
    expect(sides.reduce((total, side) => total + lengthOf(side), 0)).toBeCloseTo(36.25045, 5);
  });
  it('a square of 10 with 0.625 all round, mitred, has the area 126.5625', () => {
    const square = polygon([[0, 0], [10, 0], [10, 10], [0, 10]]); // prettier-ignore
    const piece: Piece = {
      id: 'yoke',
      parts: square.map((side, index) => part(`edge-${index}`, side, `corner-${index}`)),
      marks: {},
      folds: [],
      allowancesMm: Object.fromEntries(square.map((_, index) => [`edge-${index}`, 0.625])),
    };
    const line = cuttingLine(piece).map(({ x, y }): [number, number] => [x, y]);
    expect(areaOf(polygon(line))).toBeCloseTo(126.5625, 9);
  });
  it('an arc over a chord of 10 with a rise of 1 is 10.2646 long, drawn as a band is drawn', () => {
    // Radius 13, half-angle asin(5/13): the lower edge of a band curved round that radius.
    const angle = 2 * Math.asin(5 / 13);
    const band = draftBand({ lowerMm: 13 * angle, heightMm: 1, contourMm: angle });
    expect(edgeLength(band, 'lower')).toBeCloseTo(10.264569, 4);
    expect(edgeLength(band, 'upper')).toBeCloseTo(12 * angle, 4);
  });
  it('a bow tie crosses itself and a square does not', () => {
    expect(crossesItself(polygon([[0, 0], [10, 10], [10, 0], [0, 10]]))).toBe(true); // prettier-ignore
    expect(crossesItself(polygon([[0, 0], [10, 0], [10, 10], [0, 10]]))).toBe(false); // prettier-ignore
  });
});

/** A piece 10 wide and 20 high, slashed at half its height from its centre (right) to its side (left). */
const sheet = (widthMm: number, heightMm: number): Piece => ({
  id: 'back',
  parts: [
    part('waist', straight(xy(0, 0), xy(widthMm, 0)), 'side-waist'),
    part('centre', straight(xy(widthMm, 0), xy(widthMm, heightMm)), 'centre-waist'),
    part('hem', straight(xy(widthMm, heightMm), xy(0, heightMm)), 'hem-in'),
    part('side', straight(xy(0, heightMm), xy(0, 0)), 'hem-out'),
  ],
  marks: {},
  folds: [],
  allowancesMm: {},
});
const open = (widthMm: number, at: number, amountMm: number) =>
  hingedSpread(sheet(widthMm, 20 * widthMm), {
    hinge: { edge: 'side', y: at },
    target: 'centre',
    moves: 'centre-waist',
    amountMm,
  });
const turned = (piece: Piece) => {
  const [a, b] = [pointOf(piece, 'side-waist'), pointOf(piece, 'centre-waist')];
  return (Math.atan2(Math.abs(b.y - a.y), b.x - a.x) * 180) / Math.PI;
};

describe('hinges (standards:D15, D16; plane geometry)', () => {
  it('10 long opened by 0.5 turns 2.865087°, 9 long by 0.75 turns 4.776031°', () => {
    expect(turned(open(10, 10, 0.5).piece)).toBeCloseTo(2.865087, 6);
    expect(turned(open(9, 10, 0.75).piece)).toBeCloseTo(4.776031, 6);
  });
  it('the wedge that is let in has the area 2.499219', () => {
    const { piece } = open(10, 10, 0.5);
    const before = areaOf(sheet(10, 200).parts.map(({ cubic: one }) => one));
    // The turned part leans over the side by the same angle; the outline gains the wedge itself.
    expect(areaOf(piece.parts.map(({ cubic: one }) => one)) - before).toBeCloseTo(2.499219, 5);
  });
  it('hinged on the stitching line, an allowance of 0.625 beyond it overlaps by 1/32 in: 0.03125', () => {
    const angle = 2 * Math.asin(0.5 / 20);
    const beyond = turn(xy(-0.625, 0), xy(0, 0), angle);
    expect(Math.hypot(beyond.x + 0.625, beyond.y)).toBeCloseTo(0.03125, 9);
  });
  it('an overlap turns the other way, by 2·atan(w/2L) for a slash whose middle is L long', () => {
    const { piece } = hingedOverlap(sheet(10, 200), { hinge: { edge: 'side', y: 10 }, target: 'centre', moves: 'centre-waist', amountMm: 0.5 }); // prettier-ignore
    expect(turned(piece)).toBeCloseTo((2 * Math.atan(0.5 / 20) * 180) / Math.PI, 6);
    expect(edgeLength(piece, 'centre')).toBeCloseTo(199.5, 9);
  });
});

describe('darts (standards:D17; plane geometry)', () => {
  const dart = (intake: number, depth: number): Piece => ({
    ...sheet(20, 20),
    parts: [
      part('waist', straight(xy(0, 0), xy(10, 0)), 'side-waist'),
      part('dart-1', straight(xy(10, 0), xy(10 + intake, 0)), 'dart-1-out'),
      part('waist', straight(xy(10 + intake, 0), xy(20, 0)), 'dart-1-in'),
      ...sheet(20, 20).parts.slice(1),
    ],
    marks: { 'dart-1-point': xy(10 + intake / 2, depth) },
  });
  it('1 in at 4 in deep closes 14.250033°, its legs are 4.031129', () => {
    expect(dartDegrees(dart(1, 4), 'dart-1')).toBeCloseTo(14.250033, 6);
    expect(Math.hypot(0.5, read(dart(1, 4), { of: 'dart-length', dart: 'dart-1' }))).toBeCloseTo(4.031129, 6);
  });
  it('the same angle 6 in deep takes 1.5 in', () => {
    expect(dartDegrees(dart(1.5, 6), 'dart-1')).toBeCloseTo(14.250033, 6);
  });
});

describe('published drafts and their worked numbers', () => {
  it('plain-front trousers in centimetres (standards:D02): rise 26, knee 43 above the hem, front waist 23, seat 25, knee 13, hem 11', () => {
    expect(riseOf(102, 76)).toBe(26);
    expect(kneeAboveHemMm(760)).toBe(430);
    expect(frontWaistMm(840)).toBe(230);
    expect([frontSeat(100), legHalf(52), legHalf(44)]).toEqual([25, 13, 11]);
    expect(hipAboveFork(100)).toBeCloseTo(8.333333, 6);
  });
  it('the block drafted from that source has those figures on its paper', () => {
    const measures = blockMeasures({ waistMm: 840, hipMm: 1000, inseamMm: 760, kneeMm: 520, hemMm: 440, depthMm: 250 }); // prettier-ignore
    const { front } = draftTrousers(measures);
    const fork = front.marks.crotch!.y;
    expect(fork).toBe(260);
    expect(widthAt(front, front.marks.hip!.y)).toBeCloseTo(250, 6);
    expect(fork - front.marks.hip!.y).toBeCloseTo(83.333, 3);
    expect(pointOf(front, 'hem-in').y - front.marks.knee!.y).toBeCloseTo(430, 9);
    expect([pointOf(front, 'knee-in').x, pointOf(front, 'hem-in').x]).toEqual([130, 110]);
  });
  it('seat 40 by the open draft (standards:D03): quarter 10, twelfth 3.333', () => {
    expect(frontSeat(40)).toBe(10);
    expect(hipAboveFork(40)).toBeCloseTo(3.333333, 6);
  });
  it('waist 34 and inseam 32 by the old draft (standards:D01): knee line 14 below the fork, back waist 19.25', () => {
    expect([oldKneeBelowForkIn(32), oldBackWaistIn(34)]).toEqual([14, 19.25]);
  });
  it('extensions of a hip of 100: 5 and 10 (standards:D09), by the teaching rule 3.75 and 11.25 (standards:D08): 15 together in both', () => {
    expect([frontExtension(100), backExtension(100)]).toEqual([5, 10]);
    expect(taughtExtensions(100)).toEqual({ front: 3.75, back: 11.25 });
  });
  it('a slope of 2.5 over 10 is 14.036243°, not 15 (standards:D04)', () => {
    expect(slopeDegrees(2.5, 10)).toBeCloseTo(14.036243, 6);
  });
  it('a gauge stretch of a quarter cuts at most a ninth smaller', () => {
    expect(1 - cutForStretch(1, 0.25)).toBeCloseTo(1 / 9, 9);
  });
});

describe('couplings come out of the geometry', () => {
  const sloped = draftTrousers(blockMeasures({ backSlopeDeg: 15 })).back;
  it('centre back raised on a slope of 15°: the waist loses tan 15° = 0.268 for each millimetre up', () => {
    const { piece } = raiseCentre(sloped, 10);
    const [a, b] = [pointOf(sloped, 'centre-waist'), pointOf(piece, 'centre-waist')];
    expect((a.x - b.x) / (a.y - b.y)).toBeCloseTo(0.267949, 4);
  });
  it('a wedge of 12 hinged 250 away and 150 below: the waist kicks out by 7 at the side and centre back leans by 7 more', () => {
    const before = sheet(250, 400);
    const { piece } = hingedSpread(before, { hinge: { edge: 'side', y: 150 }, target: 'centre', moves: 'centre-waist', amountMm: 12 }); // prettier-ignore
    const shift = (name: string) => pointOf(piece, name).x - pointOf(before, name).x;
    expect(Math.abs(shift('side-waist'))).toBeCloseTo((150 * 12) / 250, 1);
    expect(Math.abs(shift('centre-waist'))).toBeGreaterThan(6.5);
    expect(Math.abs(shift('centre-waist'))).toBeLessThan(7.6);
  });
  it('a point extended by 10 widens that thigh by nearly 10', () => {
    const { piece } = extendPoint(sloped, 10);
    const thigh = { of: 'width', level: 'thigh' } as const;
    const gain = read(piece, thigh) - read(sloped, thigh);
    expect(gain).toBeGreaterThan(9);
    expect(gain).toBeLessThan(11.5);
  });
});
