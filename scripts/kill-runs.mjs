import { installPackages, requireNode } from './packages.mjs';

requireNode();
installPackages();
const { build } = await import('./start/build.mjs');
console.log((await build()).said);
const { register } = await import('tsx/esm/api');
register();
const { killRuns } = await import('./kill-runs/kill-runs.ts');
process.exitCode = (await killRuns()) ? 0 : 1;
