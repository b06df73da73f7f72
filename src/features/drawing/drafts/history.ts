/** A draft with the steps that led to it and those that were taken back. */
export type History<T> = {
  readonly past: readonly T[];
  readonly present: T;
  readonly future: readonly T[];
};

export function begun<T>(present: T): History<T> {
  return { past: [], present, future: [] };
}

/** One step further; what was taken back before is forgotten. No change is no step. */
export function stepped<T>({ past, present, ...rest }: History<T>, next: T): History<T> {
  if (next === present) return { past, present, ...rest };
  return { past: [...past, present], present: next, future: [] };
}

export function undone<T>(history: History<T>): History<T> {
  const { past, present, future } = history;
  const before = past.at(-1);
  if (before === undefined) return history;
  return { past: past.slice(0, -1), present: before, future: [present, ...future] };
}

export function redone<T>(history: History<T>): History<T> {
  const { past, present, future } = history;
  const [next, ...later] = future;
  if (next === undefined) return history;
  return { past: [...past, present], present: next, future: later };
}
