import { ensureBuild } from './build.mjs';
import { ensureCluster, ensureDatabase, watchCluster } from './cluster.mjs';
import { migrate, seed } from './database.mjs';
import { localEnvironment, outsideEnvironment, ownerEnvironment, workerEnvironment } from './environment.mjs';
import { freePort } from './ports.mjs';
import { say, timed } from './say.mjs';
import { startApplication, startStandIns } from './services.mjs';

/**
 * Everything on this machine: database, stand-ins, application.
 * @param options `isDev`, `withDemo` (into a database that has just been made), `isThrowaway`, `preferredPort`
 * @returns the address on which it answers
 */
export async function startLocal({ supervisor, folders, run, save }, options) {
  const { isDev = false, withDemo = false, isThrowaway = false, preferredPort } = options;
  // Noted before anything is made: a start that is killed meanwhile is made good by the next.
  if (!run.ports.postgres) run.wantsDemo = withDemo;
  save();
  await timed('starting the database', () => ensureCluster(folders, run, { isThrowaway }));
  watchCluster(supervisor, folders, run, { isThrowaway });
  const { isNew } = await ensureDatabase(folders, run);
  if (isNew) Object.assign(run, { wantsDemo: withDemo, hasDemo: false, stamps: {} });
  save();
  await migrate(run, ownerEnvironment(folders, run));
  save();
  if (!isDev) await ensureBuild();
  await startStandIns(supervisor, folders, run);
  run.ports.web = await freePort(run.ports.web, preferredPort);
  if (run.wantsDemo) {
    await seed(ownerEnvironment(folders, run));
    Object.assign(run, { wantsDemo: false, hasDemo: true });
  }
  save();
  return startApplication(supervisor, {
    webEnv: localEnvironment(folders, run),
    workerEnv: workerEnvironment(folders, run),
    isDev,
  });
}

/** The application alone, on a database, a store and a mail host that the environment names. */
export async function startOnGiven({ supervisor, run, save }) {
  const { DATABASE_OWNER_URL, PORT } = process.env;
  run.ports.web = PORT ? Number(PORT) : await freePort(run.ports.web, 3000);
  const webEnv = outsideEnvironment(run);
  if (DATABASE_OWNER_URL) await migrate({ stamps: {} }, { ...webEnv, DATABASE_OWNER_URL });
  else say('· DATABASE_OWNER_URL is not given: the database is taken to be migrated.');
  await ensureBuild();
  save();
  return startApplication(supervisor, { webEnv, workerEnv: outsideEnvironment(run, { forWorker: true }) });
}
