import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { startLocal, startOnGiven } from './steps/arrange.mjs';
import { stopCluster } from './steps/cluster.mjs';
import { foldersOf, ROOT } from './steps/folders.mjs';
import { checkNode, ensurePackages } from './steps/machine.mjs';
import { ensureModules } from './steps/modules.mjs';
import { writeRun } from './steps/run-file.mjs';
import { endCommands } from './steps/run.mjs';
import { joinRunning, takeOver } from './steps/running.mjs';
import { complain, onStopSignal, say } from './steps/say.mjs';
import { Supervisor } from './steps/supervise.mjs';

const wanted = { isDev: process.argv.includes('--dev'), isFresh: process.argv.includes('--fresh') };
const sayReady = (origin) => say(`Ruckle is ready: ${origin}`);

function sayDemoSignIns() {
  const file = join(ROOT, 'db/seed/accounts.json');
  if (!existsSync(file)) return;
  say('\nDemo sign-ins (this machine only):');
  for (const { email, password, what } of JSON.parse(readFileSync(file, 'utf8')))
    say(`  ${email}  ${password}  ${what}`);
  say('');
}

/** Starts what is not running yet and stays with it until it is told to stop. */
async function startHere(folders) {
  const isLocal = !process.env.DATABASE_URL;
  const run = await takeOver(folders, wanted);
  const save = () => writeRun(folders.runFile, run);
  const supervisor = new Supervisor(folders, (processes) => {
    run.processes = processes;
    save();
  });
  let isEnding = false;
  const finish = async (code) => {
    if (isEnding) return;
    isEnding = true;
    endCommands();
    await supervisor.stop();
    await stopCluster(folders);
    run.processes = [];
    delete run.supervisor;
    save();
    process.exit(code);
  };
  onStopSignal(() => finish(0));
  try {
    if (isLocal) await ensurePackages(['postgresql']);
    await ensureModules();
    const parts = { supervisor, folders, run, save };
    const options = { isDev: wanted.isDev, withDemo: !wanted.isFresh, preferredPort: 3000 };
    const origin = isLocal ? await startLocal(parts, options) : await startOnGiven(parts);
    run.isReady = true;
    save();
    if (isLocal && run.hasDemo) sayDemoSignIns();
    sayReady(origin);
    await supervisor.failed;
  } catch (thrown) {
    if (isEnding) return; // what was being run has been ended by us
    complain(thrown);
    await finish(1);
  }
}

try {
  checkNode();
  const folders = foldersOf('main');
  const running = await joinRunning(folders.runFile, wanted);
  if (running) sayReady(running);
  else await startHere(folders);
} catch (thrown) {
  complain(thrown);
  process.exitCode = 1;
}
