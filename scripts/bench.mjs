import { installPackages, requireNode } from './packages.mjs';
import { bundled } from './bundle.mjs';

requireNode();
installPackages();
await bundled('scripts/assess/assess.ts');
const { bench } = await import(await bundled('scripts/bench/bench.ts'));
bench();
// the map is timed in a browser, with the client as it is served
const { CHROMIUM, installDebian, POSTGRESQL } = await import('./start/debian.mjs');
const { build } = await import('./start/build.mjs');
const { withSentences } = await import('./start/refusal.mjs');
await withSentences(async () => {
  installDebian(POSTGRESQL, CHROMIUM);
  await build();
});
// the server's parts need its packages, so they run from their sources
const { register } = await import('tsx/esm/api');
register();
const { benchServer } = await import('./bench/server.ts');
await benchServer();
