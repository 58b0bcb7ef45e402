import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { CaseInput } from '@/diagnosis/case-schema';
import type { Knowledge } from '@/diagnosis/garments/schema';
import { prepare, solveRound, tailsOf } from '@/diagnosis/inference/beliefs';
import { GRID_FIT } from '@/diagnosis/inference/grid';
import { layoutOf } from '@/diagnosis/inference/layout';
import { priorBeliefs } from '@/diagnosis/inference/prior';
import { sourcesOf, tablesOf } from '@/diagnosis/inference/sources';
import { STRENGTHS } from '@/diagnosis/inference/strengths';
import { arbitraryCase, mirrored } from '@/tests/support/arbitrary-case';
import { numbersOf, parsed, readCase, readFirst } from '@/tests/support/read-case';
import { small } from '@/tests/support/small-knowledge';

const cases = arbitraryCase(small);
const RUNS = { numRuns: 25, seed: 7 };

/** P(beyond tolerance) of a need, both sides' greatest. */
function tail(
  input: Omit<CaseInput, 'garment'>,
  dimension: string,
  direction: 'more' | 'less',
  knowledge: Knowledge = small,
): number {
  const fitting = parsed(knowledge, input);
  const { layout, tables, start } = prepare(knowledge, fitting, STRENGTHS);
  const { marginals } = solveRound(layout, tables, start, fitting);
  const place = layout.index.dimensions.get(dimension)!;
  return Math.max(...layout.ofDimension[place]!.map((v) => tailsOf(layout, place, marginals[v]!)[direction]));
}

function expectClose(a: Map<string, number>, b: Map<string, number>) {
  expect([...b.keys()].sort()).toEqual([...a.keys()].sort());
  for (const [key, value] of a) expect(Math.abs(value - b.get(key)!)).toBeLessThan(1e-9);
}

describe('laws of a reading', { timeout: 60_000 }, () => {
  it('mirrors the answer when left and right change places', () => {
    const leaning = cases.map(({ shape: _, ...rest }) => rest);
    fc.assert(
      fc.property(leaning, (input) => {
        const plain = numbersOf(readFirst(small, input));
        const other = numbersOf(readFirst(small, mirrored(input)));
        const back = new Map([...other].map(([key, value]) => [key.replace(/left|right/g, mirrored), value]));
        expectClose(plain, back);
      }),
      RUNS,
    );
  });

  it('never minds the order of evidence', () => {
    fc.assert(
      fc.property(cases, (input) => {
        const reversed = {
          ...input,
          signs: [...input.signs!].reverse(),
          absent: [...input.absent!].reverse(),
          measured: [...input.measured!].reverse(),
          tests: [...input.tests!].reverse(),
          shape: [...input.shape!].reverse(),
        };
        const [a, b] = [readFirst(small, input), readFirst(small, reversed)];
        expectClose(numbersOf(a), numbersOf(b));
        expect(b.ranked).toEqual(a.ranked);
        expect(b.plan.map(({ correction }) => correction)).toEqual(
          a.plan.map(({ correction }) => correction),
        );
      }),
      RUNS,
    );
  });

  it('never minds the order of evidence in its reasons and checks either', () => {
    fc.assert(
      fc.property(cases, (input) => {
        const reversed = {
          ...input,
          signs: [...input.signs!].reverse(),
          absent: [...input.absent!].reverse(),
        };
        const [a, b] = [readCase(small, input), readCase(small, reversed)];
        expect(b.checks.map(({ check }) => check)).toEqual(a.checks.map(({ check }) => check));
        const reasons = (reading: typeof a) =>
          reading.corrections.map(({ because, against }) =>
            [...because, ...against].map(({ id }) => id).sort(),
          );
        expect(reasons(b)).toEqual(reasons(a));
      }),
      { numRuns: 10, seed: 8 },
    );
  });

  it('gives the same ids in the same order in either unit', () => {
    fc.assert(
      fc.property(cases, (input) => {
        const [mm, inches] = [
          readFirst(small, { ...input, unit: 'mm' }),
          readFirst(small, { ...input, unit: 'in' }),
        ];
        expect(inches.ranked).toEqual(mm.ranked);
        expect(inches.plan).toEqual(mm.plan);
      }),
      RUNS,
    );
  });

  it('never lowers the tail of a need by a pulling sign that it alone makes, never raises it by its absence', () => {
    fc.assert(
      fc.property(cases, fc.constantFrom('both' as const, 'left' as const), (input, side) => {
        const without = {
          ...input,
          signs: input.signs!.filter(({ sign }) => sign !== 'knee-pull'),
          absent: input.absent!.filter((entry) => typeof entry !== 'string' && entry.sign !== 'knee-pull'),
        };
        // A need that is split anyway, so that the side of the sign changes nothing else.
        const base = {
          ...without,
          history: [{ changes: [{ correction: 'add-knee', side: 'left' as const, amountMm: 5 }] }],
        };
        const before = tail(base as CaseInput, 'knee', 'more');
        const signs = (severity: number) => [...base.signs, { sign: 'knee-pull', severity, side }];
        expect(tail({ ...base, signs: signs(3) } as CaseInput, 'knee', 'more')).toBeGreaterThanOrEqual(
          before - 1e-12,
        );
        expect(tail({ ...base, signs: signs(0) } as CaseInput, 'knee', 'more')).toBeLessThanOrEqual(
          before + 1e-12,
        );
      }),
      RUNS,
    );
  });

  it('gives the prior where nothing is known', () => {
    const fitting = parsed(small, {});
    const { layout, tables, start } = prepare(small, fitting, STRENGTHS);
    const { marginals } = solveRound(layout, tables, start, fitting);
    const prior = priorBeliefs(layout, fitting, STRENGTHS);
    marginals.forEach((belief, v) =>
      belief.forEach((p, state) => expect(Math.abs(p - prior[v]![state]!)).toBeLessThan(1e-12)),
    );
  });

  it('leaves only the leak where every need is 0, however many links a sign has', () => {
    const layout = layoutOf(small, parsed(small, {}));
    for (const { links } of small.signs)
      for (const { cumulative, cause } of sourcesOf(layout, tablesOf(STRENGTHS), links, 'both', 1))
        for (const row of cumulative) expect(row[cause ? 0 : GRID_FIT]).toBe(1);
  });

  it('holds the caps, amounts above 0 and every (id, side) once', () => {
    fc.assert(
      fc.property(cases, (input) => {
        const { corrections, ranked, plan } = readFirst(small, input);
        for (const { amountMm, capRoundMm, capTotalMm } of corrections) {
          expect(amountMm!).toBeGreaterThan(0);
          expect(amountMm!).toBeLessThanOrEqual(capRoundMm!);
          expect(capRoundMm!).toBeLessThanOrEqual(capTotalMm!);
        }
        const keys = ranked.map(({ id, side }) => `${id} ${side}`);
        expect(new Set(keys).size).toBe(keys.length);
        expect(plan.length).toBeLessThanOrEqual(3);
      }),
      RUNS,
    );
  });

  it('never plans more in all rounds together than the total cap', () => {
    const history: NonNullable<CaseInput['history']> = [];
    let made = 0;
    for (let round = 0; round < 12; round++) {
      const tests = [{ check: 'open-knee', outcome: 'opens', amountMm: 60 }];
      const { corrections } = readFirst(small, { tests, history });
      const row = corrections.find(({ correction }) => correction === 'add-knee');
      if (!row) break;
      made += row.amountMm!;
      history.push({ tests, changes: [{ correction: 'add-knee', amountMm: row.amountMm! }] });
    }
    expect(made).toBeGreaterThan(37);
    expect(made).toBeLessThanOrEqual(38 + 1e-9);
    const { leftOut } = readFirst(small, { history });
    expect(leftOut.map(({ id }) => id)).toContain('add-knee');
  });

  it('ranks a body that is a tenth larger, with needs a tenth larger, the same', () => {
    fc.assert(
      fc.property(cases, (input) => {
        const larger = scaled({ ...input, body: { hipMm: 1000 } }, 1.1);
        expect(readFirst(small, larger).ranked).toEqual(
          readFirst(small, { ...input, body: { hipMm: 1000 } }).ranked,
        );
      }),
      RUNS,
    );
  });

  it('makes no certainty of ten identical rounds', () => {
    const signs = [{ sign: 'knee-pull', severity: 2 }];
    const history = Array.from({ length: 10 }, () => ({ signs, changes: [] }));
    expect(tail({ garment: 'smock', history } as CaseInput, 'knee', 'more')).toBeLessThan(0.99);
  });

  it('answers contradictory and extreme evidence with finite numbers', () => {
    const both = [{ dimension: 'depth' }, { dimension: 'rise' }];
    const three = [...both, { dimension: 'point', weight: -100 }];
    const reading = readFirst(small, {
      measured: [
        { terms: [{ dimension: 'depth' }], needMm: 90_000, sdMm: 1e-9 },
        { terms: [{ dimension: 'rise' }], needMm: 90_000, sdMm: 1e-9 },
        { terms: both, needMm: -90_000, sdMm: 1e-9 },
        { terms: three, needMm: 1e-300, sdMm: 1e-9 },
      ],
      signs: small.signs.map(({ id }) => ({ sign: id, severity: 3, reliability: 0 })),
      tests: [{ check: 'pinch-seat', outcome: 'clears', amountMm: 1e-300 }],
    });
    const numbers = [...numbersOf(reading).values(), ...reading.needs.flatMap(({ rangeMm }) => rangeMm)];
    expect(numbers.every(Number.isFinite)).toBe(true);
    expect(reading.exact).toBe(false);
  });

  it('leaves the split between two needs open when only their sum is measured', () => {
    const terms = [{ dimension: 'depth' }, { dimension: 'rise' }];
    const input = { garment: 'smock', measured: [{ terms, needMm: 24, sdMm: 4 }] };
    const [depth, rise] = [tail(input, 'depth', 'more'), tail(input, 'rise', 'more')];
    expect(Math.min(depth, rise)).toBeGreaterThan(0.3);
    expect(Math.abs(depth - rise)).toBeLessThan(0.2);
  });

  it('lets the absence of slack say little while a tight width would hide it', () => {
    const tight = { measured: [{ terms: [{ dimension: 'seat' }], needMm: 40, sdMm: 4 }] };
    const drop = (knowledge: Knowledge) =>
      tail(tight, 'rise', 'less', knowledge) -
      tail({ ...tight, absent: ['fold-band'] }, 'rise', 'less', knowledge);
    const bare = { ...small, signs: small.signs.map((sign) => ({ ...sign, maskedBy: [] })) };
    expect(drop(small)).toBeGreaterThan(0);
    expect(drop(small)).toBeLessThan(0.5 * drop(bare));
  });
});

/** Every length of a case, times a factor. */
function scaled<T>(value: T, factor: number, key = ''): T {
  if (typeof value === 'number') return (key.endsWith('Mm') ? value * factor : value) as T;
  if (Array.isArray(value)) return value.map((inner) => scaled<unknown>(inner, factor)) as T;
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value).map(([name, inner]) => [name, scaled<unknown>(inner, factor, name)]),
  ) as T;
}
