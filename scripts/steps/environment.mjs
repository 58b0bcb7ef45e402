import { databaseUrl } from './cluster.mjs';

const COMMON = {
  NODE_ENV: 'production',
  NEXT_TELEMETRY_DISABLED: '1',
  AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true',
  HOSTNAME: '127.0.0.1',
};

/** What the application is told on one machine. Only this ever sets RUCKLE_LOCAL. */
export function localEnvironment(folders, runState) {
  const { ports, secrets } = runState;
  return {
    ...process.env,
    ...COMMON,
    RUCKLE_LOCAL: '1',
    DATABASE_URL: databaseUrl(runState, 'app'),
    APP_ORIGIN: `http://127.0.0.1:${ports.web}`,
    PORT: String(ports.web),
    S3_ENDPOINT: `http://127.0.0.1:${ports.store}`,
    S3_BUCKET: 'ruckle',
    S3_REGION: 'local',
    S3_ACCESS_KEY_ID: secrets.storeKeyId,
    S3_SECRET_ACCESS_KEY: secrets.storeSecret,
    SMTP_URL: `smtp://127.0.0.1:${ports.mail}`,
    MAIL_FROM: 'Ruckle <no-reply@ruckle.invalid>',
    MAIL_CATCHER_DIR: folders.mail,
  };
}

/** Beside it, what only migrating, seeding and erasing are told. */
export const ownerEnvironment = (folders, runState) => ({
  ...localEnvironment(folders, runState),
  DATABASE_OWNER_URL: databaseUrl(runState, 'owner'),
});
export const workerEnvironment = (folders, runState) => ({
  ...localEnvironment(folders, runState),
  DATABASE_PURGE_URL: databaseUrl(runState, 'purge'),
});

/**
 * Where the database is given from outside, so is all the rest: nothing local, no demo, no stand-ins.
 * @param forWorker the one process that may erase
 */
export function outsideEnvironment(runState, { forWorker = false, given = process.env } = {}) {
  const env = { ...given, ...COMMON, PORT: String(runState.ports.web) };
  env.APP_ORIGIN ??= `http://127.0.0.1:${runState.ports.web}`;
  const kept = ['RUCKLE_LOCAL', 'MAIL_CATCHER_DIR', 'DATABASE_OWNER_URL'];
  for (const name of forWorker ? kept : [...kept, 'DATABASE_PURGE_URL']) delete env[name];
  return env;
}
