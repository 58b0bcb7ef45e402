import { describe, expect, it } from 'vitest';
import { cuttingSheet, SHEET_LINE_IDS, type SheetFacts } from '@/diagnosis/cutting/sheet';

const plain: SheetFacts = { cloth: 'woven', cut: 'shorts', isNarrowLeg: false };
const ids = (facts: Partial<SheetFacts>) => cuttingSheet({ ...plain, ...facts }).map(({ id }) => id);

describe('the cutting and marking sheet', () => {
  it('names no line twice', () => {
    expect(new Set(SHEET_LINE_IDS).size).toBe(SHEET_LINE_IDS.length);
  });

  it('lets a straight woven leg end above the knee, and never a narrow or a stretch one', () => {
    expect(ids({})).toContain('as-shorts');
    expect(ids({ cut: 'full' }).filter((id) => /shorts|full-legs/.test(id))).toEqual(['full-legs']);
    for (const facts of [{ isNarrowLeg: true }, { cloth: 'knit' as const }, { cloth: 'stretch-woven' as const }])
      expect(ids(facts).filter((id) => id.endsWith('as-shorts'))).toEqual(['not-as-shorts']);
  }); // prettier-ignore

  it('says of shorts what then cannot be read, and always asks for one full length before the good cloth', () => {
    expect(cuttingSheet(plain).find(({ id }) => id === 'as-shorts')?.why).toMatch(/knee, calf, swing and hem cannot/); // prettier-ignore
    expect(ids({})).toContain('full-length-once');
    expect(ids({ cut: 'full' })).toContain('full-length-once');
  });

  it('speaks of stretch only where there is some', () => {
    expect(ids({})).not.toContain('stretch-across');
    expect(ids({ cloth: 'knit' })).toEqual(
      expect.arrayContaining(['stretch-across', 'like-stretch', 'half-hour']),
    );
  });

  it('gives 25 mm where it may be let out and 10 mm in the curve', () => {
    const text = cuttingSheet(plain).map((line) => line.text).join(' '); // prettier-ignore
    expect(text).toContain('25 mm (1 in)');
    expect(text).toContain('10 mm (3/8 in) in the crotch curve');
  });
});
