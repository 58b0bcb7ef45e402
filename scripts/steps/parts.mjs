import { existsSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { ROOT } from './folders.mjs';
import { run } from './run.mjs';

const bin = (name) => join(ROOT, 'node_modules', '.bin', name);
const ENV = { ...process.env, NEXT_TELEMETRY_DISABLED: '1', CI: process.env.CI ?? '1' };

/** A check that passes or does not: counts as one. */
export const check = (name, commands) => ({
  name,
  run: async () => {
    for (const [command, ...args] of commands) {
      const { code, printed } = await run(bin(command), args, {
        cwd: ROOT,
        env: ENV,
        allowFailure: true,
        quiet: false,
      });
      if (code !== 0) return { passed: 0, failed: 1, printed };
    }
    return { passed: 1, failed: 0 };
  },
});

function readReport(file) {
  if (!existsSync(file)) return null;
  return JSON.parse(readFileSync(file, 'utf8'));
}

/** Vitest over some of its projects; what it says of itself is counted, not what it printed. */
export const vitest = (name, projects, envOf = () => ({})) => ({
  name,
  run: async (context) => {
    const report = join(context.folders.data, `${name}.json`);
    rmSync(report, { force: true });
    const args = [
      'run',
      ...projects.flatMap((project) => ['--project', project]),
      '--reporter=default',
      '--reporter=json',
      `--outputFile.json=${report}`,
    ];
    const { code } = await run(bin('vitest'), args, {
      cwd: ROOT,
      env: { ...ENV, ...envOf(context) },
      allowFailure: true,
      quiet: false,
    });
    const told = readReport(report);
    if (!told) return { passed: 0, failed: 1 };
    const failed = told.numFailedTests + (code !== 0 && told.numFailedTests === 0 ? 1 : 0);
    return { passed: told.numPassedTests, failed };
  },
});

/** Playwright against the built application. */
export const playwright = (name, envOf) => ({
  name,
  run: async (context) => {
    const report = join(context.folders.data, `${name}.json`);
    rmSync(report, { force: true });
    const env = { ...ENV, ...(await envOf(context)), PLAYWRIGHT_JSON_OUTPUT_NAME: report };
    const { code } = await run(bin('playwright'), ['test', '--reporter=line,json'], {
      cwd: ROOT,
      env,
      allowFailure: true,
      quiet: false,
    });
    const told = readReport(report);
    if (!told) return { passed: 0, failed: 1 };
    const { expected, unexpected, flaky, skipped } = told.stats;
    const failed = unexpected + flaky + skipped;
    return { passed: expected, failed: failed + (code !== 0 && failed === 0 ? 1 : 0) };
  },
});
