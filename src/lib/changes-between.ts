/** One value that a change touched; undefined where there was none. */
export type ValueChange = {
  readonly path: string;
  readonly before: string | undefined;
  readonly after: string | undefined;
};

type Values = Readonly<Record<string, unknown>> | null;

function isPlain(value: unknown): value is object {
  return typeof value === 'object' && value !== null;
}

function wordsOf(value: unknown): string {
  if (value === null) return 'none';
  if (value === true) return 'yes';
  if (value === false) return 'no';
  if (value === '') return 'empty';
  return typeof value === 'string' ? value : JSON.stringify(value);
}

/** A list of words or figures in one line; undefined for one of things that have parts. */
function inOneLine(value: unknown): string | undefined {
  if (!isPlain(value)) return wordsOf(value);
  if (!Array.isArray(value)) return Object.keys(value).length === 0 ? 'none' : undefined;
  if (value.some(isPlain)) return undefined;
  return value.length === 0 ? 'none' : value.map(wordsOf).join(', ');
}

function leaves(value: unknown, path: string, found: Map<string, string>): void {
  const line = inOneLine(value);
  if (line !== undefined || !isPlain(value)) {
    found.set(path, line ?? '');
    return;
  }
  for (const [key, part] of Object.entries(value)) {
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
