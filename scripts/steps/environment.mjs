import { databaseUrl } from './cluster.mjs';

/** What the application is told. A deployment sets the same names itself; only these scripts ever set RUCKLE_LOCAL. */
export function environmentOf(folders, runState, { database = 'ruckle' } = {}) {
  const { ports, secrets } = runState;
  return {
    ...process.env,
    NODE_ENV: 'production',
    NEXT_TELEMETRY_DISABLED: '1',
    AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true',
    RUCKLE_LOCAL: '1',
    DATABASE_URL: databaseUrl(runState, 'app', database),
    APP_ORIGIN: `http://127.0.0.1:${ports.web}`,
    PORT: String(ports.web),
    HOSTNAME: '127.0.0.1',
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
export const ownerEnvironment = (folders, runState, options) => ({
  ...environmentOf(folders, runState, options),
  DATABASE_OWNER_URL: databaseUrl(runState, 'owner', options?.database),
});
export const workerEnvironment = (folders, runState, options) => ({
  ...environmentOf(folders, runState, options),
  DATABASE_PURGE_URL: databaseUrl(runState, 'purge', options?.database),
});
