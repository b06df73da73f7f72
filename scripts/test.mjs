import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { existsSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { installPackages, requireNode, root } from './packages.mjs';
import { testCounts } from './test-counts.mjs';
import { BUILD, FORMAT, LINT, run, TESTS, TYPES, UNUSED } from './tools.mjs';

const REPORT = path.join(root, '.cache', 'vitest.json');

/** Counts tests one by one. Where they are chosen by name, the others in their files are not missed. */
async function testsCounted(more) {
  rmSync(REPORT, { force: true });
  const { passed: well } = await run(TESTS, { more });
  const report = existsSync(REPORT) ? JSON.parse(readFileSync(REPORT, 'utf8')) : {};
  const { passed, failed } = testCounts(report, {
    choosing: more.some((word) => /^(-t|--testNamePattern)\b/.test(word)),
  });
  const faultOutside = failed === 0 && (!well || passed === 0);
  return { passed, failed: faultOutside ? 1 : failed };
}

requireNode();
// what the tests need besides packages of npm comes meanwhile
const programs = spawn(process.execPath, ['scripts/start/test-programs.mjs'], {
  cwd: root,
  stdio: 'inherit',
});
const programsEnd = once(programs, 'exit');
installPackages();
const [status] = await programsEnd;
if (status !== 0) process.exit(1);
const more = process.argv.slice(2);
const total = { passed: 0, failed: 0 };

function count({ title }, start, { passed, failed }) {
  const seconds = ((performance.now() - start) / 1000).toFixed(1);
  console.log(`== ${title}: ${failed === 0 ? 'passed' : 'FAILED'} in ${seconds} s`);
  total.passed += passed;
  total.failed += failed;
}

/** One check after the other; what a check says is printed whole, since another lane prints meanwhile. */
async function checkLane(...tools) {
  for (const tool of tools) {
    const start = performance.now();
    const { passed, output } = await run(tool, { kept: true });
    if (output !== '') console.log(`\n${output}`);
    count(tool, start, { passed: Number(passed), failed: Number(!passed) });
  }
}

async function testLane() {
  console.log(`\n== ${TESTS.title}`);
  const start = performance.now();
  count(TESTS, start, await testsCounted(more));
}

async function quickLane() {
  await checkLane(TYPES, FORMAT, UNUSED, BUILD);
  await testLane();
}

// there are two processors, and linting takes longer than the other checks: tests begin beside it
await (more.length === 0 ? Promise.all([checkLane(LINT), quickLane()]) : testLane());
console.log(`\n${total.passed} passed, ${total.failed} failed`);
process.exitCode = total.failed === 0 ? 0 : 1;
