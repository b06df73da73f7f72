import { requireNode } from './packages.mjs';

requireNode();
const { start } = await import('./start/start.mjs');
await start();
