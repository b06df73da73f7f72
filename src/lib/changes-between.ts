/** One value that a change touched; undefined where there was none. */
export type ValueChange = {
  readonly path: string;
  readonly before: string | undefined;
  readonly after: string | undefined;
};

type Values = Readonly<Record<string, unknown>> | null;

function wordsOf(value: unknown): string {
  if (value === null) return 'none';
  if (value === true) return 'yes';
  if (value === false) return 'no';
  if (value === '') return 'empty';
  return typeof value === 'string' ? value : JSON.stringify(value);
}

function isPlain(value: unknown): value is object {
  return typeof value === 'object' && value !== null;
}

function leaves(value: unknown, path: string, found: Map<string, string>): void {
  const parts = isPlain(value) ? Object.entries(value) : [];
  if (parts.length === 0) {
    found.set(path, Array.isArray(value) ? 'none' : wordsOf(value));
    return;
  }
  for (const [key, part] of parts) {
    const name = Array.isArray(value) ? String(Number(key) + 1) : key;
    leaves(part, path === '' ? name : `${path} ${name}`, found);
  }
}

function leavesOf(values: Values): Map<string, string> {
  const found = new Map<string, string>();
  if (values !== null && Object.keys(values).length > 0) leaves(values, '', found);
  return found;
}

/** What differs between what was before and what came after, value by value. */
export function changesBetween(before: Values, after: Values): ValueChange[] {
  const [old, fresh] = [leavesOf(before), leavesOf(after)];
  const paths = new Set([...old.keys(), ...fresh.keys()]);
  return [...paths]
    .map((path) => ({ path, before: old.get(path), after: fresh.get(path) }))
    .filter((change) => change.before !== change.after);
}
