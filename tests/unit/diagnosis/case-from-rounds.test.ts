import { describe, expect, it } from 'vitest';
import { parseCase } from '@/diagnosis/case';
import { caseFromRounds, type RoundFacts, type WearerFacts } from '@/diagnosis/case-from-rounds';
import { trousers } from '@/diagnosis/garments/trousers';

const WEARER: WearerFacts = { fittedFor: 'both', shape: ['round-seat'], body: { hip: 1120, waist: 900 } };
const round = (facts: Partial<RoundFacts> = {}): RoundFacts => ({
  number: 1, begun: 'new-cloth', cut: 'full', clothKind: 'woven', stretchPercent: 0,
  signs: [], checks: [], causes: [], measured: [], changes: [], ...facts,
}); // prettier-ignore
const sign = (severity: number, isOwner = true) => ({ sign: 'slack-under-seat', side: 'both' as const, severity, isOwner }); // prettier-ignore
const change = (madeAt: string | null, madeMm: number | null = 10) => ({ correction: 'shorten-depth', side: 'both' as const, basis: 'piece' as const, madeMm, madeAt }); // prettier-ignore

describe('the case of a journal’s round', () => {
  it('is one that the engine takes, whatever the rounds hold', () => {
    const made = caseFromRounds('trousers', WEARER, [
      round({ signs: [sign(2)], changes: [change('2026-01-01')] }),
      round({ number: 2, begun: 're-baste', signs: [sign(0)], causes: [{ cause: 'stance', isPresent: false, isOwner: true }] }), // prettier-ignore
    ]);
    expect(parseCase(trousers, made)).toMatchObject({ ok: true });
  });

  it('has the last round as its own evidence and the others as history, with how the next began', () => {
    const made = caseFromRounds('trousers', WEARER, [
      round({ signs: [sign(3)], changes: [change('2026-01-01')] }),
      round({ number: 2, begun: 'patch', signs: [sign(1)] }),
    ]);
    expect(made.signs).toEqual([{ sign: 'slack-under-seat', side: 'both', severity: 1 }]);
    expect(made.history).toMatchObject([
      { signs: [{ severity: 3 }], changes: [{ correction: 'shorten-depth', amountMm: 10 }], next: 'patch' },
    ]);
    expect(made.body).toEqual({ hipMm: 1120, waistMm: 900 });
  });

  it('takes a look that found nothing as looked, not there', () => {
    const made = caseFromRounds('trousers', WEARER, [round({ signs: [sign(0)] })]);
    expect([made.signs, made.absent]).toEqual([[], [{ sign: 'slack-under-seat', side: 'both' }]]);
  });

  it('leaves out a change that nobody said was made', () => {
    const made = caseFromRounds('trousers', WEARER, [
      round({ changes: [change(null)] }),
      round({ number: 2 }),
    ]);
    expect(made.history?.[0]?.changes).toEqual([]);
  });

  it('lets the fitter’s word stand where owner and fitter both speak', () => {
    const facts = [sign(1, true), sign(3, false)];
    for (const signs of [facts, [...facts].reverse()])
      expect(caseFromRounds('trousers', WEARER, [round({ signs })]).signs).toMatchObject([{ severity: 3 }]);
  });

  it('keeps the newest 24 rounds of a long history', () => {
    const many = Array.from({ length: 40 }, (_, i) =>
      round({ number: i + 1, signs: [sign(i < 20 ? 1 : 2)] }),
    );
    const { history } = caseFromRounds('trousers', WEARER, many);
    expect(history).toHaveLength(24);
    expect(parseCase(trousers, caseFromRounds('trousers', WEARER, many)).ok).toBe(true);
  });

  it('wants a round to read', () => {
    expect(() => caseFromRounds('trousers', WEARER, [])).toThrow(RangeError);
  });
});
