import { rmSync } from 'node:fs';
import { ensureBuild } from './steps/build.mjs';
import { databaseUrl, ensureCluster, removeCluster } from './steps/cluster.mjs';
import { migrate } from './steps/database.mjs';
import { foldersOf } from './steps/folders.mjs';
import { describe, end } from './steps/identity.mjs';
import { checkNode, ensurePackages } from './steps/machine.mjs';
import { ensureModules } from './steps/modules.mjs';
import { readRun, writeRun } from './steps/run-file.mjs';
import { main, say } from './steps/say.mjs';
import { startApplication, startStandIns } from './steps/services.mjs';
import { Supervisor } from './steps/supervise.mjs';

/** Everything from the format to the browser, in order; `npm test -- unit browser` runs some of it. */
await main(async () => {
  checkNode();
  await ensurePackages(['postgresql', 'chromium']);
  await ensureModules();
  const { check, playwright, vitest } = await import('./steps/parts.mjs');

  const folders = foldersOf('test');
  const before = readRun(folders.runFile);
  await Promise.all(before.processes.map((one) => end(one)));
  await removeCluster(folders);
  for (const path of [folders.objects, folders.mail, folders.runFile, folders.logs])
    rmSync(path, { recursive: true, force: true });
  foldersOf('test'); // made anew, empty
  const run = readRun(folders.runFile);
  const save = () => writeRun(folders.runFile, run);
  const supervisor = new Supervisor(folders, (processes) => {
    run.processes = processes;
    save();
  });
  run.supervisor = describe('test', process.pid);

  const stopAll = async () => {
    await supervisor.stop();
    await removeCluster(folders);
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'])
    process.on(signal, () => void stopAll().then(() => process.exit(130)));

  const database = async () => {
    await ensureCluster(folders, run, { fast: true });
    save();
  };
  const application = async () => {
    await database();
    await migrate(folders, run);
    await startStandIns(supervisor, folders, run);
    const origin = await startApplication(supervisor, folders, run, { withDemo: true, preferredPort: 0 });
    return {
      BASE_URL: origin,
      MAIL_CATCHER_DIR: folders.mail,
      RUN_JSON: folders.runFile,
      STORE_DIR: folders.objects,
      LOGS_DIR: folders.logs,
      ADMIN_DATABASE_URL: databaseUrl(run, 'owner'),
    };
  };

  const parts = [
    check('format', [['prettier', '--check', '.']]),
    check('lint', [['eslint', '.', '--max-warnings', '0']]),
    check('types', [
      ['next', 'typegen'],
      ['tsc', '--noEmit'],
    ]),
    check('unused', [['knip']]),
    vitest('unit', ['unit', 'components']),
    vitest('integration', ['integration'], () => ({
      TEST_DATABASE_OWNER_URL: databaseUrl(run, 'owner', 'postgres'),
      TEST_DATABASE_APP_URL: databaseUrl(run, 'app', 'postgres'),
      TEST_DATABASE_PURGE_URL: databaseUrl(run, 'purge', 'postgres'),
    })),
    { name: 'build', run: () => ensureBuild().then(() => ({ passed: 1, failed: 0 })) },
    playwright('browser', application),
  ];
  const chosen = process.argv.slice(2);
  const unknown = chosen.filter((name) => !parts.some((part) => part.name === name));
  if (unknown.length > 0)
    say(`There is no part called ${unknown.join(', ')}. Parts: ${parts.map(({ name }) => name).join(', ')}.`);

  const total = { passed: 0, failed: unknown.length };
  try {
    for (const part of parts.filter(({ name }) => chosen.length === 0 || chosen.includes(name))) {
      if (part.name === 'integration') await database();
      if (part.name === 'browser') await ensureBuild();
      const began = performance.now();
      say(`\n— ${part.name}`);
      const { passed, failed } = await part.run({ folders, run }).catch((thrown) => {
        process.stderr.write(`${thrown.message}\n`);
        return { passed: 0, failed: 1 };
      });
      const isEmpty = passed + failed === 0;
      if (isEmpty) say(`  ${part.name} ran nothing: that is a failure.`);
      total.passed += passed;
      total.failed += failed + (isEmpty ? 1 : 0);
      say(
        `  ${part.name}: ${passed} passed, ${failed} failed, ${((performance.now() - began) / 1000).toFixed(0)} s`,
      );
    }
  } finally {
    await stopAll();
  }
  say(`\n${total.passed} passed, ${total.failed} failed`);
  process.exit(total.failed === 0 && total.passed > 0 ? 0 : 1);
});
