/** Milliseconds of several runs, in order. */
export async function times(
  runs: number,
  run: (index: number) => Promise<unknown>,
): Promise<number[]> {
  const taken: number[] = [];
  for (let index = 0; index < runs; index += 1) {
    const start = performance.now();
    await run(index);
    taken.push(performance.now() - start);
  }
  return taken;
}

function at(sorted: readonly number[], share: number): string {
  return (sorted[Math.max(0, Math.ceil(share * sorted.length) - 1)] ?? NaN).toFixed(0);
}

/** What most runs take and what nineteen in twenty do not exceed, in words. */
export function percentiles(taken: readonly number[]): string {
  const sorted = [...taken].sort((a, b) => a - b);
  return `p50 ${at(sorted, 0.5)} ms, p95 ${at(sorted, 0.95)} ms, most ${at(sorted, 1)} ms`;
}
