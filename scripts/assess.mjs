import { installPackages, requireNode } from './packages.mjs';
import { bundled } from './bundle.mjs';

requireNode();
installPackages();
const { assess } = await import(await bundled('scripts/assess/assess.ts'));
await assess(process.argv.slice(2));
