import { requireNode } from './packages.mjs';

requireNode();
const { restore } = await import('./start/restore.mjs');
await restore(process.argv.slice(2));
