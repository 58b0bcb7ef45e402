import { describe, expect, it } from 'vitest';
import { below, importsOf, type Source, SOURCES } from '../../support/sources';

const offenders = (sources: readonly Source[], isWrong: (imported: string, source: Source) => boolean) =>
  sources.flatMap((source) =>
    importsOf(source)
      .filter((imported) => isWrong(imported, source))
      .map((imported) => `${source.path} → ${imported}`),
  );
const isOurs = (imported: string) =>
  /^(app|components|content|db|diagnosis|lib|scripts|tests)\//.test(imported);

describe('imports go one way', () => {
  it('finds the imports it judges', () => {
    expect(SOURCES.length).toBeGreaterThan(100);
    expect(importsOf({ path: 'a/b/c.ts', text: "import { x } from '../d';\nimport type { Y } from '@/e/f';\nexport { z } from '@/g/h';\nimport './i';\nawait import('@/j/k');" })).toEqual(['a/d', 'g/h', 'a/b/i', 'j/k']); // prettier-ignore
  });

  it('the core imports nothing of ours', () => {
    expect(offenders(below('diagnosis'), (to) => isOurs(to) && !to.startsWith('diagnosis/'))).toEqual([]);
  });

  it('the core takes clock, chance and environment as arguments', () => {
    const reaches =
      /\b(Date\.now\(|new Date\(\)|Math\.random\(|process\.env|globalThis\.|performance\.now\(|crypto\.)/;
    const core = below('diagnosis').filter(({ text }) => reaches.test(text));
    expect(core.map(({ path }) => path)).toEqual([]);
  });

  it('lib and db import no page and no component, but for the schemas that forms and handlers share', () => {
    const isSchema = (to: string) => /^components\/.*-schema$/.test(to);
    expect(
      offenders(below('lib', 'db'), (to) => /^(app|components|tests)\//.test(to) && !isSchema(to)),
    ).toEqual([]);
  });

  it('components never import the database, the configuration or a page', () => {
    expect(
      offenders(below('components'), (to) =>
        /^(db|app|tests|scripts)\/|^lib\/(env|log|auth|mail|jobs|limits|photo)/.test(to),
      ),
    ).toEqual([]);
  });

  it('nothing that is shipped imports a test', () => {
    expect(
      offenders(
        // The evaluation holds the engine against the published cases, which live with the tests.
        below('app', 'components', 'db', 'diagnosis', 'lib', 'scripts').filter(
          ({ path }) => path !== 'scripts/evaluate.ts',
        ),
        (to) => to.startsWith('tests/'),
      ),
    ).toEqual([]);
  });
});

describe('the outside world is reached in few places', () => {
  const shipped = below('app', 'components', 'db', 'diagnosis', 'lib').concat(
    SOURCES.filter(({ path }) => path === 'proxy.ts'),
  );

  it('only queries and lib hold the database', () => {
    const isAllowed = ({ path }: Source) => /^(db\/(queries|seed)\/|lib\/)/.test(path);
    expect(
      offenders(
        shipped.filter((source) => !isAllowed(source)),
        (to) => to === 'db/client',
      ),
    ).toEqual([]);
  });

  it('only the configuration reads the environment; processes without it, and what Next fills in, are named', () => {
    const named = ['lib/env.ts', 'db/migrate.ts', 'db/seed/run.ts'];
    const readers = shipped
      .filter(({ path }) => !named.includes(path))
      .filter(({ text }) => /process\.env(?!\.(NODE_ENV|NEXT_RUNTIME)\b)/.test(text));
    expect(readers.map(({ path }) => path)).toEqual([]);
  });

  it('what touches either is marked for the server only', () => {
    const isEntry = (path: string) => path === 'lib/jobs/worker.ts';
    const touching = below('lib', 'db/queries').filter(
      (source) =>
        importsOf(source).some((to) => ['db/client', 'lib/env'].includes(to)) ||
        /process\.env/.test(source.text),
    );
    expect(touching.length).toBeGreaterThan(20);
    const unmarked = touching.filter(
      ({ path, text }) => !isEntry(path) && !text.startsWith("import 'server-only';"),
    );
    expect(unmarked.map(({ path }) => path)).toEqual([]);
  });

  it('Lucia is imported by one file, for it is no longer kept up', () => {
    expect(
      offenders(SOURCES, (to) => /^(lucia|@lucia-auth\/)/.test(to)).map((line) => line.split(' ')[0]),
    ).toEqual(['lib/auth/sessions.ts', 'lib/auth/sessions.ts']);
  });

  it('the store is reached through one file', () => {
    const clients = offenders(below('app', 'components', 'db', 'lib'), (to) => to.startsWith('@aws-sdk/'));
    expect(clients).toEqual(['lib/photo-store.ts → @aws-sdk/client-s3']);
  });
});
