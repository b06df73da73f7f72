/** Keys and what they do, as the keys help lists them. */
export type KeyHelp = { readonly keys: readonly string[]; readonly does: string };

let atHand: readonly (readonly KeyHelp[])[] = [];
const listeners = new Set<() => void>();

function change(next: typeof atHand): void {
  atHand = next;
  for (const listener of listeners) listener();
}

/** Says that keys work for now; what it returns takes that back. */
export function putAtHand(help: readonly KeyHelp[]): () => void {
  change([...atHand, help]);
  return () => {
    change(atHand.toSpliced(atHand.lastIndexOf(help), 1));
  };
}

/** The lists of keys that work now, in the order they came. */
export function listsAtHand(): readonly (readonly KeyHelp[])[] {
  return atHand;
}

/** Calls back when other keys come to work. */
export function onKeysChange(callback: () => void): () => void {
  listeners.add(callback);
  return () => {
    listeners.delete(callback);
  };
}
