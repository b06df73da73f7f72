import { installPackages, requireNode } from './packages.mjs';
import { ARCHITECTURE, FORMAT, LINT, run, TYPES, UNUSED } from './tools.mjs';

/** Two processors; the longest run goes first. */
const AT_ONCE = 2;

requireNode();
installPackages();
const start = performance.now();
const waiting = [LINT, ARCHITECTURE, TYPES, FORMAT, UNUSED];
const failed = [];

async function work() {
  for (let tool = waiting.shift(); tool !== undefined; tool = waiting.shift()) {
    const { passed, output } = await run(tool, { kept: true });
    if (passed) continue;
    failed.push(tool.title);
    console.log(`== ${tool.title}\n${output}\n`);
  }
}

await Promise.all(Array.from({ length: AT_ONCE }, work));
const verdict = failed.length === 0 ? 'All checks passed' : `Failed: ${failed.join(', ')}`;
console.log(`${verdict} (${((performance.now() - start) / 1000).toFixed(1)} s)`);
process.exitCode = failed.length === 0 ? 0 : 1;
