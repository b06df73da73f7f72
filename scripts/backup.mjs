import { requireNode } from './packages.mjs';

requireNode();
const { backup } = await import('./start/backup.mjs');
await backup(process.argv.slice(2));
