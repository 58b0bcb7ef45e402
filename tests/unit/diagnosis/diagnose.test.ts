import { describe, expect, it } from 'vitest';
import type { CaseInput } from '@/diagnosis/case-schema';
import { startReading } from '@/diagnosis/diagnose';
import { parsed, readCase } from '@/tests/support/read-case';
import { small } from '@/tests/support/small-knowledge';

const read = (input: Omit<CaseInput, 'garment'>) => readCase(small, input);

describe('a reading', () => {
  it('plans nothing without evidence', () => {
    const reading = read({});
    expect(reading.plan).toEqual([]);
    expect(reading.ranked).toEqual([]);
    expect(reading.doubt.level).toBe('high');
    expect(reading.needs.length).toBeGreaterThanOrEqual(5);
  });

  it('calls nothing likely from marks alone, and plans no amount above the first', () => {
    const signs = small.signs.map(({ id }) => ({ sign: id, severity: 3 }));
    const reading = read({ signs });
    expect(
      [...reading.needs, ...reading.causes, ...reading.corrections].map(({ word }) => word),
    ).not.toContain('likely');
    for (const row of reading.corrections) expect(row.amountMm!).toBeLessThanOrEqual(row.firstMm!);
  });

  it('takes a pinch at its depth twice, times its places', () => {
    const reading = read({
      tests: [{ check: 'pinch-seat', outcome: 'clears', amountMm: 12, basis: 'pinch', places: 2 }],
    });
    const [first] = reading.needs;
    expect(first).toMatchObject({ dimension: 'seat', direction: 'less', word: 'likely', basis: 'round' });
    expect(first!.rangeMm[0]).toBeLessThanOrEqual(-48);
    expect(first!.rangeMm[1]).toBeGreaterThanOrEqual(-48);
    expect(reading.ranked[0]).toEqual({ kind: 'correction', id: 'take-seat', side: 'both' });
  });

  it('puts a likely cause that is no length before any correction, and settles it first', () => {
    const reading = read({
      signs: [
        { sign: 'taut-rise', severity: 2 },
        { sign: 'fork-lines', severity: 2 },
      ],
    });
    expect(reading.ranked[0]).toEqual({ kind: 'cause', id: 'untrimmed', side: 'both' });
    expect(reading.plan).toEqual([]);
  });

  it('gives the same needs, plan and order first and finished; only reasons and checks are added', () => {
    const { first, finish } = startReading(
      small,
      parsed(small, { signs: [{ sign: 'seat-lines', severity: 2 }] }),
    );
    const whole = finish();
    expect(whole.needs).toEqual(first.needs);
    expect(whole.plan).toEqual(first.plan);
    expect(whole.ranked).toEqual(first.ranked);
    expect(first.corrections.every(({ because }) => because.length === 0)).toBe(true);
    expect(whole.corrections[0]!.because[0]).toMatchObject({ kind: 'sign', id: 'seat-lines' });
  });
});
