import { existsSync, readFileSync, renameSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { isHealthy } from './steps/answering.mjs';
import { ensureBuild } from './steps/build.mjs';
import { ensureCluster, stopCluster } from './steps/cluster.mjs';
import { migrate } from './steps/database.mjs';
import { foldersOf, ROOT } from './steps/folders.mjs';
import { describe, end, isOurs } from './steps/identity.mjs';
import { checkNode, ensurePackages } from './steps/machine.mjs';
import { ensureModules } from './steps/modules.mjs';
import { readRun, writeRun } from './steps/run-file.mjs';
import { main, say, timed } from './steps/say.mjs';
import { startApplication, startStandIns } from './steps/services.mjs';
import { Supervisor } from './steps/supervise.mjs';

const wants = (flag) => process.argv.includes(flag);
const ready = (origin) => say(`Ruckle is ready: ${origin}`);
const originOf = (run) => `http://127.0.0.1:${run.ports.web}`;

/** Whether a start before this one still runs and answers. */
const isUp = async (run) => run.supervisor && isOurs(run.supervisor) && (await isHealthy(originOf(run)));

/** What a killed start left behind, ended once it is sure to be ours. The database is adopted instead. */
async function clearLeftovers(run) {
  const noted = [...(run.supervisor ? [run.supervisor] : []), ...run.processes];
  await Promise.all(noted.map((one) => end(one)));
  run.processes = [];
}

async function moveDataAside(folders) {
  await stopCluster(folders);
  for (const path of [folders.cluster, folders.objects, folders.mail, folders.runFile]) {
    if (!existsSync(path)) continue;
    rmSync(`${path}.before`, { recursive: true, force: true });
    renameSync(path, `${path}.before`);
  }
}

function sayDemoSignIns() {
  const file = join(ROOT, 'db/seed/accounts.json');
  if (!existsSync(file)) return;
  say('\nDemo sign-ins (this machine only):');
  for (const { email, password, what } of JSON.parse(readFileSync(file, 'utf8')))
    say(`  ${email}  ${password}  ${what}`);
  say('');
}

await main(async () => {
  checkNode();
  await ensurePackages(['postgresql']);
  await ensureModules();
  let folders = foldersOf('main');
  let run = readRun(folders.runFile);
  if (await isUp(run)) return ready(originOf(run));
  await clearLeftovers(run);
  if (wants('--fresh')) {
    await moveDataAside(folders);
    folders = foldersOf('main');
    run = readRun(folders.runFile);
  }
  run.supervisor = describe('supervisor', process.pid);
  const save = () => writeRun(folders.runFile, run);
  const supervisor = new Supervisor(folders, (processes) => {
    run.processes = processes;
    save();
  });
  let isEnding = false;
  const finish = async (code) => {
    if (isEnding) return;
    isEnding = true;
    await supervisor.stop();
    await stopCluster(folders);
    run.processes = [];
    delete run.supervisor;
    save();
    process.exit(code);
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void finish(0));
  try {
    const { isNew } = await timed('starting the database', () => ensureCluster(folders, run));
    if (isNew) {
      run.stamps.migrated = '';
      run.needsDemo = !wants('--fresh');
    }
    save();
    await migrate(folders, run);
    save();
    if (!wants('--dev')) await ensureBuild();
    await startStandIns(supervisor, folders, run);
    const origin = await startApplication(supervisor, folders, run, {
      dev: wants('--dev'),
      withDemo: run.needsDemo,
    });
    run.needsDemo = false;
    save();
    sayDemoSignIns();
    ready(origin);
    await supervisor.failed;
  } catch (thrown) {
    process.stderr.write(`${thrown.message}\n`);
    await finish(1);
  }
});
