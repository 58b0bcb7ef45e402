import { describe, expect, it } from 'vitest';
import { parseCase } from '@/diagnosis/case';
import { small } from '@/tests/support/small-knowledge';

function faultOf(input: object) {
  const result = parseCase(small, { garment: 'smock', ...input });
  return result.ok ? null : `${result.fault.field}: ${result.fault.message}`;
}

const rounds = (count: number) => Array.from({ length: count }, () => ({}));

describe('a case', () => {
  it('needs only its garment; everything else has a default', () => {
    const result = parseCase(small, { garment: 'smock' });
    expect(result).toMatchObject({
      ok: true,
      value: {
        unit: 'mm',
        body: { hipMm: 1000 },
        fittedFor: 'standing',
        muslin: 'full',
        signs: [],
        history: [],
      },
    });
  });

  it('defaults the side to both, the reliability and the places to 1', () => {
    const result = parseCase(small, {
      garment: 'smock',
      signs: [{ sign: 'leg-twist', severity: 1 }],
      absent: ['leg-fold'],
      tests: [{ check: 'open-knee', outcome: 'opens' }],
    });
    expect(result).toMatchObject({
      ok: true,
      value: {
        signs: [{ side: 'both', reliability: 1 }],
        absent: [{ sign: 'leg-fold', side: 'both' }],
        tests: [{ side: 'both', places: 1 }],
      },
    });
  });

  it.each<[string, object, string]>([
    [
      'an unknown sign',
      { signs: [{ sign: 'seat-line', severity: 1 }] },
      'signs[0].sign: unknown id "seat-line"; nearest is "seat-lines"',
    ],
    [
      'an unknown absent sign',
      { absent: ['seat-foldz'] },
      'absent[0]: unknown id "seat-foldz"; nearest is "seat-folds"',
    ],
    [
      'an unknown cause',
      { causes: { present: ['stanse'] } },
      'causes.present[0]: unknown id "stanse"; nearest is "stance"',
    ],
    [
      'an unknown shape note',
      { shape: ['round-set'] },
      'shape[0]: unknown id "round-set"; nearest is "round-seat"',
    ],
    [
      'an unknown dimension',
      { measured: [{ terms: [{ dimension: 'dept' }], needMm: 1, sdMm: 1 }] },
      'measured[0].terms[0].dimension: unknown id "dept"; nearest is "depth"',
    ],
    [
      'an unknown check',
      { tests: [{ check: 'lift-bend', outcome: 'eases' }] },
      'tests[0].check: unknown id "lift-bend"; nearest is "lift-band"',
    ],
    [
      'an unknown outcome',
      { tests: [{ check: 'lift-band', outcome: 'ease' }] },
      'tests[0].outcome: unknown outcome "ease" of "lift-band"; nearest is "eases"',
    ],
    [
      'an unknown correction',
      { history: [{ changes: [{ correction: 'ad-depth', amountMm: 3 }] }] },
      'history[0].changes[0].correction: unknown id "ad-depth"; nearest is "add-depth"',
    ],
    ['an unknown key', { sings: [] }, 'sings: unknown key; nearest is "signs"'],
    ['an unknown inner key', { body: { hip: 1000 } }, 'body.hip: unknown key; nearest is "hipMm"'],
    [
      'an unknown key in a list',
      { signs: [{ sign: 'seat-lines', severty: 1, severity: 1 }] },
      'signs[0].severty: unknown key; nearest is "severity"',
    ],
    [
      'a sign twice',
      {
        signs: [
          { sign: 'seat-lines', severity: 1 },
          { sign: 'seat-lines', severity: 2 },
        ],
      },
      'signs[1]: "seat-lines, both" is there twice',
    ],
    [
      'a sign both seen and absent',
      { signs: [{ sign: 'seat-lines', severity: 1 }], absent: ['seat-lines'] },
      'absent[0]: "seat-lines, both" is there twice',
    ],
    [
      'a cause both present and absent',
      { causes: { present: ['stance'], absent: ['stance'] } },
      'causes.absent[0]: "stance" is there twice',
    ],
    [
      'a sum twice',
      {
        measured: [
          { terms: [{ dimension: 'depth' }], needMm: 1, sdMm: 1 },
          { terms: [{ dimension: 'depth' }], needMm: 2, sdMm: 1 },
        ],
      },
      'measured[1]: "depth, both" is there twice',
    ],
    [
      'a side on what has none',
      { signs: [{ sign: 'seat-lines', severity: 1, side: 'left' }] },
      'signs[0].side: "seat-lines" has no sides; leave the side out or say "both"',
    ],
    [
      'a basis that cannot be converted',
      { tests: [{ check: 'open-knee', outcome: 'opens', amountMm: 5, basis: 'round' }] },
      'tests[0].basis: "knee" cannot convert "round"; its own is "piece"',
    ],
    [
      'an amount on a check without one',
      { tests: [{ check: 'lift-band', outcome: 'eases', amountMm: 5 }] },
      'tests[0].amountMm: "lift-band" carries no amount',
    ],
    [
      'a change without its amount',
      { history: [{ changes: [{ correction: 'add-depth' }] }] },
      'history[0].changes[0].amountMm: "add-depth" needs the amount really made',
    ],
  ])('refuses %s, by name', (_, input, fault) => {
    expect(faultOf(input)).toBe(fault);
  });

  it.each<[string, object, string]>([
    ['half a severity', { signs: [{ sign: 'seat-lines', severity: 1.5 }] }, 'signs[0].severity'],
    ['a severity above 3', { signs: [{ sign: 'seat-lines', severity: 4 }] }, 'signs[0].severity'],
    ['an endless number', { body: { hipMm: 1e999 } }, 'body.hipMm'],
    [
      'text for a number',
      { measured: [{ terms: [{ dimension: 'depth' }], needMm: '12', sdMm: 1 }] },
      'measured[0].needMm',
    ],
    ['an unknown side', { signs: [{ sign: 'leg-twist', severity: 1, side: 'port' }] }, 'signs[0].side'],
    ['a history of 25 rounds', { history: rounds(25) }, 'history'],
    [
      'an amount of 0',
      { history: [{ changes: [{ correction: 'add-depth', amountMm: 0 }] }] },
      'history[0].changes[0].amountMm',
    ],
    ['another garment', { garment: 'smok' }, 'garment'],
  ])('refuses %s', (_, input, field) => {
    expect(faultOf(input)?.split(': ')[0]).toBe(field);
  });

  it('accepts 24 rounds, a severity of 0 and "both" on anything', () => {
    expect(
      faultOf({ history: rounds(24), signs: [{ sign: 'seat-lines', severity: 0, side: 'both' }] }),
    ).toBeNull();
  });

  it('accepts an old name of a renamed id and answers with the new one', () => {
    const renamed = {
      ...small,
      causes: [{ ...small.causes[0]!, aliases: ['posture'] }, ...small.causes.slice(1)],
    };
    const result = parseCase(renamed, { garment: 'smock', causes: { present: ['posture'] } });
    expect(result).toMatchObject({ ok: true, value: { causes: { present: ['stance'] } } });
  });
});
