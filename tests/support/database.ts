import { createHash, randomBytes } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import postgres, { type Sql } from 'postgres';
import { afterAll, beforeAll } from 'vitest';
import { migrateDatabase } from '@/db/migrate';

const LOCK = 6_114_902; // any constant: two runs do not make the same template at once
const SOURCES = ['db/migrations', 'db/migrate.ts', 'db/grants.ts', 'lib/jobs/queues.ts'];

interface TestDatabase {
  /** Speaks to the file's database as its owner: to look behind the application's back. */
  owner: Sql;
  /** The same with the rights that the application has. */
  app: Sql;
}

const withName = (url: string, database: string): string => {
  const parsed = new URL(url);
  parsed.pathname = `/${database}`;
  return parsed.href;
};

function given(name: string): string {
  const url = process.env[name];
  if (!url)
    throw new Error(`${name} is not set: integration tests need a PostgreSQL, as \`npm test\` starts it.`);
  return url;
}

function templateName(): string {
  const digest = createHash('sha256');
  for (const source of SOURCES) {
    const files = source.endsWith('.ts')
      ? [source]
      : readdirSync(source, { recursive: true, encoding: 'utf8' }).map((name) => join(source, name));
    for (const file of files.sort())
      if (/\.(ts|sql|json)$/.test(file)) digest.update(file).update(readFileSync(file));
  }
  return `ruckle_template_${digest.digest('hex').slice(0, 12)}`;
}

/** Migrated once a cluster and copied for each file, which takes a tenth of the time of migrating again. */
async function ensureTemplate(cluster: Sql, ownerUrl: string): Promise<string> {
  const name = templateName();
  await cluster.reserve().then(async (held) => {
    try {
      await held`select pg_advisory_lock(${LOCK})`;
      const [known] = await held`select 1 from pg_database where datname = ${name}`;
      if (!known) {
        await held.unsafe(`create database ${name}_new`);
        await migrateDatabase(withName(ownerUrl, `${name}_new`));
        await held.unsafe(`alter database ${name}_new rename to ${name}`);
      }
      await held`select pg_advisory_unlock(${LOCK})`;
    } finally {
      held.release();
    }
  });
  return name;
}

const ENVIRONMENT = {
  APP_ORIGIN: 'http://127.0.0.1:4321',
  S3_ENDPOINT: 'http://127.0.0.1:9',
  S3_BUCKET: 'ruckle',
  S3_ACCESS_KEY_ID: 'test',
  S3_SECRET_ACCESS_KEY: 'test',
  SMTP_URL: 'smtp://127.0.0.1:9',
  LOG_LEVEL: 'silent',
};

/**
 * Call it once at the top of an integration test: the file works on a freshly migrated database of its own, which is dropped
 * afterwards. The application's modules reach it under the role that serves people.
 * @param environment what the file wants set differently; the rest leads to closed ports
 */
export function databaseOfFile(environment: Record<string, string> = {}): TestDatabase {
  const name = `ruckle_test_${randomBytes(6).toString('hex')}`;
  const made = {} as TestDatabase;
  beforeAll(async () => {
    const ownerUrl = given('TEST_DATABASE_OWNER_URL');
    const appUrl = withName(given('TEST_DATABASE_APP_URL'), name);
    const cluster = postgres(ownerUrl, { max: 1, onnotice: () => {} });
    const template = await ensureTemplate(cluster, ownerUrl);
    await cluster.unsafe(`create database ${name} template ${template}`);
    await cluster.end();
    Object.assign(process.env, ENVIRONMENT, environment, { DATABASE_URL: appUrl });
    made.owner = postgres(withName(ownerUrl, name), { max: 2, onnotice: () => {} });
    made.app = postgres(appUrl, { max: 2, onnotice: () => {} });
  }, 60_000);
  afterAll(async () => {
    const { closeDatabase } = await import('@/db/client');
    await Promise.all([made.owner?.end(), made.app?.end(), closeDatabase()]);
    const cluster = postgres(given('TEST_DATABASE_OWNER_URL'), { max: 1, onnotice: () => {} });
    await cluster.unsafe(`drop database if exists ${name}`);
    await cluster.end();
  });
  return made;
}
