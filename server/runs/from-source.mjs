import { register } from 'tsx/esm/api';

// a thread does not take over how its process reads TypeScript
register();
export const { compute } = await import('./compute.ts');
