import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { untilHealthy, untilListening } from './answering.mjs';
import { STANDALONE } from './build.mjs';
import { TS_FLAGS } from './database.mjs';
import { ROOT } from './folders.mjs';
import { freePort } from './ports.mjs';
import { timed } from './say.mjs';

const node = (name, args, env, cwd = ROOT) => ({ name, command: process.execPath, args, env, cwd });

/** The stand-ins of hosted services: the photo store and the mail catcher. */
export async function startStandIns(supervisor, folders, runState) {
  runState.ports.store = await freePort(runState.ports.store);
  runState.ports.mail = await freePort(runState.ports.mail);
  const env = {
    ...process.env,
    STORE_PORT: String(runState.ports.store),
    STORE_DIR: folders.objects,
    STORE_BUCKET: 'ruckle',
    STORE_ACCESS_KEY_ID: runState.secrets.storeKeyId,
    STORE_SECRET_ACCESS_KEY: runState.secrets.storeSecret,
    MAIL_PORT: String(runState.ports.mail),
    MAIL_CATCHER_DIR: folders.mail,
  };
  supervisor.start(node('store', ['scripts/services/store.mjs'], env));
  supervisor.start(node('mail', ['scripts/services/mail-catcher.mjs'], env));
  await supervisor.during(untilListening(runState.ports.store, 'The photo store'));
  await supervisor.during(untilListening(runState.ports.mail, 'The mail catcher'));
}

// An address, not a path: a folder's name may hold characters that mean something in one.
const CLIENT_ADDRESS = pathToFileURL(join(ROOT, 'scripts/services/client-address.mjs')).href;

function webProcess(env, isDev) {
  const before = ['--import', CLIENT_ADDRESS];
  if (!isDev) return node('web', [...before, 'server.js'], env, STANDALONE);
  const next = ['node_modules/next/dist/bin/next', 'dev', '-p', env.PORT, '-H', env.HOSTNAME];
  return node('web', [...before, ...next], { ...env, NODE_ENV: 'development' });
}

/** The application: the web process (built, or in development) and the worker; waits until it answers. */
export async function startApplication(supervisor, { webEnv, workerEnv, isDev = false }) {
  supervisor.start(webProcess(webEnv, isDev));
  supervisor.start(node('worker', [...TS_FLAGS, 'lib/jobs/worker.ts'], workerEnv));
  const origin = `http://127.0.0.1:${webEnv.PORT}`;
  await timed('starting', () => supervisor.during(untilHealthy(origin)));
  return origin;
}
