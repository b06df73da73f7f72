import { installPackages, requireNode } from './packages.mjs';

requireNode();
installPackages();
const { build } = await import('./start/build.mjs');
console.log((await build()).said);
const { register } = await import('tsx/esm/api');
register();
const { killLetters } = await import('./kill-letters/kill-letters.ts');
process.exitCode = (await killLetters()) ? 0 : 1;
