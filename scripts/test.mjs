import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { existsSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { installPackages, requireNode, root } from './packages.mjs';
import { testCounts } from './test-counts.mjs';
import { run, TESTS } from './tools.mjs';

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
const { passed, failed } = await testsCounted(process.argv.slice(2));
console.log(`\n${passed} passed, ${failed} failed`);
process.exitCode = failed === 0 ? 0 : 1;
