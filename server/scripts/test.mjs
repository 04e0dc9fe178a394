// npm test: set-up, types, lint, then every project of the tests; the last line sums them all up. Plain Node.
import { spawn } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { aptInstall, DATA_FOLDER, start, discard } from './postgres.mjs';
import { installPackages, ROOT } from './set-up.mjs';

process.chdir(ROOT);
const REPORT = join(DATA_FOLDER, `test-report-${process.pid}.json`);
const CHROMIUM = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];
const isRoot = process.getuid?.() === 0;
const say = (text) => console.log(`\n▸ ${text}`);

function ensureChromium() {
  if (process.env.CHROMIUM_PATH || CHROMIUM.some((path) => existsSync(path))) return;
  if (!isRoot || !existsSync('/usr/bin/apt-get')) {
    throw new Error(
      'Chromium was not found. Install it (Debian, Ubuntu: sudo apt-get install -y chromium) or set CHROMIUM_PATH.',
    );
  }
  say("installing Debian's chromium");
  aptInstall('chromium');
}

/** A cluster is made and thrown away: a missing PostgreSQL is installed here, once, and not by each project at once. */
async function ensurePostgres() {
  const folder = join(DATA_FOLDER, `test-${process.pid}-probe`);
  await start({ folder, fast: true });
  await discard({ folder });
}

/** Runs one tool of the project; what it says is shown, and its exit code is the answer. */
function run(title, args, { quiet = false } = {}) {
  return new Promise((done) => {
    const child = spawn(process.execPath, args, { stdio: ['ignore', 'pipe', 'pipe'], env: process.env });
    const said = [];
    for (const stream of [child.stdout, child.stderr]) {
      stream.on('data', (chunk) => (quiet ? said.push(chunk) : process.stdout.write(chunk)));
    }
    child.once('close', (code) => {
      if (quiet) say(`${title}: ${code === 0 ? 'all right' : 'FAILED'}`);
      if (quiet && code !== 0) process.stdout.write(Buffer.concat(said));
      done(code ?? 1);
    });
  });
}

/** What vitest wrote of its run; a run that died, or that skipped a test, has failed. */
function readReport(code) {
  if (!existsSync(REPORT)) return { passed: 0, failed: 1 };
  const report = JSON.parse(readFileSync(REPORT, 'utf8'));
  rmSync(REPORT);
  const broken = report.testResults.filter(
    (file) => file.status === 'failed' && !file.assertionResults.some((test) => test.status === 'failed'),
  ).length;
  const skipped = report.numPendingTests + report.numTodoTests;
  if (skipped > 0) say(`${skipped} tests were skipped; a skipped check counts as failed`);
  const failed = report.numFailedTests + broken + skipped;
  return { passed: report.numPassedTests, failed: failed === 0 && code !== 0 ? 1 : failed };
}

async function main() {
  installPackages(say);
  mkdirSync(DATA_FOLDER, { recursive: true });
  await ensurePostgres();
  ensureChromium();
  const { buildValidators } = await import('./build-validators.mjs');
  await buildValidators();
  const codes = await Promise.all([
    run('types', ['node_modules/typescript/bin/tsc', '--noEmit'], { quiet: true }),
    run('types of shared', ['node_modules/typescript/bin/tsc', '--noEmit', '-p', 'shared/tsconfig.json'], {
      quiet: true,
    }),
    run('lint', ['node_modules/eslint/bin/eslint.js', '.', '--max-warnings', '0'], { quiet: true }),
  ]);
  codes.push(await run('build', ['server/scripts/build.mjs'], { quiet: true }));
  say('tests');
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${REPORT}`];
  const code = await run('tests', [
    'node_modules/vitest/vitest.mjs',
    'run',
    ...reporters,
    ...process.argv.slice(2),
  ]);
  const { passed, failed } = readReport(code);
  const good = codes.filter((one) => one === 0).length;
  return { passed: passed + good, failed: failed + codes.length - good };
}

try {
  const { passed, failed } = await main();
  console.log(`\n${passed} passed, ${failed} failed`);
  process.exit(failed === 0 ? 0 : 1);
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  console.log('\n0 passed, 1 failed');
  process.exit(1);
}
