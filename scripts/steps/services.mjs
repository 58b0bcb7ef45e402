import { join } from 'node:path';
import { untilHealthy, untilListening } from './answering.mjs';
import { seed, TS_FLAGS } from './database.mjs';
import { environmentOf, workerEnvironment } from './environment.mjs';
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
    STORE_ACCESS_KEY_ID: runState.secrets.storeKeyId,
    STORE_SECRET_ACCESS_KEY: runState.secrets.storeSecret,
    MAIL_PORT: String(runState.ports.mail),
    MAIL_CATCHER_DIR: folders.mail,
  };
  supervisor.start(node('store', ['scripts/services/store.mjs'], env));
  supervisor.start(node('mail', ['scripts/services/mail-catcher.mjs'], env));
  await untilListening(runState.ports.store, 'The photo store');
  await untilListening(runState.ports.mail, 'The mail catcher');
}

/** The application: the web process (built, or in development) and the worker. */
export async function startApplication(
  supervisor,
  folders,
  runState,
  { dev = false, withDemo = false, preferredPort = 3000 } = {},
) {
  runState.ports.web = await freePort(runState.ports.web, preferredPort);
  if (withDemo) await seed(folders, runState);
  const env = environmentOf(folders, runState);
  const address = ['--import', join(ROOT, 'scripts/services/client-address.mjs')];
  const web = dev
    ? node(
        'web',
        [...address, 'node_modules/next/dist/bin/next', 'dev', '-p', env.PORT, '-H', env.HOSTNAME],
        { ...env, NODE_ENV: 'development' },
      )
    : node('web', [...address, 'server.js'], env, join(ROOT, '.next', 'standalone'));
  supervisor.start(web);
  supervisor.start(node('worker', [...TS_FLAGS, 'lib/jobs/worker.ts'], workerEnvironment(folders, runState)));
  await timed('starting', () => untilHealthy(env.APP_ORIGIN));
  return env.APP_ORIGIN;
}
