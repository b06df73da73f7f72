import { readdirSync, readFileSync } from 'node:fs';

function commandLine(pid: string): string[] {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0');
  } catch {
    // it has ended since it was listed
    return [];
  }
}

/** The numbers of the processes whose command line holds some words, one after the other. */
export function processesWith(...words: readonly string[]): number[] {
  return readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name))
    .filter((pid) => commandLine(pid).join(' ').includes(words.join(' ')))
    .map(Number);
}

/** The processes that another one has started. */
export function childrenOf(pid: number): number[] {
  const children = readFileSync(`/proc/${pid}/task/${pid}/children`, 'utf8');
  return children.split(' ').filter(Boolean).map(Number);
}
