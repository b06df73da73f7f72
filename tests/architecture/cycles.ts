import type { Import } from '../support/imports.ts';

/** Rings of files that import one another, types included; none where there is none. */
export function cyclesOf(imports: readonly Import[]): string[] {
  const targets = new Map<string, string[]>();
  for (const { from, target } of imports) {
    if (target !== undefined) targets.set(from, [...(targets.get(from) ?? []), target]);
  }
  const cycles: string[] = [];
  const done = new Set<string>();
  const trail: string[] = [];
  function visit(file: string): void {
    const start = trail.indexOf(file);
    if (start >= 0) cycles.push([...trail.slice(start), file].join(' → '));
    if (start >= 0 || done.has(file)) return;
    trail.push(file);
    for (const target of targets.get(file) ?? []) visit(target);
    trail.pop();
    done.add(file);
  }
  for (const file of targets.keys()) visit(file);
  return cycles;
}
