import { readdirSync, readFileSync } from 'node:fs';

/** What stands in a file about a process; nothing where the process has ended since it was listed. */
function fileOf(pid: string | number, name: string): string {
  try {
    return readFileSync(`/proc/${pid}/${name}`, 'utf8');
  } catch {
    return '';
  }
}

function commandLine(pid: string): string[] {
  return fileOf(pid, 'cmdline').split('\0');
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
  return fileOf(pid, `task/${pid}/children`).split(' ').filter(Boolean).map(Number);
}
