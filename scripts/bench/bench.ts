import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { availableParallelism, cpus, tmpdir } from 'node:os';
import path from 'node:path';
import { kernelTime } from './kernel-time.ts';
import { medianTime } from './median-time.ts';
import { twinBoreCase } from './twin-bore-case.ts';

const WALLS = 20_000;

function machine(): string {
  const model = cpus()[0]?.model ?? 'unknown processor';
  return `${model}, ${availableParallelism()} threads, Node ${process.version}`;
}

/** Seconds for the whole assess program, reading and printing included. */
function assessTime(folder: string, ranges: boolean, runs: number): number {
  const file = path.join(folder, ranges ? 'ranges.json' : 'central.json');
  writeFileSync(file, JSON.stringify(twinBoreCase(WALLS, ranges)));
  const program = path.join(import.meta.dirname, '..', 'scripts', 'assess.mjs');
  return medianTime(runs, () => {
    const { status } = spawnSync(process.execPath, [program, file], {
      stdio: ['ignore', 'ignore', 'inherit'],
    });
    if (status !== 0) throw new Error(`assess ended with status ${String(status)}`);
  });
}

/** Prints the figures of the calculation core, medians of several runs. */
export function bench(): void {
  const folder = mkdtempSync(path.join(tmpdir(), 'groundsill-bench-'));
  try {
    console.log(machine());
    console.log(`kernel: ${kernelTime().toFixed(1)} ns per point and piece (S, ∇S, Hess S, u, ε)`);
    for (const [name, ranges, runs] of [
      ['central values', false, 7],
      ['the bracket with breakpoint', true, 3],
    ] as const) {
      const seconds = assessTime(folder, ranges, runs);
      console.log(
        `assess, ${name}: ${WALLS} walls in ${seconds.toFixed(2)} s, ${(WALLS / seconds).toFixed(0)} walls per second, whole process`,
      );
    }
  } finally {
    rmSync(folder, { recursive: true });
  }
}
