import { describe, expect, it } from 'vitest';
import { below, SOURCES } from '../../support/sources';

const SELF = 'tests/unit/architecture/words.test.ts';
const others = SOURCES.filter(({ path }) => path !== SELF);
const where = (pattern: RegExp, sources = others) =>
  sources.flatMap(({ path, text }) =>
    text
      .split('\n')
      .map((line, i) => ({ line, at: `${path}:${i + 1}` }))
      .filter(({ line }) => pattern.test(line))
      .map(({ at, line }) => `${at} ${line.trim().slice(0, 80)}`),
  );

describe('no source', () => {
  it('steps out of the types', () => {
    expect(
      where(/(:|<|\bas|\|)\s*any\b(?=[\s,;>)\]|]|$)|@ts-(ignore|nocheck|expect-error)|eslint-disable/),
    ).toEqual([]);
  });

  it('is unfinished', () => {
    expect(where(/\b(TODO|FIXME|XXX|HACK)\b|not implemented/)).toEqual([]);
  });

  it('names a place on somebody’s machine', () => {
    expect(where(/(["'`\s(=]|^)\/(home|Users|root|work|mnt)\/\w/)).toEqual([]);
  });

  it('is a test that is skipped, alone, or held to a picture of itself', () => {
    expect(
      where(
        /\b(it|test|describe)\.(skip|only|todo|fixme)\b|toMatch(Inline)?Snapshot/,
        below('tests').filter(({ path }) => path !== SELF),
      ),
    ).toEqual([]);
  });

  it('is longer than 300 lines, unless it is data', () => {
    const isData = /^(diagnosis\/garments\/|content\/|tests\/|db\/seed\/)/;
    const long = others.filter(({ path, text }) => !isData.test(path) && text.split('\n').length > 301);
    expect(long.map(({ path }) => path)).toEqual([]);
  });

  it('gathers others only to hand them on', () => {
    const barrels = below('app', 'components', 'lib', 'db/queries', 'diagnosis').filter(({ text }) => {
      const lines = text.split('\n').filter((line) => line.trim() !== '' && !/^\s*(\/\/|\/?\*)/.test(line));
      return lines.length > 1 && lines.every((line) => /^export (\*|\{[^}]*\}) from /.test(line));
    });
    expect(barrels.map(({ path }) => path)).toEqual([]);
  });

  it('waits for a fixed time in a browser test', () => {
    expect(where(/waitForTimeout\(/)).toEqual([]);
  });
});
