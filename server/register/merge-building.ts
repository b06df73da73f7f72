import type { BuildingValue } from '../../shared/schemas/building-fields.ts';

/** Values by field; of a footprint its hash. */
export type MergeValues = Readonly<Record<string, BuildingValue>>;

export type Merging = {
  /** What the register holds. */
  readonly ours: MergeValues;
  /** What the last file said; a field that no file spoke of is not in it. */
  readonly base: MergeValues;
  /** What this file says; a field that it does not speak of is not in it. */
  readonly theirs: MergeValues;
  readonly settle: 'ask' | 'keep ours' | 'take theirs';
};

export type MergedField = {
  readonly field: string;
  readonly ours: BuildingValue;
  readonly theirs: BuildingValue;
  /** Both the register and the file changed it. */
  readonly isConflict: boolean;
  /** The register's value stays. */
  readonly isKept: boolean;
};

export type Merged = {
  readonly outcome: 'changed' | 'same' | 'conflict';
  /** Where the file and the register differ. */
  readonly fields: readonly MergedField[];
  /** What the file has said now, with what earlier files said of other fields. */
  readonly imported: MergeValues;
};

function judged({ ours, base, theirs, settle }: Merging, field: string): MergedField | undefined {
  const [here, there] = [ours[field] ?? null, theirs[field] ?? null];
  if (here === there) return undefined;
  const known = base[field];
  const told = { field, ours: here, theirs: there };
  // nobody filled it in by hand, or the file has nothing to say against what somebody did
  if (known === undefined && here === null) return { ...told, isConflict: false, isKept: false };
  if (known === undefined && there === null) return { ...told, isConflict: false, isKept: true };
  if (known !== undefined && there === known) return { ...told, isConflict: false, isKept: true };
  if (known !== undefined && here === known) return { ...told, isConflict: false, isKept: false };
  return { ...told, isConflict: true, isKept: settle !== 'take theirs' };
}

/**
 * Joins what a file says of a building with the register, field by field: what the file did not change
 * since the last one stays as the register has it, hand edits with it; what the register did not change
 * is taken from the file; where both changed it is a conflict, settled as wanted.
 */
export function mergeBuilding(merging: Merging): Merged {
  const { base, theirs } = merging;
  const fields = Object.keys(theirs).flatMap((field) => {
    const merged = judged(merging, field);
    return merged === undefined ? [] : [merged];
  });
  const isChanged = fields.some(({ isKept }) => !isKept);
  const isConflict = fields.some((field) => field.isConflict);
  const outcome = isConflict ? 'conflict' : isChanged ? 'changed' : 'same';
  return { outcome, fields, imported: { ...base, ...theirs } };
}
