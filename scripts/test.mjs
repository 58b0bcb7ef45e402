import { rmSync } from 'node:fs';
import { PARTS } from './steps/all-parts.mjs';
import { removeCluster } from './steps/cluster.mjs';
import { foldersOf } from './steps/folders.mjs';
import { describe, end, isOurs } from './steps/identity.mjs';
import { checkNode, ensurePackages } from './steps/machine.mjs';
import { ensureModules } from './steps/modules.mjs';
import { readRun, writeRun } from './steps/run-file.mjs';
import { endCommands } from './steps/run.mjs';
import { complain, onStopSignal, say, Stop } from './steps/say.mjs';
import { Supervisor } from './steps/supervise.mjs';

/** The parts that were asked for by name, in their order; all of them where none was. */
function choose(names) {
  const unknown = names.filter((name) => !PARTS.some((part) => part.name === name));
  const known = PARTS.map(({ name }) => name).join(', ');
  if (unknown.length > 0) throw new Stop(`No part is called ${unknown.join(', ')}. There are: ${known}.`);
  return PARTS.filter(({ name, onWish }) => (names.length === 0 ? !onWish : names.includes(name)));
}

/** A place of its own for this run, emptied of the run before. */
async function makeContext() {
  const folders = foldersOf('test');
  const before = readRun(folders.runFile);
  if (before.supervisor && isOurs(before.supervisor))
    throw new Stop('`npm test` runs in this clone already.');
  await Promise.all(before.processes.map((one) => end(one)));
  await removeCluster(folders);
  for (const path of [folders.objects, folders.mail, folders.runFile, folders.logs])
    rmSync(path, { recursive: true, force: true });
  folders.make();
  const run = { ...readRun(folders.runFile), supervisor: describe('test', process.pid) };
  const save = () => writeRun(folders.runFile, run);
  save();
  const supervisor = new Supervisor(folders, (processes) => {
    run.processes = processes;
    save();
  });
  const stop = async () => {
    endCommands();
    await supervisor.stop();
    await removeCluster(folders);
    rmSync(folders.runFile, { force: true });
  };
  return { folders, run, save, supervisor, stop };
}

async function runPart(part, context) {
  const began = performance.now();
  say(`\n— ${part.name}`);
  const counts = await part.run(context).catch((thrown) => {
    complain(thrown);
    return { passed: 0, failed: 1 };
  });
  if (counts.passed + counts.failed === 0) {
    say(`  ${part.name} ran nothing: that is a failure.`);
    counts.failed = 1;
  }
  const seconds = ((performance.now() - began) / 1000).toFixed(0);
  say(`  ${part.name}: ${counts.passed} passed, ${counts.failed} failed, ${seconds} s`);
  return counts;
}

/** Everything from the format to the browser; `npm test -- unit browser` runs some of it. */
async function testAll(total) {
  checkNode();
  const parts = choose(process.argv.slice(2));
  const context = await makeContext();
  let isStopping = false;
  onStopSignal(() => {
    isStopping = true;
    void context.stop().then(() => process.exit(130));
  });
  await ensurePackages([...new Set(parts.flatMap(({ needs }) => needs))]);
  await ensureModules();
  for (const part of parts) {
    const { passed, failed } = await runPart(part, context);
    if (isStopping) await new Promise(() => {}); // the signal's own work ends us
    total.passed += passed;
    total.failed += failed;
  }
  await context.stop();
}

const total = { passed: 0, failed: 0 };
try {
  await testAll(total);
} catch (thrown) {
  complain(thrown);
  total.failed += 1;
}
say(`\n${total.passed} passed, ${total.failed} failed`);
process.exitCode = total.failed === 0 && total.passed > 0 ? 0 : 1;
