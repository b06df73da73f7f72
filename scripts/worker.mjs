import { requireNode } from './packages.mjs';

requireNode();
const { work } = await import('./start/worker.mjs');
await work();
