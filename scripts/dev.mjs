import { requireNode } from './packages.mjs';

requireNode();
const { dev } = await import('./start/dev.mjs');
await dev();
