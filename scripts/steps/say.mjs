// Whoever read along may have gone (`npm start | head`): that must not end what runs.
for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {});

/** One voice for every script: what is being done, and how long it took. */
export const say = (text) => process.stdout.write(`${text}\n`);

export async function timed(label, work) {
  const began = performance.now();
  say(`· ${label} …`);
  const result = await work();
  say(`  done in ${((performance.now() - began) / 1000).toFixed(1)} s`);
  return result;
}

/** An expected failure: a sentence for the person, no stack. */
export class Stop extends Error {}

/** Says what went wrong: the sentence of an expected failure, the stack of a bug. */
export const complain = (thrown) =>
  process.stderr.write(`${thrown instanceof Stop ? thrown.message : (thrown?.stack ?? thrown)}\n`);

/** Runs `work` once at the first sign that we should stop, and never twice. */
export function onStopSignal(work) {
  let isStopping = false;
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'])
    process.on(signal, () => {
      if (!isStopping) void work();
      isStopping = true;
    });
}
