import { installPackages, requireNode } from './packages.mjs';
import { bundled } from './bundle.mjs';

requireNode();
installPackages();
await bundled('scripts/assess/assess.ts');
const { bench } = await import(await bundled('scripts/bench/bench.ts'));
bench();
// the server's parts need its packages, so they run from their sources
const { register } = await import('tsx/esm/api');
register();
const { benchServer } = await import('./bench/server.ts');
await benchServer();
