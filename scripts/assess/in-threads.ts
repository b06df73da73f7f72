import { availableParallelism } from 'node:os';
import { statSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { isMainThread, parentPort, Worker, workerData } from 'node:worker_threads';
import { z } from 'zod';
import { basisOf, type Basis } from '../../shared/assessment/basis.ts';
import type { CaseModel } from '../../shared/assessment/model-of-case.ts';
import type { AssessCase } from '../../shared/schemas/assess-case.ts';
import { assessWalls, preparedCase, type Part } from './assess-walls.ts';
import { CaseError } from './case-error.ts';
import { readCase } from './read-case.ts';

/** Threads take the walls in chunks of this size, whichever is free. */
const WALLS_PER_CHUNK = 250;
/** A smaller file is done sooner than another thread is started. */
const BYTES_WORTH_A_THREAD = 500_000;

const jobSchema = z.object({ file: z.string(), taken: z.instanceof(SharedArrayBuffer) });
type Job = z.infer<typeof jobSchema>;
type NumberedPart = readonly [chunk: number, part: Part];

/** Takes chunks until none is left. */
function assessChunks(
  prepared: CaseModel,
  walls: AssessCase['walls'],
  taken: SharedArrayBuffer,
): NumberedPart[] {
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
export async function assessInThreads(file: string): Promise<{ basis: Basis; parts: Part[] }> {
  const taken = new SharedArrayBuffer(Int32Array.BYTES_PER_ELEMENT);
  const size = statSync(file, { throwIfNoEntry: false })?.size ?? 0;
  const others = size < BYTES_WORTH_A_THREAD ? 0 : availableParallelism() - 1;
  const pending = Array.from({ length: others }, () => inOtherThread({ file, taken }));
  const { walls, ...input } = readCase(file);
  const prepared = preparedCase(input);
  const own = assessChunks(prepared, walls, taken);
  const parts = [...own, ...(await Promise.all(pending)).flat()];
  return {
    basis: basisOf(prepared.model, prepared.rules),
    parts: parts.sort(([a], [b]) => a - b).map(([, part]) => part),
  };
}

/** The bundle is also the worker's program: it answers its share, nothing where the case is at fault. */
export function answerAsWorker(): void {
  if (isMainThread) return;
  const { file, taken } = jobSchema.parse(workerData);
  try {
    const { walls, ...input } = readCase(file);
    parentPort?.postMessage(assessChunks(preparedCase(input), walls, taken));
  } catch (error) {
    if (!(error instanceof CaseError)) throw error;
    parentPort?.postMessage([]);
  }
}
