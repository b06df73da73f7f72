import type { ImportOptions, ImportRow } from '../../../shared/schemas/imports.ts';
import { formatCount } from '../../../shared/presentation/format-number.ts';
import { formatFigure } from '../../../shared/presentation/field-words.ts';
import { fieldWords } from './field-words.ts';

type RowChange = ImportRow['changes'][number];
type Way = ImportOptions['settle']['others'];

/** A value of a row as people read it; of a footprint its area. */
export function valueWords(value: RowChange['ours'], field: string): string {
  if (value === null) return 'not known';
  if (field === 'footprint') return `${formatFigure('area', Number(Number(value).toFixed(1)))} m²`;
  return typeof value === 'number' ? formatCount(value) : value;
}

/** Which of the two values will stand; null while that is to be said. */
export function standingOf({ isConflict, isKept }: RowChange, way: Way): 'ours' | 'theirs' | null {
  if (!isConflict) return isKept ? 'ours' : 'theirs';
  if (way === 'ask') return null;
  return way === 'keep ours' ? 'ours' : 'theirs';
}

/** What a changed field comes to. */
export function changeWords(change: RowChange, way: Way): string {
  const stands = standingOf(change, way);
  if (!change.isConflict) return stands === 'ours' ? 'changed here by hand; kept' : '';
  if (stands === null) return 'both changed';
  return stands === 'ours' ? 'both changed; ours stays' : 'both changed; theirs is taken';
}

/** Why a row comes to what it does, in one line: its first remark, else the fields that change. */
export function reasonOf({ remarks, changes }: ImportRow): string {
  const [first] = remarks;
  if (first !== undefined) return first;
  const fields = changes.map(({ field }) => fieldWords(field).label);
  return fields.length === 0 ? '' : fields.join(', ');
}
