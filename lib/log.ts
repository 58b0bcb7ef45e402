import 'server-only';
import pino, { type Logger } from 'pino';
import { env } from './env';

let logger: Logger | undefined;

/** Structured log: ids, verbs and timings only. No address, measurement, token or file name is ever passed to it. */
export function log(): Logger {
  logger ??= pino({
    level: env().LOG_LEVEL,
    base: { pid: process.pid },
    serializers: {
      // A database error repeats the row in `detail` and the values in `parameters`: keep what names the fault only.
      err: (thrown: unknown) =>
        thrown instanceof Error
          ? {
              type: thrown.name,
              code: 'code' in thrown ? String(thrown.code) : undefined,
              stack: stackOf(thrown),
            }
          : { type: typeof thrown },
    },
  });
  return logger;
}

const stackOf = (thrown: Error) => (thrown.stack ?? '').split('\n').slice(1, 6).join('\n');
