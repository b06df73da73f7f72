/** The median of several runs, in seconds. */
export function medianTime(runs: number, run: () => void): number {
  const times = Array.from({ length: runs }, () => {
    const start = performance.now();
    run();
    return (performance.now() - start) / 1000;
  });
  return times.sort((a, b) => a - b)[runs >> 1] ?? NaN;
}
