import { describe, expect, it } from 'vitest';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';
import type { FigureView } from '@/diagnosis/figure/figure';
import type { Sign } from '@/diagnosis/garments/schema';
import { bundleMarks } from '@/diagnosis/photo/bundle';
import { offerKey, offerSigns } from '@/diagnosis/photo/offer-signs';
import { readFigure } from '@/diagnosis/photo/read-figure';
import { angleMiss } from '@/diagnosis/photo/template-fit';
import { drawnOver } from './placed';

type Known = Pick<Sign, 'id' | 'zone' | 'tension' | 'template'> & Partial<Sign>;
const sign = (known: Known): Sign => ({
  name: known.id, description: known.id, group: 'fork', views: ['front', 'back', 'left', 'right'], sided: false, leak: 'usual', links: [], maskedBy: [], lookAlikes: [], synonyms: [], needsFullLength: false, sources: ['common practice'], ...known,
}); // prettier-ignore

const RISING = sign({
  id: 'rising', zone: 'fork-front', tension: 'tight', views: ['front'],
  template: { zones: ['fork-front', 'hip-front'], kinds: ['tight'], angleDeg: { from: 100, to: 165 }, anchor: 'fork', target: 'hip', lengthRatio: { from: 0.15, to: 0.8 } },
}); // prettier-ignore
const UNDER_SEAT = sign({
  id: 'under-seat-fold', zone: 'under-seat', tension: 'slack', views: ['back', 'left', 'right'], sided: true,
  template: { zones: ['under-seat'], kinds: ['slack'], angleDeg: { from: 60, to: 120 }, anchor: null, target: null, lengthRatio: null },
}); // prettier-ignore
const FELT = sign({ id: 'felt', zone: 'fork-front', tension: 'feel', template: null });
const SIGNS = [RISING, UNDER_SEAT, FELT];
const figures = (...views: FigureView[]) => views.map((view) => readFigure(view, REFERENCE_PROPORTIONS));

const FAN_ENDS: [number, number][] = [[0.4, 0.9], [0.36, 0.76], [0.26, 0.66]]; // prettier-ignore
const FAN = FAN_ENDS.map((end, i) => drawnOver('front', [[0.04, 0.97], end], { id: `fan-${i}` }));
const FOLD = (view: FigureView, x: number, id: string) => drawnOver(view, [[x - 0.12, 1.08], [x + 0.12, 1.09]], { kind: 'slack', id, severity: 3 }); // prettier-ignore

describe('signs offered for marks', () => {
  it('offers the sign whose place, direction and target fit, and says why', () => {
    const [offer, ...rest] = offerSigns(SIGNS, figures('front'), FAN);
    expect(offer).toMatchObject({ sign: 'rising', side: 'both', views: ['front'], severity: 2 });
    expect(rest).toEqual([]);
    expect(offer!.why.map(({ kind }) => kind)).toEqual(['zone', 'direction', 'anchor', 'target', 'meeting']);
    expect([...offer!.markIds].sort()).toEqual(['fan-0', 'fan-1', 'fan-2']);
  });

  it('makes one sign of the same place in two views, at its greatest strength', () => {
    const marks = [FOLD('back', 0.3, 'behind'), FOLD('left', -0.3, 'beside')];
    const offers = offerSigns(SIGNS, figures('back', 'left'), marks);
    expect(offers).toHaveLength(1);
    expect(offers[0]).toMatchObject({ sign: 'under-seat-fold', side: 'left', severity: 3 });
    expect([...offers[0]!.views].sort()).toEqual(['back', 'left']);
  });

  it('keeps left and right apart, and never offers again what was refused', () => {
    const marks = [FOLD('back', 0.3, 'l'), FOLD('back', -0.3, 'r')];
    const both = offerSigns(SIGNS, figures('back'), marks);
    expect(both.map(({ side, markIds }) => [side, markIds])).toEqual([['left', ['l']], ['right', ['r']]]); // prettier-ignore
    const refused = new Set([offerKey('under-seat-fold', 'left')]);
    expect(offerSigns(SIGNS, figures('back'), marks, { refused }).map(({ side }) => side)).toEqual(['right']);
  });

  it('reads neither a pin, nor a line of the other tension, nor nothing', () => {
    const pins = FAN.map((mark) => ({ ...mark, kind: 'pin' as const }));
    const slack = FAN.map((mark) => ({ ...mark, kind: 'slack' as const }));
    expect(offerSigns(SIGNS, figures('front'), pins)).toEqual([]);
    expect(offerSigns(SIGNS, figures('front'), slack)).toEqual([]);
    expect(offerSigns(SIGNS, figures('front'), [])).toEqual([]);
  });

  it('does not depend on the order of marks or signs', () => {
    const stray = drawnOver('front', [[0.3, 2], [0.4, 2.4]], { id: 'stray', kind: 'gap' }); // prettier-ignore
    const marks = [...FAN, stray];
    const straight = offerSigns(SIGNS, figures('front'), marks);
    const turned = offerSigns([...SIGNS].reverse(), figures('front'), [...marks].reverse());
    expect(turned.map(({ sign, side }) => [sign, side])).toEqual(
      straight.map(({ sign, side }) => [sign, side]),
    );
    expect(turned[0]!.score).toBeCloseTo(straight[0]!.score, 9);
  });

  it('offers no more than it is asked for', () => {
    const many = Array.from({ length: 12 }, (_, i) => sign({ ...RISING, id: `rising-${i}` }));
    expect(offerSigns(many, figures('front'), FAN)).toHaveLength(7);
    expect(offerSigns(many, figures('front'), FAN, { most: 3 })).toHaveLength(3);
  });
});

describe('a direction against a range', () => {
  it('is within, beside, or over plumb, modulo half a turn', () => {
    expect(angleMiss(90, { from: 70, to: 110 })).toBe(0);
    expect(angleMiss(120, { from: 70, to: 110 })).toBe(10);
    expect(angleMiss(175, { from: -20, to: 20 })).toBe(0);
    expect(angleMiss(175, { from: 160, to: 20 })).toBe(0);
    expect(angleMiss(90, { from: -20, to: 20 })).toBe(70);
    expect(angleMiss(5, { from: 150, to: 178 })).toBe(7);
  });
});

describe('bundles', () => {
  it('keep lines of one kind that lie together, and find where they meet', () => {
    const far = drawnOver('front', [[0.3, 2], [0.4, 2.2]], { id: 'far' }); // prettier-ignore
    const bundles = bundleMarks([FAN[0]!, far, FAN[1]!, FAN[2]!]);
    expect(bundles.map(({ marks }) => marks.map(({ id }) => id))).toEqual([
      ['fan-0', 'fan-1', 'fan-2'],
      ['far'],
    ]);
    const meeting = bundles[0]!.meeting;
    expect(meeting.kind).toBe('met');
    if (meeting.kind === 'met')
      expect(Math.hypot(meeting.point.x - 0.04, meeting.point.y - 0.97)).toBeLessThan(0.01);
    expect(bundles[1]!.meeting).toEqual({ kind: 'refused', why: 'too-few' });
  });
});
