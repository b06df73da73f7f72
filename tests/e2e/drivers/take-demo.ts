import { mkdirSync, rmdirSync } from 'node:fs';
import { inject } from 'vitest';

type TakenDemo = { readonly address: string; readonly giveBack: () => void };

function isMade(folder: string): boolean {
  try {
    mkdirSync(folder);
    return true;
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'EEXIST') return false;
    throw error;
  }
}

/** Takes a demo that no other worker is using. A folder says that it is taken: only one can make it. */
export function takeDemo(): TakenDemo {
  for (const { address, claim } of inject('demo').places) {
    if (!isMade(claim)) continue;
    return {
      address,
      giveBack: () => {
        rmdirSync(claim);
      },
    };
  }
  throw new Error('There is no demo for this worker: all are taken.');
}
