import { existsSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { ROOT } from './folders.mjs';
import { run } from './run.mjs';

const bin = (name) => join(ROOT, 'node_modules', '.bin', name);
const ENV = {
  ...process.env,
  NEXT_TELEMETRY_DISABLED: '1',
  AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true',
  CI: process.env.CI ?? '1',
};

/** A check that passes or does not: counts as one. */
export const check = (name, commands) => ({
  name,
  needs: [],
  run: async () => {
    for (const [command, ...args] of commands) {
      const { code } = await run(bin(command), args, {
        cwd: ROOT,
        env: ENV,
        allowFailure: true,
        quiet: false,
      });
      if (code !== 0) return { passed: 0, failed: 1 };
    }
    return { passed: 1, failed: 0 };
  },
});

// A runner that ends badly with no failing test of its own (a file that does not load) has failed all the same.
const counted = (passed, failed, code) => ({ passed, failed: failed + (code !== 0 && failed === 0 ? 1 : 0) });

/** Counts of vitest's own report. A test that was skipped has not passed: it counts as failed. */
export const countVitest = (told, code) =>
  counted(told.numPassedTests, told.numFailedTests + told.numPendingTests + told.numTodoTests, code);

/** Counts of Playwright's own report, to the same rule. */
export const countPlaywright = ({ stats }, code) =>
  counted(stats.expected, stats.unexpected + stats.flaky + stats.skipped, code);

function readReport(file) {
  if (!existsSync(file)) return null;
  return JSON.parse(readFileSync(file, 'utf8'));
}

/** Vitest over some of its projects; what it says of itself is counted, not what it printed. */
export const vitest = (name, projects, { needs = [], envOf = () => ({}) } = {}) => ({
  name,
  needs,
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
      env: { ...ENV, ...(await envOf(context)) },
      allowFailure: true,
      quiet: false,
    });
    const told = readReport(report);
    if (!told) return { passed: 0, failed: 1 };
    return countVitest(told, code);
  },
});

/** Playwright against the built application. One that is `onWish` runs only when it is asked for by name. */
export const playwright = (name, { needs, envOf, config = 'playwright.config.ts', onWish = false }) => ({
  name,
  needs,
  onWish,
  run: async (context) => {
    const report = join(context.folders.data, `${name}.json`);
    rmSync(report, { force: true });
    const env = { ...ENV, ...(await envOf(context)), PLAYWRIGHT_JSON_OUTPUT_NAME: report };
    const { code } = await run(bin('playwright'), ['test', '-c', config, '--reporter=line,json'], {
      cwd: ROOT,
      env,
      allowFailure: true,
      quiet: false,
    });
    const told = readReport(report);
    if (!told) return { passed: 0, failed: 1 };
    return countPlaywright(told, code);
  },
});
