import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseAmount } from '@/diagnosis/units/parse-amount';
import { amountText, tickMm } from '@/diagnosis/units/print-amount';

const mmOf = (text: string, unit: 'cm' | 'in') => {
  const parsed = parseAmount(text, unit);
  return parsed.kind === 'amount' ? parsed.mm : parsed.kind;
};

describe('an amount is read as people type it', () => {
  // 1 in = 25.4 mm exactly: international yard and pound agreement, 1959 (common knowledge, from memory).
  it.each([
    ['1 3/8', 'in', 34.925],
    ['1⅜"', 'in', 34.925],
    ['1⅜″', 'cm', 34.925],
    ['1-3/8 in', 'cm', 34.925],
    ['3,5 cm', 'in', 35],
    ['35mm', 'in', 35],
    ['.5', 'in', 12.7],
    ['½', 'in', 12.7],
    ['3.5', 'cm', 35],
    ['2 inches', 'cm', 50.8],
    ['3/16 in.', 'cm', 4.7625],
    ['102 cm', 'in', 1020],
  ] as const)('%s in %s is %d mm', (text, unit, mm) => {
    expect(mmOf(text, unit)).toBeCloseTo(mm, 9);
  });

  it.each(['1,234.5', '1.234,5', '1.234.567'])('%s has two readings and is refused', (text) => {
    expect(mmOf(text, 'cm')).toBe('two-readings');
  });

  it.each([
    '',
    'abc',
    '1/0',
    '-3',
    '12 parsecs',
    '1e999',
    '99999 m',
    '1 2 3',
    'x'.repeat(25),
    '<b>1</b>',
    '１２',
  ])('%j is not a length', (text) => {
    expect(mmOf(text, 'cm')).toBe('unreadable');
  });
});

describe('an amount is printed as a tape shows it', () => {
  it.each([
    [12.7, 'in', '1/2 in'],
    [34.925, 'in', '1 3/8 in'],
    [50.8, 'in', '2 in'],
    [1.5875, 'in', '1/16 in'],
    [0, 'in', '0 in'],
    [12, 'cm', '12 mm'],
    [1020, 'cm', '102 cm'],
    [372.4, 'cm', '37.2 cm'],
  ] as const)('%d mm in %s is %s', (mm, unit, text) => {
    expect(amountText(mm, unit)).toBe(text);
  });

  it('reads back to within half a tick of what it was, in either unit', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 1500, noNaN: true }),
        fc.constantFrom('cm' as const, 'in' as const),
        (mm, unit) => {
          const back = parseAmount(amountText(mm, unit), unit);
          return back.kind === 'amount' && Math.abs(back.mm - mm) <= tickMm(unit, mm) / 2 + 1e-9;
        },
      ),
    );
  });

  it('rounds cloth that is wanted up and cloth that is taken down', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 90, noNaN: true }),
        fc.constantFrom('cm' as const, 'in' as const),
        (mm, unit) => {
          const read = (text: string) => {
            const parsed = parseAmount(text, unit);
            return parsed.kind === 'amount' ? parsed.mm : NaN;
          };
          expect(read(amountText(mm, unit, 'up'))).toBeGreaterThanOrEqual(mm - 1e-6);
          expect(read(amountText(mm, unit, 'down'))).toBeLessThanOrEqual(mm + 1e-6);
        },
      ),
    );
  });
});
