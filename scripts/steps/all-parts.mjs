import { startLocal } from './arrange.mjs';
import { ensureBuild } from './build.mjs';
import { databaseUrl, ensureCluster } from './cluster.mjs';
import { check, playwright, vitest } from './parts.mjs';

/** A cluster of its own; every test file makes its own database in it. */
async function databaseOnly({ folders, run, save }) {
  await ensureCluster(folders, run, { isThrowaway: true });
  save();
  return {
    TEST_DATABASE_OWNER_URL: databaseUrl(run, 'owner', 'postgres'),
    TEST_DATABASE_APP_URL: databaseUrl(run, 'app', 'postgres'),
    TEST_DATABASE_PURGE_URL: databaseUrl(run, 'purge', 'postgres'),
  };
}

/** The whole application as `npm start` runs it, with the demo. */
async function wholeApplication(context) {
  const { folders, run } = context;
  const origin = await startLocal(context, { withDemo: true, isThrowaway: true });
  return {
    BASE_URL: origin,
    MAIL_CATCHER_DIR: folders.mail,
    RUN_JSON: folders.runFile,
    STORE_DIR: folders.objects,
    LOGS_DIR: folders.logs,
    ADMIN_DATABASE_URL: databaseUrl(run, 'owner'),
  };
}

/** All that `npm test` does, in order: what is quickest to say no comes first. */
export const PARTS = [
  check('format', [['prettier', '--check', '.']]),
  check('lint', [['eslint', '.', '--max-warnings', '0']]),
  check('types', [
    ['next', 'typegen'],
    ['tsc', '--noEmit'],
  ]),
  check('unused', [['knip']]),
  vitest('unit', ['unit', 'components']),
  vitest('integration', ['integration'], { needs: ['postgresql'], envOf: databaseOnly }),
  { name: 'build', needs: [], run: () => ensureBuild().then(() => ({ passed: 1, failed: 0 })) },
  playwright('browser', { needs: ['postgresql', 'chromium'], envOf: wholeApplication }),
  playwright('shots', {
    needs: ['postgresql', 'chromium'],
    envOf: wholeApplication,
    config: 'playwright.shots.config.ts',
    onWish: true,
  }),
];
