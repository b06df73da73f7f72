import { installPackages, requireNode } from './packages.mjs';
import { bundled } from './bundle.mjs';

requireNode();
installPackages();
await bundled('scripts/assess/assess.ts');
const { bench } = await import(await bundled('scripts/bench/bench.ts'));
bench();
