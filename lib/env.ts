import 'server-only';
import { z } from 'zod';

/** All configuration, parsed once. Nothing else reads `process.env`. */
const schema = z.object({
  DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/ }),
  APP_ORIGIN: z.url({ protocol: /^https?$/ }).transform((text) => new URL(text).origin),
  ALLOW_PLAIN_HTTP: z.literal('1').optional(),
  TRUSTED_PROXIES: z.coerce.number().int().min(0).max(8).default(0),
  S3_ENDPOINT: z.url(),
  S3_BUCKET: z.string().min(1),
  S3_REGION: z.string().min(1).default('local'),
  S3_ACCESS_KEY_ID: z.string().min(1),
  S3_SECRET_ACCESS_KEY: z.string().min(1),
  SMTP_URL: z.url({ protocol: /^smtps?$/ }),
  MAIL_FROM: z.string().min(3).default('Ruckle <no-reply@ruckle.invalid>'),
  RUCKLE_LOCAL: z.literal('1').optional(),
  MAIL_CATCHER_DIR: z.string().optional(),
  LOG_LEVEL: z.enum(['silent', 'error', 'warn', 'info', 'debug']).default('info'),
});

export type Env = z.infer<typeof schema>;

const LOOPBACK = /^(127(\.\d{1,3}){3}|localhost|\[::1\])$/;
const isLoopback = (url: string) => LOOPBACK.test(new URL(url).hostname);

/**
 * @param raw the process's environment
 * @throws Error naming every faulty variable (never its value), or refusing local stand-ins on a reachable address
 */
export function parseEnv(raw: Record<string, string | undefined>): Env {
  const result = schema.safeParse(raw);
  if (!result.success) {
    const names = result.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`The configuration is incomplete. ${names.join('; ')}`);
  }
  const env = result.data;
  if (env.RUCKLE_LOCAL && !(isLoopback(env.DATABASE_URL) && isLoopback(env.APP_ORIGIN))) {
    throw new Error(
      'RUCKLE_LOCAL=1 is for one machine: DATABASE_URL and APP_ORIGIN must be loopback addresses.',
    );
  }
  if (env.APP_ORIGIN.startsWith('http:') && !isLoopback(env.APP_ORIGIN) && !env.ALLOW_PLAIN_HTTP) {
    throw new Error('APP_ORIGIN is plain http on a reachable address; use https, or set ALLOW_PLAIN_HTTP=1.');
  }
  return env;
}

let parsed: Env | undefined;

export function env(): Env {
  parsed ??= parseEnv(process.env);
  return parsed;
}
