import { describe, expect, it } from 'vitest';
import { runCommand } from '@/diagnosis/command/run';
import { small } from '@/tests/support/small-knowledge';

function run(args: string[], text = '') {
  return runCommand(args, {
    garments: { smock: small },
    findSigns: (_, phrase) => [{ sign: phrase, score: 1 }],
    read: (path) => (path === 'missing.json' ? 'ENOENT' : new TextEncoder().encode(text)),
  });
}

const good = { garment: 'smock', signs: [{ sign: 'seat-lines', severity: 2 }] };

describe('the command line', () => {
  it('answers a case with its reading, an array with an array', () => {
    const one = run(['case.json'], JSON.stringify(good));
    const two = run(['-'], JSON.stringify([good, good]));
    if (one.status !== 0 || two.status !== 0) throw new Error('refused');
    const reading: unknown = JSON.parse(one.stdout);
    expect(reading).toHaveProperty('engine');
    expect(JSON.parse(two.stdout)).toEqual([reading, reading]);
  });

  it.each<[string, string[], string, RegExp]>([
    ['bad JSON', ['case.json'], '{', /^case: not JSON/],
    [
      'a bad case in an array, with its index',
      ['-'],
      JSON.stringify([good, { ...good, absent: ['x'] }]),
      /^\[1\]\.absent\[0\]: unknown id/,
    ],
    ['no garment', ['-'], '{}', /^garment: /],
    [
      'an unknown garment',
      ['-'],
      '{"garment":"smok"}',
      /^garment: unknown garment "smok"; nearest is "smock"$/,
    ],
    ['something that is no case', ['-'], '[3]', /^\[0\]\.case: /],
    [
      'more than 2,000 cases',
      ['-'],
      JSON.stringify(Array.from({ length: 2001 }, () => good)),
      /at most 2000/,
    ],
    ['more than 5 MB', ['-'], ' '.repeat(5 * 1024 * 1024 + 1), /above 5 MB/],
    ['a missing file', ['missing.json'], '', /^cannot read "missing.json": ENOENT$/],
    ['an unknown option', ['--vocab'], '', /^unknown option/],
    ['nothing', [], '', /^usage/],
  ])('refuses %s with status 2 and one line', (_, args, text, line) => {
    const result = run(args, text);
    if (result.status !== 2) throw new Error('accepted');
    expect(result.stderr.endsWith('\n')).toBe(true);
    expect(result.stderr.trimEnd()).toMatch(line);
    expect(result.stderr.trimEnd()).not.toContain('\n');
  });

  it('lists the vocabulary with what a case needs', () => {
    const result = run(['--vocabulary']);
    if (result.status !== 0) throw new Error('refused');
    const vocabulary = JSON.parse(result.stdout) as Record<string, Record<string, unknown>[]>;
    expect(Object.keys(vocabulary)).toEqual([
      'engine',
      'garments',
      'dimensions',
      'causes',
      'signs',
      'checks',
      'corrections',
      'shape',
    ]);
    expect(vocabulary.dimensions![0]).toMatchObject({
      id: 'depth',
      scaleMm: 12,
      toleranceMm: 5,
      basis: 'piece',
    });
    expect(vocabulary.signs![0]!.links).toContainEqual({ cause: 'untrimmed', grade: 'usual' });
    expect(vocabulary.signs![1]!.maskedBy).toEqual([{ dimension: 'seat', direction: 'more' }]);
    expect(vocabulary.checks![1]).toMatchObject({
      amount: 'pinch',
      outcomes: [{ id: 'clears' }, { id: 'stays' }],
    });
  });

  it('finds signs for words', () => {
    expect(run(['--words', 'tight'])).toEqual({
      status: 0,
      stdout: '{"signs":[{"sign":"tight","score":1}]}\n',
    });
  });
});
