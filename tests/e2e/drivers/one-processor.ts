import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';

/** The processors that this process may use, by their numbers. */
function processors(): number[] {
  const status = readFileSync('/proc/self/status', 'utf8');
  const [, list = '0'] = /^Cpus_allowed_list:\s*(\S+)/m.exec(status) ?? [];
  return list.split(',').flatMap((range) => {
    const [first = 0, last = first] = range.split('-').map(Number);
    return Array.from({ length: last - first + 1 }, (_, k) => first + k);
  });
}

/**
 * Keeps this worker, and the browser that it opens from now on, to one processor. Maps are drawn by software
 * in many small steps, and handing each to another processor takes longer than the step.
 */
export function keepToOneProcessor(): void {
  const all = processors();
  const own = all[Number(process.env.VITEST_POOL_ID ?? 1) % all.length] ?? 0;
  execFileSync('/usr/bin/taskset', ['-a', '-c', '-p', String(own), String(process.pid)]);
}
