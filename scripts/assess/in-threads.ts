import { availableParallelism } from 'node:os';
import { statSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { isMainThread, parentPort, Worker, workerData } from 'node:worker_threads';
import type { AssessCase } from '../../shared/schemas/assess-case.ts';
import { assessWalls, preparedCase, type Part } from './assess-walls.ts';
import { CaseError } from './case-error.ts';
import { readCase } from './read-case.ts';

/** Threads take the walls in chunks of this size, whichever is free. */
const WALLS_PER_CHUNK = 250;
/** A smaller file is done sooner than another thread is started. */
const BYTES_WORTH_A_THREAD = 500_000;

type Job = { readonly file: string; readonly taken: SharedArrayBuffer };
type NumberedPart = readonly [chunk: number, part: Part];

/** Takes chunks until none is left. */
function assessChunks({ walls, ...input }: AssessCase, taken: SharedArrayBuffer): NumberedPart[] {
  const prepared = preparedCase(input);
  const counter = new Int32Array(taken);
  const parts: NumberedPart[] = [];
  for (;;) {
    const chunk = Atomics.add(counter, 0, 1);
    const first = chunk * WALLS_PER_CHUNK;
    if (first >= walls.length) return parts;
    const some = walls.slice(first, first + WALLS_PER_CHUNK);
    parts.push([chunk, assessWalls(prepared, some, first)]);
  }
}

function inOtherThread(job: Job): Promise<NumberedPart[]> {
  return new Promise((resolve, reject) => {
    const worker = new Worker(fileURLToPath(import.meta.url), { workerData: job });
    worker.once('message', resolve);
    worker.once('error', reject);
  });
}

/**
 * Reads a case and assesses its walls on all processors. Each thread reads the file itself: that takes
 * no longer than one reading, where handing the walls over would.
 */
export async function assessInThreads(file: string): Promise<Part[]> {
  const taken = new SharedArrayBuffer(Int32Array.BYTES_PER_ELEMENT);
  const size = statSync(file, { throwIfNoEntry: false })?.size ?? 0;
  const others = size < BYTES_WORTH_A_THREAD ? 0 : availableParallelism() - 1;
  const pending = Array.from({ length: others }, () => inOtherThread({ file, taken }));
  const own = assessChunks(readCase(file), taken);
  const parts = [...own, ...(await Promise.all(pending)).flat()];
  return parts.sort(([a], [b]) => a - b).map(([, part]) => part);
}

/** The bundle is also the worker's program: it answers its share, nothing where the case is at fault. */
export function answerAsWorker(): void {
  if (isMainThread) return;
  const { file, taken }: Job = workerData;
  try {
    parentPort?.postMessage(assessChunks(readCase(file), taken));
  } catch (error) {
    if (!(error instanceof CaseError)) throw error;
    parentPort?.postMessage([]);
  }
}
