import { describe, expect, it } from 'vitest';
import { keptText } from '@/components/chart/kept-text';
import { muslinFrom } from '@/components/cut/muslin-start';
import { snapMm } from '@/components/cut/snap';
import { sittingOf } from '@/components/measuring/last-sitting';
import { openQuestions, answerKey, unreadable, valuesOf } from '@/components/measuring/sitting';
import type { CutDto } from '@/db/queries/cuts';
import { beforeTheCut, type CutFacts, evidenceOf } from '@/diagnosis/before-the-cut/before-the-cut';
import { bodyOf, riseFromSeams } from '@/diagnosis/before-the-cut/body';
import { habitsOf } from '@/diagnosis/before-the-cut/habits';
import { chartsOf } from '@/diagnosis/before-the-cut/sized-pattern';
import type { ChartKind } from '@/diagnosis/chart/chart';
import { parseChart } from '@/diagnosis/chart/parse-chart';
import { withoutAllowances } from '@/diagnosis/flat-check/allowances';
import { knowledgeOf } from '@/diagnosis/garments/registry';

const trousers = knowledgeOf('trousers');
const table = (text: string, kind: ChartKind) => parseChart(text, 'cm').chart.cells.map((cell) => ({ ...cell, kind })); // prettier-ignore
const CHART =
  'Size\tWaist\tHip\tThigh\tBack rise\n10\t72\t98\t56\t34\n12\t76\t102\t58\t34.5\n14\t80\t106\t60\t35';
const set = (values: Record<string, number>, more: Partial<CutFacts['sets'][number]> = {}): CutFacts['sets'][number] => ({
  takenAlone: false,
  waistPlace: 'navel',
  values: Object.entries(values).map(([measure, valueMm]) => ({ measure, valueMm })),
  ...more,
}); // prettier-ignore
const facts = (more: Partial<CutFacts>): CutFacts => ({
  sets: [], cells: table(CHART, 'body'), clothKind: 'woven', stretchPercent: 0, sizes: {}, patternWaist: 'navel', easeMm: {}, gauge: {}, altered: [], leftOut: [], ...more,
}); // prettier-ignore
const read = (more: Partial<CutFacts>) => beforeTheCut(trousers, facts(more));

describe('the body as it was last measured', () => {
  it('takes each measure from the newest sitting that has it, and waist lengths from the pattern’s waist', () => {
    const sets = [set({ hip: 1010, waist: 700 }, { waistPlace: 'narrowest' }), set({ hip: 1000, waist: 800, thigh: 590 })]; // prettier-ignore
    const body = bodyOf(sets, 'navel');
    expect([body.hip?.meanMm, body.waist?.meanMm, body.thigh?.meanMm]).toEqual([1010, 800, 590]);
    expect(bodyOf(sets, 'narrowest').waist?.meanMm).toBe(700);
    expect(bodyOf(sets, null).waist).toMatchObject({ meanMm: 700, waist: 'narrowest' });
  });

  // D02, metric plain-front draft: outside leg 102, inside 76, rise 26 cm; D07: body rise is side seam less inside leg.
  it('has the tailor’s rise where nobody sat down: 102 less 76 is 26', () => {
    const body = bodyOf([set({ outseam: 1020, inseam: 760 })], 'navel');
    expect(body['seated-depth']).toMatchObject({ meanMm: 260, sdMm: Math.hypot(10, 8) });
    expect(bodyOf([set({ outseam: 1020, inseam: 760, 'seated-depth': 270 })], 'navel')['seated-depth']?.meanMm).toBe(270); // prettier-ignore
    expect(riseFromSeams({})).toBeNull();
  });
});

describe('the tables of a pattern', () => {
  it('a measure of the paper goes before a printed finished one, of its own size alone', () => {
    const cells = [...table(CHART, 'body'), ...table('Size\tHip\n10\t104\n12\t108', 'finished'), ...table('Size\tHip\n12\t107', 'paper')]; // prettier-ignore
    const { garment } = chartsOf(cells);
    expect(garment.cells.filter(({ measure }) => measure === 'hip').map(({ size, valueMm }) => [size, valueMm]).sort()).toEqual([['10', 1040], ['12', 1070]]); // prettier-ignore
  });

  it('allowances are taken out of paper measures, and never more than there is', () => {
    const { chart } = parseChart('Size\tHip\tBack rise\n12\t119\t38', 'cm');
    expect(withoutAllowances(chart, 15)?.cells.map(({ valueMm }) => valueMm)).toEqual([1070, 350]);
    expect(withoutAllowances(chart, 200)).toBeNull();
  });

  it('a kept table is written out as text that reads the same again', () => {
    const cells = table('Size\tHip\tThigh\nS\t88-92\t\nM\t37 in\t56', 'body').map((cell) => ({ ...cell, sizeOrdinal: 0 })); // prettier-ignore
    const again = parseChart(keptText(cells, 'body', 'cm'), 'cm');
    expect(again.problems).toEqual([]);
    const plain = (
      all: readonly { size: string; measure: string; valueMm: number; untilMm: number | null }[],
    ) => all.map(({ size, measure, valueMm, untilMm }) => [size, measure, valueMm, untilMm]).sort();
    expect(plain(again.chart.cells)).toEqual(plain(cells));
    expect(keptText(cells, 'paper', 'cm')).toBe('');
  });
});

describe('before the cut', () => {
  const sets = [set({ waist: 770, hip: 1022, thigh: 581, 'back-crotch-length': 385 })];

  it('chooses, blends and compares at the size of each level', () => {
    const cut = read({ sets });
    expect(cut.sizes.base?.size).toBe('12');
    expect(cut.blends).toEqual([]);
    expect(cut.differences.map(({ measure, needMm, kind }) => [measure, needMm, kind])).toEqual([
      ['waist', 10, 'short'], ['hip', 2, 'within'], ['back-crotch-length', 40, 'short'], ['thigh', 1, 'within'],
    ]); // prettier-ignore
  });

  it('keeps a size chosen by hand, at one level or as the base, unless the chart no longer has it', () => {
    const cut = read({ sets, sizes: { base: { size: '14', steps: 0 }, waist: { size: '10', steps: 0 } } });
    expect([cut.sizes.base?.size, cut.sizes.at('waist')?.size, cut.sizes.at('back-crotch-length')?.size]).toEqual(['14', '10', '14']); // prettier-ignore
    expect(cut.blends.find(({ measure }) => measure === 'waist')).toMatchObject({ roundMm: -80, perEdgeMm: -20 }); // prettier-ignore
    expect(read({ sets, sizes: { base: { size: '99', steps: 0 } } }).sizes.base?.size).toBe('12');
  });

  it('what was altered on the paper first is no need any more; what was left out is no evidence', () => {
    const back = (more: Partial<CutFacts>) => evidenceOf(read({ sets, ...more })).find(({ measure }) => measure === 'back-crotch-length'); // prettier-ignore
    expect(back({})?.needMm).toBe(40);
    // Two thirds of 40 are past what one alteration may be: the wedge stops at its cap of 19 mm.
    expect(back({ altered: ['back-crotch-length'] })?.needMm).toBeCloseTo(40 - 19 * 1.022, 6);
    expect(back({ leftOut: ['back-crotch-length'] })).toBeUndefined();
  });

  it('reads the gauge with and without a rest, and not before it was pulled', () => {
    expect(read({ gauge: { relaxed: 100 } }).cloth).toBeNull();
    expect(read({ gauge: { relaxed: 100, pulled: 90 } }).cloth).toBeNull();
    expect(read({ stretchPercent: 25, clothKind: 'knit', gauge: { relaxed: 100, pulled: 125 } }).cloth?.kind).toBe('suits'); // prettier-ignore
    expect(read({ stretchPercent: 25, clothKind: 'knit', gauge: { relaxed: 100, pulled: 125, rested: 110 } }).cloth?.cautions).toHaveLength(2); // prettier-ignore
  });

  it('an empty pattern and an empty body say nothing and break nothing', () => {
    expect(read({ cells: [] })).toMatchObject({
      differences: [],
      blends: [],
      levels: [],
      sizes: { base: null },
    });
    expect(read({ sets: [] }).sizes.base?.size).toBe('10');
  });

  it('habits are held against the draft at the size that is cut', () => {
    const cut = read({ sets, cells: [...table(CHART, 'body'), ...table('Size\tBack rise\n10\t35\n12\t36\n14\t37', 'paper')] }); // prettier-ignore
    const fitted = { garment: 'Grey pair', maker: 'Own block', cloth: 'woven', waist: 'navel', measure: 'back-crotch-length', valueMm: 372 } as const; // prettier-ignore
    const draft = {
      maker: 'Own block',
      clothKind: 'woven' as const,
      choices: { patternWaist: 'navel' as const },
    };
    expect(habitsOf({ ...draft, fittedElsewhere: [fitted, { ...fitted, measure: 'gone' }] }, cut)).toMatchObject([{ differenceMm: 12 }]); // prettier-ignore
  });

  it('the first muslin starts from what was decided', () => {
    const dto = { garment: 'trousers', ...facts({ sets }), choices: { sizes: { waist: { size: '14', steps: 0 } }, patternWaist: 'navel', ease: {}, gauge: {}, altered: ['hip'], leftOut: [], cut: 'shorts' } } as unknown as CutDto; // prettier-ignore
    const start = { cut: 'full', cloth: '', clothKind: 'knit', stretchPercent: 9, isOnGrain: true, size: '', isStraightFromDraft: true } as const; // prettier-ignore
    expect(muslinFrom(dto, start)).toMatchObject({ cut: 'shorts', clothKind: 'woven', stretchPercent: 0, size: '12, waist 14', isStraightFromDraft: false }); // prettier-ignore
  });
});

describe('a sitting', () => {
  it('sends what was typed, takes counted, blanks left out', () => {
    expect(valuesOf({ hip: ['102', ' ', '102.4'], waist: [''] })).toEqual([{ measure: 'hip', take: 1, typed: '102' }, { measure: 'hip', take: 2, typed: '102.4' }]); // prettier-ignore
    expect(unreadable(['102', 'ten'], 'cm')).toMatch(/not a length/);
  });

  it('asks once: an answer holds for what was typed, and another length is asked about anew', () => {
    const sitting = { hip: ['40'] };
    expect(openQuestions(sitting, 'cm', 'navel', [])).toHaveLength(1);
    expect(openQuestions(sitting, 'cm', 'navel', [answerKey('hip', sitting)])).toEqual([]);
    expect(openQuestions({ hip: ['41'] }, 'cm', 'navel', [answerKey('hip', sitting)])).toHaveLength(1);
    expect(openQuestions({ hip: ['40 in'] }, 'cm', 'navel', [])).toEqual([]);
  });

  it('copies the last one with its units written out, takes in order', () => {
    const values = [{ measure: 'hip', take: 2, valueMm: 1024, typed: '102.4' }, { measure: 'hip', take: 1, valueMm: 1020, typed: '102' }, { measure: 'waist', take: 1, valueMm: 723.9, typed: '28 1/2 in' }, { measure: 'gone', take: 1, valueMm: 1, typed: '1' }]; // prettier-ignore
    expect(sittingOf(values, 'cm')).toEqual({ hip: ['102 cm', '102.4 cm'], waist: ['28 1/2 in'] });
  });
});

describe('an amount to cut', () => {
  it('goes up to the tick where cloth is added, down where it is taken', () => {
    expect([snapMm(3.2, 'cm', true), snapMm(3.8, 'cm', false), snapMm(12.7, 'in', true)]).toEqual([
      4, 3, 12.7,
    ]);
    expect(snapMm(13, 'in', true)).toBeCloseTo(14.2875, 9);
    expect(snapMm(13, 'in', false)).toBeCloseTo(12.7, 9);
  });
});
