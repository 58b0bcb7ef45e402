import { describe, expect, it } from 'vitest';
import { MATRIX } from '../../access/matrix';
import { nameOf } from '../../access/row';
import { ROLES } from '../../access/roles';
import { below, type Source, SOURCES } from '../../support/sources';

const routes = below('app').filter(({ path }) => path.endsWith('/route.ts'));
const pages = below('app').filter(({ path }) => /(^|\/)page\.tsx$/.test(path));
const actionFiles = SOURCES.filter(({ text }) => /^'use server';/m.test(text));

const exportsOf = ({ text }: Source) =>
  [...text.matchAll(/^export (?:default )?(?:async )?(?:const|function|class|let|type|interface)?\s*(\w+)([^\n]*)/gm)].map(
    ([, name = '', rest = '']) => ({ name, rest }),
  ); // prettier-ignore
const METHODS = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'];
/** What a route file may say of itself to Next, besides its handlers. */
const SETTINGS = ['dynamic', 'maxDuration', 'runtime'];

describe('entrances', () => {
  it('are found', () => {
    expect([routes.length > 5, pages.length > 5, actionFiles.length > 3]).toEqual([true, true, true]);
  });

  it('handlers are all made by the one wrapper', () => {
    const bare = routes.flatMap((source) =>
      exportsOf(source)
        .filter(({ name }) => !SETTINGS.includes(name))
        .filter(({ name, rest }) => !METHODS.includes(name) || !/^ = route\(/.test(rest))
        .map(({ name }) => `${source.path} ${name}`),
    );
    expect(bare).toEqual([]);
  });

  it('files of actions export wrapped actions only', () => {
    const bare = actionFiles.flatMap((source) =>
      exportsOf(source)
        .filter(({ rest }) => !/^ = formAction\(/.test(rest))
        .map(({ name }) => `${source.path} ${name}`),
    );
    expect(bare).toEqual([]);
    expect(
      SOURCES.filter(({ path, text }) => path.startsWith('app/') && /^\s+'use server';/m.test(text)).map(
        ({ path }) => path,
      ),
    ).toEqual([]);
  });

  it('each page, handler and action has one row in the access matrix, and each row has its source', () => {
    const found = [
      ...pages.map(({ path }) => path),
      ...routes.flatMap((source) =>
        exportsOf(source)
          .filter(({ name }) => METHODS.includes(name))
          .map(({ name }) => `${source.path} ${name}`),
      ),
      ...actionFiles.flatMap((source) => exportsOf(source).map(({ name }) => `${source.path} ${name}`)),
    ];
    expect(MATRIX.map(nameOf).sort()).toEqual(found.sort());
  });

  it('each row answers for each role', () => {
    for (const row of MATRIX) expect(Object.keys(row.access), nameOf(row)).toEqual([...ROLES]);
  });
});

describe('pages', () => {
  it('are tables of contents: at most 40 lines, no SQL, no fetching of their own', () => {
    const long = pages.filter(({ text }) => text.trimEnd().split('\n').length > 40);
    expect(long.map(({ path }) => path)).toEqual([]);
    const busy = pages.filter(({ text }) => /\bsql`|\bfetch\(|drizzle-orm/.test(text));
    expect(busy.map(({ path }) => path)).toEqual([]);
  });

  it('of the studio ask who is there, before anything else is awaited', () => {
    const studio = pages.filter(({ path }) => path.startsWith('app/(studio)/'));
    const open = studio.filter(({ text }) => {
      const body = text.slice(text.indexOf('export default'));
      return body.slice(body.indexOf('await ')).search(/^await requireViewer\(\)/) !== 0;
    });
    expect(open.map(({ path }) => path)).toEqual([]);
  });

  it('leave permission to themselves: no layout asks who is there to decide it', () => {
    const layouts = below('app').filter(({ path }) => /(^|\/)(layout|template)\.tsx$/.test(path));
    expect(
      layouts.filter(({ text }) => /requireViewer|redirect\(|notFound\(/.test(text)).map(({ path }) => path),
    ).toEqual([]);
  });

  it('decide before anything is sent: nothing streams a shell ahead of them', () => {
    const early = below('app').filter(({ path, text }) => /(^|\/)loading\.tsx$/.test(path) || (/(layout|page)\.tsx$/.test(path) && /<Suspense/.test(text))); // prettier-ignore
    expect(early.map(({ path }) => path)).toEqual([]);
  });
});

it('the proxy decides nothing: it neither redirects nor refuses', () => {
  const proxy = SOURCES.find(({ path }) => path === 'proxy.ts');
  expect(proxy?.text).toBeDefined();
  expect(proxy?.text).not.toMatch(/redirect|rewrite|status|cookies|\.json\(/);
});
