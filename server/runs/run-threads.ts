import { availableParallelism } from 'node:os';
import { Piscina } from 'piscina';
import type { Asked, Computed } from './compute.ts';

/** Where a run's arithmetic is done. */
export type RunThreads = {
  readonly size: number;
  readonly compute: <A extends Asked>(asked: A) => Promise<Computed<A>>;
  readonly close: () => Promise<void>;
};

/** A thread that waits so long for work goes, in milliseconds. */
const IDLE = 30_000;

/** Beside the sources while they are read as they are, beside the built server otherwise. */
function entry(): string {
  const isSource = import.meta.url.endsWith('.ts');
  return new URL(isSource ? './from-source.mjs' : './runs/compute.mjs', import.meta.url).href;
}

/** Threads for the arithmetic of runs, one for each processor, so that requests are answered meanwhile. */
export function openRunThreads(size = availableParallelism()): RunThreads {
  const pool = new Piscina({
    filename: entry(),
    name: 'compute',
    minThreads: 0,
    maxThreads: size,
    idleTimeout: IDLE,
    execArgv: [],
  });
  return {
    size,
    compute: <A extends Asked>(asked: A) => pool.run(asked) as Promise<Computed<A>>,
    close: () => pool.destroy(),
  };
}
