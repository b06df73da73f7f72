/** The unbroken runs of what is there, between what is null. */
export function runsOf<T>(all: readonly (T | null)[]): readonly (readonly T[])[] {
  const runs: T[][] = [[]];
  for (const one of all) {
    if (one === null) runs.push([]);
    else runs.at(-1)?.push(one);
  }
  return runs.filter(({ length }) => length > 0);
}
