import { describe, expect, it } from 'vitest';
import type { FigureView } from '@/diagnosis/figure/figure';
import type { BodyMark } from '@/diagnosis/photo/body-mark';
import { compareMarks, hiddenByTight, type CompareContext } from '@/diagnosis/photo/compare-marks';
import { drawnOver } from './placed';

const FRONT_AND_BACK: CompareContext = {
  viewsBefore: new Set<FigureView>(['front', 'back']),
  viewsAfter: new Set<FigureView>(['front', 'back']),
  isHidden: () => false,
};
const states = (before: BodyMark[], after: BodyMark[], over: Partial<CompareContext> = {}) =>
  compareMarks(before, after, { ...FRONT_AND_BACK, ...over }).map(({ state }) => state);

const LINE: [number, number][] = [[0.05, 0.98], [0.35, 0.78]]; // prettier-ignore
const along = (share: number): [number, number][] => [LINE[0]!, [0.05 + 0.3 * share, 0.98 - 0.2 * share]];
const mark = (over: Parameters<typeof drawnOver>[2] = {}, points = LINE) => drawnOver('front', points, over);

describe('marks of two rounds on the body', () => {
  it('stay, ease, grow, go and come', () => {
    expect(states([mark()], [mark()])).toEqual(['same']);
    expect(states([mark({ severity: 3 })], [mark({ severity: 1 })])).toEqual(['eased']);
    expect(states([mark({ severity: 1 })], [mark({ severity: 2 })])).toEqual(['worse']);
    expect(states([mark()], [])).toEqual(['gone']);
    expect(states([], [mark()])).toEqual(['new']);
  });

  it('compares lengths on the body, whatever the photos’ sizes: half the line is eased', () => {
    const small = { frame: { widthPx: 800, heightPx: 1700 } };
    expect(states([mark()], [mark(small)])).toEqual(['same']);
    const [half] = compareMarks([mark()], [mark(small, along(0.5))], FRONT_AND_BACK);
    expect(half!.state).toBe('eased');
    expect(half!.lengthRatio).toBeCloseTo(0.5, 6);
    expect(states([mark({}, along(0.5))], [mark()])).toEqual(['worse']);
  });

  it('says what was not photographed, or is hidden, and does not call it gone', () => {
    const onlyBack = { viewsAfter: new Set<FigureView>(['back']) };
    expect(states([mark()], [], onlyBack)).toEqual(['not-photographed']);
    expect(states([mark()], [], { isHidden: () => true })).toEqual(['hidden']);
    expect(states([], [mark()], { viewsBefore: new Set<FigureView>(['back']) })).toEqual([
      'not-photographed',
    ]);
  });

  it('takes no line for another: other kind, other leg, other way, other place', () => {
    const gone = ['gone', 'new'];
    expect(states([mark()], [mark({ kind: 'slack' })])).toEqual(gone);
    expect(states([mark()], [mark({}, LINE.map(([x, y]) => [-x, y]))])).toEqual(gone); // prettier-ignore
    expect(states([mark()], [mark({}, [[0.05, 0.78], [0.35, 0.98]])])).toEqual(gone); // prettier-ignore
    expect(states([mark()], [mark({}, LINE.map(([x, y]) => [x, y + 0.6]))])).toEqual(gone); // prettier-ignore
  });

  it('pairs the nearest first, each once', () => {
    const lower = mark({ id: 'b' }, LINE.map(([x, y]) => [x, y + 0.1])); // prettier-ignore
    const compared = compareMarks([mark({ id: 'a' }), lower], [{ ...lower, id: 'B' }, mark({ id: 'A' })], FRONT_AND_BACK); // prettier-ignore
    expect(compared.map(({ before, after }) => [before?.id, after?.id])).toEqual([['a', 'A'], ['b', 'B']]); // prettier-ignore
  });

  it('calls slack hidden where something tight lies now, in the same place only', () => {
    const slack = mark({ kind: 'slack' });
    const elsewhere = mark({}, [[0.3, 2], [0.4, 2.2]]); // prettier-ignore
    expect(states([slack], [mark()], { isHidden: hiddenByTight([mark()]) })).toEqual(['hidden', 'new']);
    expect(states([slack], [elsewhere], { isHidden: hiddenByTight([elsewhere]) })).toEqual(['gone', 'new']);
    expect(hiddenByTight([mark({ severity: 1 })])(slack)).toBe(false);
  });
});
