import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { MEASURE_IDS, MEASURES, measureOf } from '@/diagnosis/measuring/measures';
import { questionsFor } from '@/diagnosis/measuring/questions';
import { RELATIONS, usualSpan } from '@/diagnosis/measuring/relations';
import { combineTakes } from '@/diagnosis/measuring/takes';

const bare = (mm: number) => ({ mm, isUnitWritten: false });

describe('the list of measures', () => {
  it('has each id once, in one order, with words, an error and a span around it', () => {
    expect(MEASURES.map(({ id }) => id)).toEqual([...MEASURE_IDS]);
    for (const { how, tapeSdMm, usualMm, sources } of MEASURES) {
      expect(how).toMatch(/\.$/);
      expect(tapeSdMm).toBeGreaterThan(0);
      expect(usualMm.to).toBeGreaterThan(usualMm.from);
      expect(sources.length).toBeGreaterThan(0);
    }
  });

  // Common practice, one standard deviation in mm: waist, hip, thigh 8, knee 6, calf 5, seated depth 10, whole crotch 18, its split 15, inseam 8.
  it.each([
    ['waist', 8], ['hip', 8], ['thigh', 8], ['knee', 6], ['calf', 5], ['seated-depth', 10],
    ['crotch-length', 18], ['front-crotch-length', 15], ['back-crotch-length', 15], ['inseam', 8],
  ] as const)('%s has an error of %d mm', (id, sdMm) => {
    expect(measureOf(id).tapeSdMm).toBe(sdMm);
  }); // prettier-ignore
});

describe('repeated takes', () => {
  it('one take has the error of the tape, half as much again when alone', () => {
    expect(combineTakes('hip', [1000], false)).toEqual({ meanMm: 1000, spreadMm: null, sdMm: 8, takes: 1 });
    expect(combineTakes('hip', [1000], true).sdMm).toBe(12);
  });

  it('takes that scatter more than the tape raise the error', () => {
    expect(combineTakes('hip', [980, 1020], false).spreadMm).toBeCloseTo(28.284, 3);
    expect(combineTakes('hip', [980, 1020], false).sdMm).toBeCloseTo(20, 6);
  });

  it('laws: the mean lies among the takes, alone is never surer, repeating never makes it worse than one tape nor certain', () => {
    const takes = fc.array(fc.double({ min: 300, max: 1500, noNaN: true }), { minLength: 1, maxLength: 9 });
    fc.assert(
      fc.property(takes, fc.constantFrom(...MEASURE_IDS), (values, id) => {
        const taken = combineTakes(id, values, false);
        expect(taken.meanMm).toBeGreaterThanOrEqual(Math.min(...values) - 1e-9);
        expect(taken.meanMm).toBeLessThanOrEqual(Math.max(...values) + 1e-9);
        expect(combineTakes(id, values, true).sdMm).toBeGreaterThanOrEqual(taken.sdMm);
        expect(taken.sdMm).toBeGreaterThanOrEqual(0.6 * measureOf(id).tapeSdMm - 1e-9);
        expect(combineTakes(id, [...values].reverse(), false).sdMm).toBeCloseTo(taken.sdMm, 9);
      }),
    );
  });
});

describe('questions', () => {
  it('an inch in a centimetre field is asked about, and never converted', () => {
    const [question] = questionsFor({ hip: bare(400) }, 'cm', 'navel');
    expect(question).toMatchObject({ kind: 'other-unit', measure: 'hip', unit: 'in', otherMm: 1016 });
    expect(question?.message).toBe('Hip: is this in inches? The field takes centimetres.');
  });

  it('a centimetre in an inch field too; a unit that was written is believed', () => {
    expect(questionsFor({ hip: bare(102 * 25.4) }, 'in', 'navel')).toMatchObject([{ kind: 'other-unit', unit: 'cm' }]); // prettier-ignore
    expect(questionsFor({ hip: { mm: 400, isUnitWritten: true } }, 'cm', 'navel')).toMatchObject([{ kind: 'far-out' }]); // prettier-ignore
  });

  // ANSUR II, women (B25): thigh = 0.69092 hip − 89.45, residual 19.114; at hip 1000 it is 601.5 ± 57.
  it('hip predicts thigh: 601 beside a hip of 1000 is usual, 700 and 500 are asked about', () => {
    expect(questionsFor({ hip: bare(1000), thigh: bare(601) }, 'cm', 'navel')).toEqual([]);
    for (const mm of [700, 500])
      expect(questionsFor({ hip: bare(1000), thigh: bare(mm) }, 'cm', 'navel')).toMatchObject([{ kind: 'unusual', measure: 'thigh', beside: 'hip' }]); // prettier-ignore
  });

  it('hip hardly predicts the rise (r 0.09, B24): no rise is questioned by a girth', () => {
    expect(RELATIONS.filter(({ of }) => of === 'seated-depth')).toEqual([]);
    expect(questionsFor({ hip: bare(1000), 'seated-depth': bare(180) }, 'cm', 'navel')).toEqual([]);
    expect(questionsFor({ hip: bare(1000), 'seated-depth': bare(400) }, 'cm', 'navel')).toEqual([]);
  });

  it('a waist from elsewhere than the navel is not held against the survey, whose waist is there', () => {
    const entries = { waist: bare(600), hip: bare(1150) };
    expect(questionsFor(entries, 'cm', 'navel')).toHaveLength(1);
    expect(questionsFor(entries, 'cm', 'narrowest')).toEqual([]);
  });

  it('law: each measure is asked about once at most, and larger bodies get a wider span', () => {
    fc.assert(
      fc.property(fc.dictionary(fc.constantFrom(...MEASURE_IDS), fc.integer({ min: 1, max: 3000 }).map(bare)), (entries) => {
        const asked = questionsFor(entries, 'cm', 'navel').map(({ measure }) => measure);
        expect(new Set(asked).size).toBe(asked.length);
      }),
    ); // prettier-ignore
    for (const relation of RELATIONS) {
      const width = (mm: number) => usualSpan(relation, mm).toMm - usualSpan(relation, mm).fromMm;
      expect(width(relation.centreMm * 1.5)).toBeGreaterThan(width(relation.centreMm));
    }
  });
});
