import { installPackages, requireNode } from './packages.mjs';

requireNode();
installPackages();
const { build } = await import('./start/build.mjs');
const { withSentences } = await import('./start/refusal.mjs');
await withSentences(async () => console.log((await build()).said));
