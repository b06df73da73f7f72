/** Figures at the end of a reference, without what a split added: B0197, B0197-2. */
const COUNTED = /^(.*?)(\d+)(?:-\d+)?$/;

/** The reference after the last of a register. */
export function nextReference(last: string | undefined): string {
  if (last === undefined) return 'B0001';
  const [, stem = '', figures] = COUNTED.exec(last) ?? [];
  if (figures === undefined) return `${last}-2`;
  return `${stem}${String(Number(figures) + 1).padStart(figures.length, '0')}`;
}
