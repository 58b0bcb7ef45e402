import { describe, expect, it } from 'vitest';
import type { CaseInput } from '@/diagnosis/case-schema';
import type { Correction, Knowledge } from '@/diagnosis/garments/schema';
import { amountText } from '@/diagnosis/planning/amount-text';
import { wordOf } from '@/diagnosis/planning/words';
import { readCase } from '@/tests/support/read-case';
import { correction, small } from '@/tests/support/small-knowledge';

type Evidence = Omit<CaseInput, 'garment'>;

function measured(dimension: string, needMm: number, side: 'both' | 'left' | 'right' = 'both') {
  return { terms: [{ dimension, side }], needMm, sdMm: 3 };
}

/** The small garment with some corrections changed. */
function changed(change: (one: Correction) => Partial<Correction>): Knowledge {
  return { ...small, corrections: small.corrections.map((one) => ({ ...one, ...change(one) })) };
}

const planned = (knowledge: Knowledge, input: Evidence) =>
  readCase(knowledge, input).plan.map(({ correction: id, side }) => (side === 'both' ? id : `${id} ${side}`));

describe('a plan', () => {
  it('takes nothing out while something tight is still to be let out, and says so', () => {
    const { plan, leftOut } = readCase(small, { measured: [measured('seat', 30), measured('depth', -20)] });
    expect(plan.map(({ correction: id }) => id)).toEqual(['add-seat']);
    expect(leftOut.find(({ id }) => id === 'take-depth')!.why).toMatch(/seat is still tight/);
  });

  it('adds beside letting out', () => {
    expect(planned(small, { measured: [measured('seat', 30), measured('depth', 20)] })).toEqual([
      'add-seat',
      'add-depth',
    ]);
  });

  it('never puts two changes together that hide each other', () => {
    const knowledge = changed(({ id }) => (id === 'add-depth' ? { neverWith: ['add-rise'] } : {}));
    const both = { measured: [measured('depth', 20), measured('rise', 12)] };
    expect(planned(small, both)).toHaveLength(2);
    expect(planned(knowledge, both)).toHaveLength(1);
  });

  it('makes one change of the back crotch seam in a try-on', () => {
    const knowledge = changed(({ id }) =>
      ['add-point', 'add-rise'].includes(id) ? { seam: 'back-crotch' as const } : {},
    );
    expect(planned(knowledge, { measured: [measured('point', 10), measured('rise', 12)] })).toHaveLength(1);
  });

  it('makes three changes at the most', () => {
    const all = ['depth', 'rise', 'point', 'knee', 'leg'].map((id) => measured(id, 25));
    const { plan, leftOut } = readCase(small, { measured: all });
    expect(plan).toHaveLength(3);
    expect(leftOut.map(({ why }) => why)).toContain('Three changes are enough for one try-on.');
  });

  it('changes the leg that needs it', () => {
    expect(
      planned(small, { measured: [measured('knee', 25, 'left'), measured('knee', 0, 'right')] }),
    ).toEqual(['add-knee left']);
  });

  it('settles a likely cause before a change that would look the same', () => {
    const { plan, leftOut } = readCase(small, {
      causes: { present: ['untrimmed'] },
      signs: [{ sign: 'taut-rise', severity: 2 }],
      measured: [measured('depth', 20), measured('knee', 20)],
    });
    expect(plan.map(({ correction: id }) => id)).toEqual(['add-knee']);
    expect(leftOut.find(({ id }) => id === 'add-depth')!.why).toMatch(/First settle this: untrimmed curve/);
  });

  it('asks for the muslin that its most demanding change needs', () => {
    const knowledge = changed(({ id }) => (id === 'add-depth' ? { muslin: 'new-cloth' as const } : {}));
    expect(readCase(knowledge, { measured: [measured('depth', 20)] }).muslin).toBe('new-cloth');
    expect(readCase(knowledge, { measured: [measured('depth', -20)] }).muslin).toBe('re-baste');
  });
});

describe('an amount', () => {
  const rowOf = (input: Evidence, id: string) =>
    readCase(small, input).corrections.find((row) => row.correction === id)!;

  it('is the smaller of the first amount and two thirds of the estimate, while the estimate is wide', () => {
    const row = rowOf({ signs: [{ sign: 'seat-lines', severity: 3 }] }, 'add-seat');
    expect(row.amountMm).toBeLessThanOrEqual(row.firstMm!);
  });

  it('follows a firm measurement up to the cap of the round', () => {
    expect(rowOf({ measured: [measured('depth', 15)] }, 'add-depth').amountMm).toBeGreaterThan(10);
    expect(rowOf({ measured: [measured('depth', 30)] }, 'add-depth').amountMm).toBe(19);
  });

  it('names another draft or size past the total cap instead of clipping silently', () => {
    expect(rowOf({ measured: [measured('depth', 30)] }, 'add-depth').beyond).toBeNull();
    expect(rowOf({ measured: [measured('depth', 50)] }, 'add-depth').beyond).toBe('another-draft');
    const girth = changed((one) => ({ amounts: { ...one.amounts!, sizeLevel: 'hip' } }));
    const [row] = readCase(girth, { measured: [measured('seat', 60)] }).corrections;
    expect(row).toMatchObject({ correction: 'add-seat', beyond: 'another-size' });
  });

  it('grows with the body, as its caps do', () => {
    const row = rowOf({ body: { hipMm: 1200 }, measured: [measured('depth', 60)] }, 'add-depth');
    expect(row.capRoundMm).toBeCloseTo(19 * 1.2, 9);
    expect(row.amountMm).toBeCloseTo(19 * 1.2, 9);
  });

  it('is null, as its caps are, where the change is no length', () => {
    const knowledge = {
      ...small,
      corrections: [
        correction('recut', [{ dimension: 'leg', perMm: 1, coupling: false }], { amounts: null }),
      ],
    };
    const [row] = readCase(knowledge, { signs: [{ sign: 'leg-twist', severity: 3 }] }).corrections;
    expect([row!.amountMm, row!.firstMm, row!.capRoundMm, row!.capTotalMm]).toEqual([null, null, null, null]);
    expect(row!.score).toBeGreaterThan(0);
  });

  it.each([
    [5, 'mm', '5 mm on each of 4 edges = 20 mm round'],
    [12.7, 'in', '1/2 in on each of 4 edges = 2 in round'],
    [4, 'cm', '0.4 cm on each of 4 edges = 1.6 cm round'],
  ] as const)('of %d mm an edge is shown in %s with a sum that adds up', (mm, unit, text) => {
    const edges = correction('let-out', [], {
      amounts: { ...small.corrections[0]!.amounts!, basis: 'edge', conversions: { round: 0.25 } },
    });
    expect(amountText(mm, edges, unit)).toBe(text);
  });
});

describe('checks', () => {
  it('are ranked with the separating one first, and none that was done', () => {
    const marks = { signs: [{ sign: 'seat-folds', severity: 2 }] };
    expect(readCase(small, marks).checks[0]!.check).toBe('stand-again');
    const after = { ...marks, tests: [{ check: 'stand-again', outcome: 'same' }] };
    expect(readCase(small, after).checks.map(({ check }) => check)).not.toContain('stand-again');
  });

  it('are not asked for when no outcome would change what to do', () => {
    const sure = ['depth', 'rise', 'point', 'seat', 'knee', 'leg'].map((id) =>
      measured(id, id === 'seat' ? 40 : 0),
    );
    expect(
      readCase(small, { measured: sure, causes: { present: [], absent: ['stance', 'untrimmed'] } }).checks,
    ).toEqual([]);
  });
});

describe('doubt', () => {
  it('is high where a sign has nothing to explain it', () => {
    const none = ['depth', 'rise', 'point', 'seat', 'knee', 'leg'].map((id) => measured(id, 0));
    const { doubt } = readCase(small, { measured: none, signs: [{ sign: 'knee-pull', severity: 3 }] });
    expect(doubt.level).toBe('high');
    expect(doubt.why).toContain('knee-pull');
  });

  it('is gone where a check agrees with the marks', () => {
    const { doubt } = readCase(small, {
      signs: [{ sign: 'knee-pull', severity: 3 }],
      tests: [{ check: 'open-knee', outcome: 'opens' }],
    });
    expect(doubt.level).toBe('none');
  });

  it('stays while marks stand alone', () => {
    expect(readCase(small, { signs: [{ sign: 'knee-pull', severity: 3 }] }).doubt.level).not.toBe('none');
  });
});

describe('reasons', () => {
  it('name the evidence for and against, with its sources', () => {
    const { corrections } = readCase(small, {
      signs: [{ sign: 'seat-lines', severity: 2 }],
      tests: [{ check: 'pinch-seat', outcome: 'clears' }],
    });
    const row = corrections.find(({ correction: id }) => id === 'add-seat')!;
    expect(row.because[0]).toMatchObject({ kind: 'sign', id: 'seat-lines', sources: ['common practice'] });
    expect(row.against[0]).toMatchObject({ kind: 'test', id: 'pinch-seat' });
    expect(row.because[0]!.logOdds).toBeGreaterThan(0);
    expect(row.against[0]!.logOdds).toBeLessThan(0);
  });
});

describe('words', () => {
  it('are likely from 0.70, possible from 0.35, never likely while capped', () => {
    expect([0.7, 0.69, 0.35, 0.34].map((p) => wordOf(p, false))).toEqual([
      'likely',
      'possible',
      'possible',
      'less likely',
    ]);
    expect(wordOf(0.99, true)).toBe('possible');
  });
});
