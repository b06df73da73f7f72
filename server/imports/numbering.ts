/** Gives footprints of a file without references their numbers. */
export type Numbering = { readonly next: (hash: string | null) => string };

const DIGITS = 4;

/**
 * Numbers footprints after a prefix, from one above the highest number that the register has with it. A
 * footprint that an earlier file brought in keeps the reference it was given then.
 */
export function createNumbering(
  prefix: string,
  taken: readonly { readonly reference: string; readonly hash: string | null }[],
): Numbering {
  const known = new Map<string, string>();
  let highest = 0;
  for (const { reference, hash } of taken) {
    if (hash !== null) known.set(hash, reference);
    const number = reference.startsWith(prefix) ? reference.slice(prefix.length) : '';
    if (/^\d{1,9}$/.test(number)) highest = Math.max(highest, Number(number));
  }
  return {
    next: (hash) => {
      const reference = hash === null ? undefined : known.get(hash);
      if (reference !== undefined) return reference;
      highest += 1;
      return `${prefix}${String(highest).padStart(DIGITS, '0')}`;
    },
  };
}
