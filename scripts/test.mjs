import { existsSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { installPackages, requireNode, root } from './packages.mjs';
import { testCounts } from './test-counts.mjs';
import { FORMAT, LINT, run, TESTS, TYPES, UNUSED } from './tools.mjs';

const REPORT = path.join(root, '.cache', 'vitest.json');

async function checkCounts(tool) {
  const { passed } = await run(tool);
  return { passed: Number(passed), failed: Number(!passed) };
}

/** Counts tests one by one. Where they are chosen by name, the others in their files are not missed. */
async function counts(tool, more) {
  if (tool !== TESTS) return checkCounts(tool);
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
installPackages();
const more = process.argv.slice(2);
const total = { passed: 0, failed: 0 };
for (const tool of more.length > 0 ? [TESTS] : [TYPES, LINT, FORMAT, UNUSED, TESTS]) {
  console.log(`\n== ${tool.title}`);
  const start = performance.now();
  const { passed, failed } = await counts(tool, more);
  const seconds = ((performance.now() - start) / 1000).toFixed(1);
  console.log(`== ${tool.title}: ${failed === 0 ? 'passed' : 'FAILED'} in ${seconds} s`);
  total.passed += passed;
  total.failed += failed;
}
console.log(`\n${total.passed} passed, ${total.failed} failed`);
process.exitCode = total.failed === 0 ? 0 : 1;
