// npm test: everything, from a bare clone, ending in one line. npm test -- unit e2e runs only those parts.
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { checkNode, ensurePackages } from './prepare.mjs';
import { installFromDebian } from './debian.mjs';
import { root } from './place.mjs';
import { findFreePort } from './ports.mjs';
import { endRunning, isInPath, lastLines, run } from './run.mjs';
import { Halt, say, sayFailure, secondsSince } from './say.mjs';

/** @typedef {{ passed: number, failed: number, skipped: number }} Count */
/** @typedef {{ name: string, needs?: ('database' | 'chromium' | 'poppler')[], run: (context: Context) => Promise<{ count: Count, output: string }> }} Part */
/** @typedef {{ env: Record<string, string | undefined>, reports: string }} Context */

const chromium = process.env.CHROMIUM ?? '/usr/bin/chromium';

/** @param {string[]} args @param {Context} context */
const node = (args, { env }) => run(process.execPath, args, { cwd: root, env });

/** A check that passes or fails as a whole, and counts as one. @param {string} name @param {string[]} args @returns {Part} */
const check = (name, args) => ({
  name,
  run: async (context) => {
    const { code, output } = await node(args, context);
    return { count: { passed: code === 0 ? 1 : 0, failed: code === 0 ? 0 : 1, skipped: 0 }, output };
  },
});

/** The figures of a Vitest or Playwright report; a part that ends badly without one has failed once. @param {string} file @param {number} code @returns {Count} */
function readReport(file, code) {
  if (!fs.existsSync(file)) return { passed: 0, failed: code === 0 ? 0 : 1, skipped: 0 };
  const report = JSON.parse(fs.readFileSync(file, 'utf8'));
  const count =
    'numPassedTests' in report
      ? {
          passed: report.numPassedTests,
          failed: report.numFailedTests,
          skipped: report.numPendingTests + report.numTodoTests,
        }
      : {
          passed: report.stats.expected + report.stats.flaky,
          failed: report.stats.unexpected,
          skipped: report.stats.skipped,
        };
  // A file that does not load, or an error outside of any test, fails no test by name.
  return code !== 0 && count.failed === 0 ? { ...count, failed: 1 } : count;
}

/** @param {string} name @param {Part['needs']} [needs] @returns {Part} */
const vitest = (name, needs = []) => ({
  name,
  needs,
  run: async (context) => {
    const report = path.join(context.reports, `${name}.json`);
    const args = ['run', '--project', name, '--passWithNoTests', '--reporter=default', '--reporter=json'];
    const { code, output } = await node(
      ['node_modules/vitest/vitest.mjs', ...args, `--outputFile.json=${report}`],
      context,
    );
    return { count: readReport(report, code), output };
  },
});

/** @type {Part} */
const endToEnd = {
  name: 'e2e',
  needs: ['database', 'chromium'],
  run: async (context) => {
    const report = path.join(context.reports, 'e2e.json');
    const { code, output } = await node(
      ['node_modules/@playwright/test/cli.js', 'test', '--reporter=list,json', '--pass-with-no-tests'],
      {
        ...context,
        env: {
          ...context.env,
          PLAYWRIGHT_JSON_OUTPUT_NAME: report,
          RAGLAN_E2E_PORT: String(await findFreePort()),
          RAGLAN_E2E_INBOX_PORT: String(await findFreePort()),
          RAGLAN_E2E_SECOND_PORT: String(await findFreePort()),
        },
      },
    );
    return { count: readReport(report, code), output };
  },
};

/** @type {Part[]} */
const parts = [
  check('format', ['node_modules/prettier/bin/prettier.cjs', '--check', '--log-level=warn', '.']),
  check('lint', ['node_modules/eslint/bin/eslint.js', '.', '--max-warnings', '0']),
  check('types', ['scripts/types.mjs']),
  check('boundaries', ['scripts/boundaries.mjs']),
  check('dead-code', ['node_modules/knip/bin/knip.js']),
  vitest('unit'),
  vitest('published'),
  vitest('component'),
  vitest('integration', ['database']),
  vitest('tenancy', ['database']),
  vitest('golden', ['poppler']),
  endToEnd,
];

/** @param {string[]} names */
function chooseParts(names) {
  const unknown = names.filter((name) => !parts.some((part) => part.name === name));
  if (unknown.length > 0) {
    const known = parts.map((part) => part.name).join(', ');
    throw new Halt(`There is no part called ${unknown.join(', ')}. The parts are: ${known}.`);
  }
  return names.length === 0 ? parts : parts.filter((part) => names.includes(part.name));
}

/** Brings what the chosen parts need and is not there. @param {Part[]} chosen */
async function installTools(chosen) {
  const needs = new Set(chosen.flatMap((part) => part.needs ?? []));
  const missing = [];
  if (needs.has('chromium') && !fs.existsSync(chromium)) missing.push('chromium');
  if (needs.has('poppler') && !(await isInPath('pdftoppm'))) missing.push('poppler-utils');
  if (missing.length > 0) await installFromDebian(missing, 'is needed by the tests');
  return needs;
}

/** @param {Count} count */
const describe = ({ passed, failed, skipped }) =>
  `${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`;

const closers = /** @type {(() => Promise<void>)[]} */ ([]);
const close = async () => {
  for (const closer of closers.splice(0).reverse()) await closer();
};
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
  process.once(signal, () => {
    endRunning();
    void close().finally(() => process.exit(130));
  });
}

async function main() {
  const start = performance.now();
  checkNode();
  const chosen = chooseParts(process.argv.slice(2));
  await ensurePackages();
  const needs = await installTools(chosen);

  const reports = fs.mkdtempSync(path.join(os.tmpdir(), 'raglan-reports-'));
  closers.push(async () => fs.rmSync(reports, { recursive: true, force: true }));
  /** @type {Context} */
  const context = { env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1', CHROMIUM: chromium }, reports };
  if (process.env.CI) context.env.NO_COLOR = '1';
  // Settings of a real installation must not reach the tests.
  for (const name of Object.keys(context.env)) {
    if (/^(DATABASE_URL|SMTP_URL|MAIL_|RAGLAN_(DATABASE|OWNER|BASE)_URL|RAGLAN_DEMO|NEXTAUTH_)/.test(name)) {
      Reflect.deleteProperty(context.env, name);
    }
  }
  if (needs.has('database')) {
    const { openTestCluster, sharedClusterVariable } = await import('./test-cluster.mjs');
    const { cluster, close: remove } = await openTestCluster();
    closers.push(remove);
    context.env[sharedClusterVariable] = JSON.stringify(cluster);
  }
  say(`Ready to test (${secondsSince(start)}).`);

  const total = { passed: 0, failed: 0, skipped: 0 };
  const failures = [];
  for (const part of chosen) {
    const began = performance.now();
    const { count, output } = await part.run(context);
    if (count.failed > 0) say(`\n${lastLines(output, 200)}\n`);
    say(`${part.name.padEnd(12)} ${describe(count).padEnd(34)} ${secondsSince(began)}`);
    if (count.failed > 0) failures.push(part.name);
    total.passed += count.passed;
    total.failed += count.failed;
    total.skipped += count.skipped;
  }
  say(`\n${failures.length > 0 ? `Failed: ${failures.join(', ')}. ` : ''}All in ${secondsSince(start)}.`);
  return total;
}

/** @type {Count} */
let total = { passed: 0, failed: 1, skipped: 0 };
try {
  total = await main();
} catch (error) {
  sayFailure(error);
} finally {
  await close();
}
say(describe(total));
process.exit(total.failed > 0 || total.passed === 0 ? 1 : 0);
