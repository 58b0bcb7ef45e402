import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { betweenSeamlinesMm } from '@/diagnosis/flat-check/allowances';
import { flatCheck, type FlatCheckInput } from '@/diagnosis/flat-check/flat-check';
import { habitsBeside, type FittedMeasure } from '@/diagnosis/flat-check/habits';
import { measuredOf } from '@/diagnosis/flat-check/measured';
import { REMEDIES } from '@/diagnosis/flat-check/remedies';
import { adviseOn } from '@/diagnosis/flat-check/suggest';
import { sumOf } from '@/diagnosis/flat-check/sums';
import { diagnose } from '@/diagnosis/diagnose';
import { parseCase } from '@/diagnosis/case';
import { knowledgeOf } from '@/diagnosis/garments/registry';

const trousers = knowledgeOf('trousers');
const input = (more: Partial<FlatCheckInput>): FlatCheckInput => ({ body: {}, pattern: {}, patternWaist: 'navel', cloth: 'woven', ...more }); // prettier-ignore
const of = (mm: number, sdMm = 8) => ({ meanMm: mm, sdMm, waist: 'navel' as const });
const check = (more: Partial<FlatCheckInput>) => flatCheck(trousers, input(more));

describe('body beside pattern', () => {
  it('the draft’s own ease stands on both sides: a body 20 over the chart wants 20', () => {
    const [hip] = check({ body: { hip: of(1020) }, pattern: { hip: { bodyMm: 1000, garmentMm: 1065 } } }).differences; // prettier-ignore
    expect(hip).toMatchObject({ needMm: 20, easeFrom: 'draft', easeMm: 65, kind: 'short' });
    expect(hip?.sdMm).toBeCloseTo(Math.hypot(8, 3), 9);
  });

  it('without a chart the printed ease of woven cloth is put in, and its doubt with it', () => {
    const [hip] = check({ body: { hip: of(1000) }, pattern: { hip: { bodyMm: null, garmentMm: 1040 } } }).differences; // prettier-ignore
    expect(hip).toMatchObject({ easeFrom: 'table' });
    expect(hip?.easeMm).toBeCloseTo(76.2, 9);
    expect(hip?.needMm).toBeCloseTo(36.2, 9);
    expect(hip?.sdMm).toBeCloseTo(Math.hypot(8, 3, 12), 9);
  });

  it('an ease that was chosen replaces the draft’s', () => {
    const [hip] = check({ body: { hip: of(1000) }, pattern: { hip: { bodyMm: 1000, garmentMm: 1065 } }, easeMm: { hip: 30 } }).differences; // prettier-ignore
    expect(hip).toMatchObject({ needMm: -35, easeFrom: 'chosen' });
  });

  it('stretch cloth without a chart is not guessed', () => {
    const { differences, notCompared } = check({ cloth: 'knit', body: { hip: of(1000) }, pattern: { hip: { bodyMm: null, garmentMm: 900 } } }); // prettier-ignore
    expect([differences, notCompared.length]).toEqual([[], 1]);
  });

  it('lengths from another waist, or from nobody knows which, are not compared', () => {
    const lengths = { body: { 'back-crotch-length': of(370, 15), hip: of(1000) }, pattern: { 'back-crotch-length': { bodyMm: 350, garmentMm: null }, hip: { bodyMm: 1000, garmentMm: null } } }; // prettier-ignore
    for (const patternWaist of ['narrowest', null] as const) {
      const { differences, notCompared } = check({ ...lengths, patternWaist });
      expect(differences.map(({ measure }) => measure)).toEqual(['hip']);
      expect(notCompared.map(({ measure }) => measure)).toEqual(['back-crotch-length']);
    }
    expect(check(lengths).differences).toHaveLength(2);
  });

  it('allowances are taken out by the edges a measure crosses', () => {
    expect(betweenSeamlinesMm('hip', 1185, 15)).toBe(1065);
    expect(betweenSeamlinesMm('back-crotch-length', 380, 15)).toBe(350);
    expect(betweenSeamlinesMm('inseam', 800, 15)).toBe(785);
  });
});

describe('a difference speaks about a sum of needs', () => {
  // Front crotch length = depth + front rise + front point + 0.9 front curve (the fitter’s rule of sums, 1.2).
  it('front crotch length is four needs, with the published weights', () => {
    expect(sumOf(trousers, 'front-crotch-length')?.terms).toEqual([
      { dimension: 'crotch-depth', weight: 1, side: 'both' },
      { dimension: 'front-rise', weight: 1, side: 'both' },
      { dimension: 'front-extension', weight: 1, side: 'both' },
      { dimension: 'front-curve', weight: 0.9, side: 'both' },
    ]);
  });

  it('a whole crotch length leaves front and back apart open: nothing of front or back alone is likely', () => {
    const [whole] = check({ body: { 'crotch-length': of(680, 18) }, pattern: { 'crotch-length': { bodyMm: 620, garmentMm: null } } }).differences; // prettier-ignore
    expect(whole?.terms.find(({ dimension }) => dimension === 'crotch-depth')?.weight).toBe(2);
    expect(adviseOn(trousers, whole!, { hipMm: 1000 }).kind).toBe('open');
    const { label: _label, ...measured } = measuredOf(whole!);
    const parsed = parseCase(trousers, { garment: 'trousers', measured: [measured] });
    if (!parsed.ok) throw new Error(parsed.fault.message);
    const { needs } = diagnose(trousers, parsed.value);
    const likely = needs.filter(({ word }) => word === 'likely').map(({ dimension }) => dimension);
    expect(likely.filter((id) => /^(front|back)-/.test(id))).toEqual([]);
    expect(needs.find(({ dimension }) => dimension === 'crotch-depth')?.direction).toBe('more');
  });

  it('halves that were measured apart make the whole needless', () => {
    const both = { bodyMm: 300, garmentMm: null };
    const { differences, notCompared } = check({
      body: { 'front-crotch-length': of(290, 15), 'back-crotch-length': of(350, 15), 'crotch-length': of(640, 18) },
      pattern: { 'front-crotch-length': both, 'back-crotch-length': both, 'crotch-length': { bodyMm: 600, garmentMm: null } },
    }); // prettier-ignore
    expect(differences).toHaveLength(2);
    expect(notCompared.map(({ measure }) => measure)).toEqual(['crotch-length']);
  });

  it('law: the need is body less chart, and its error is never below the tape’s', () => {
    fc.assert(
      fc.property(fc.integer({ min: 700, max: 1500 }), fc.integer({ min: 700, max: 1500 }), fc.integer({ min: 3, max: 20 }), (body, chart, sd) => {
        const [hip] = check({ body: { hip: of(body, sd) }, pattern: { hip: { bodyMm: chart, garmentMm: chart + 60 } } }).differences;
        expect(hip?.needMm).toBe(body - chart);
        expect(hip?.sdMm).toBeGreaterThanOrEqual(sd);
        expect(hip?.kind === 'within').toBe(Math.abs(body - chart) <= Math.max(hip?.sdMm ?? 0, 4));
      }),
    ); // prettier-ignore
  });
});

describe('what to change before the first muslin', () => {
  const adviseHip = (needMm: number) => {
    const [hip] = check({ body: { hip: of(1000 + needMm) }, pattern: { hip: { bodyMm: 1000, garmentMm: 1065 } } }).differences; // prettier-ignore
    return adviseOn(trousers, hip!, { hipMm: 1000 });
  };

  it('a hip 24 mm short: two thirds of it, 4 mm on each of four edges', () => {
    const advice = adviseHip(24);
    expect(advice).toMatchObject({ kind: 'change', suggestions: [{ correction: 'let-out-hip-side', basis: 'edge', meetsMm: 16 }] }); // prettier-ignore
    if (advice.kind === 'change') expect(advice.suggestions[0]?.amountMm).toBeCloseTo(4, 9);
  });

  it('within the error nothing; past what the draft bends, another size', () => {
    expect(adviseHip(8)).toEqual({ kind: 'leave' });
    // Surplus width is taken out last (order of work, 1.9): the muslin keeps it.
    expect(adviseHip(-24).kind).toBe('open');
    expect(adviseHip(-36).kind).toBe('change');
    expect(adviseHip(200).kind).toBe('another-size');
  });

  it('every remedy is a correction of the garment that moves its sum the way it should', () => {
    for (const [measure, { more, less }] of Object.entries(REMEDIES)) {
      const weight = new Map(sumOf(trousers, measure as keyof typeof REMEDIES)?.terms.map((term) => [term.dimension, term.weight])); // prettier-ignore
      for (const [remedies, sign] of [
        [more, 1],
        [less, -1],
      ] as const)
        for (const { correction } of remedies) {
          const vector = trousers.corrections.find(({ id }) => id === correction)?.vector ?? [];
          const effect = vector.reduce((sum, { dimension, perMm }) => sum + perMm * (weight.get(dimension) ?? 0), 0); // prettier-ignore
          expect(Math.sign(effect), correction).toBe(sign);
        }
      for (const remedies of [more, less])
        if (remedies.length > 0) expect(remedies.reduce((sum, { share }) => sum + share, 0)).toBe(1);
    }
  });
});

describe('habits', () => {
  const fitted = (more: Partial<FittedMeasure>): FittedMeasure => ({ garment: 'Grey pair', maker: 'Own block', cloth: 'woven', waist: 'navel', measure: 'back-crotch-length', valueMm: 372, ...more }); // prettier-ignore
  const draft = { maker: 'own block ', cloth: 'woven' as const, waist: 'navel' as const, finishedMm: { 'back-crotch-length': 360 } }; // prettier-ignore

  it('a finished measure that fitted is a difference against the same maker’s draft', () => {
    expect(habitsBeside([fitted({}), fitted({ garment: 'Blue pair', valueMm: 376 })], draft)).toMatchObject([{ fittedMm: 374, differenceMm: 14, garments: ['Grey pair', 'Blue pair'] }]); // prettier-ignore
  });

  it.each([
    ['another maker', { maker: 'Someone' }],
    ['a maker nobody named', { maker: '' }],
    ['another kind of cloth', { cloth: 'knit' as const }],
    ['another waist', { waist: 'band' as const }],
    ['a waist nobody named', { waist: null }],
  ])('%s is never compared', (_, more) => {
    expect(habitsBeside([fitted(more)], draft)).toEqual([]);
    expect(habitsBeside([fitted({ maker: '' })], { ...draft, maker: '' })).toEqual([]);
  });
});
