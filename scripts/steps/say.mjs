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

/** Runs a script's main function; an expected failure prints its sentence, a bug its stack. */
export async function main(work) {
  try {
    await work();
  } catch (thrown) {
    process.stderr.write(`${thrown instanceof Stop ? thrown.message : (thrown?.stack ?? thrown)}\n`);
    process.exitCode = 1;
  }
}
