import { BUILDING_FIELDS } from '../../../shared/schemas/building-fields.ts';
import type { BuildingHistory } from '../../../shared/schemas/register-changes.ts';
import type { ValueChange } from '../../lib/changes-between.ts';
import { EDITED_NAMES } from './building-draft.ts';
import { factsOf, formatFigure } from '../../../shared/presentation/field-words.ts';

type Entry = BuildingHistory[number];

/** What was done, in a word or two. */
const DONE: Readonly<Record<Entry['kind'], string>> = {
  import: 'brought in or updated by import',
  draw: 'drawn',
  edit: 'changed by hand',
  'edit many': 'changed with others',
  split: 'split',
  join: 'joined',
  remove: 'removed',
  ground: 'ground level sampled',
  visit: 'found on a visit',
  undo: 'undone',
  redo: 'done again',
};

export function doneWords({ kind, before, after, source }: Entry): string {
  const done = before === null && kind === 'undo' ? 'brought back' : DONE[kind];
  const words = after === null && kind !== 'remove' ? `${done}: taken out` : done;
  return source === null ? words : `${words}, ${source}`;
}

function isField(name: string): name is keyof typeof BUILDING_FIELDS {
  return name in BUILDING_FIELDS;
}

function wordsOf(name: 'footprint' | (typeof EDITED_NAMES)[number], value: unknown): string {
  if (value === null || value === undefined) return 'not known';
  if (typeof value === 'number') {
    if (name === 'footprint') return `${formatFigure('area', value)} m²`;
    const unit = isField(name) ? factsOf(name).unit : undefined;
    return `${formatFigure(name, value)}${unit === undefined ? '' : ` ${unit}`}`;
  }
  return typeof value === 'string' ? value : JSON.stringify(value);
}

/** The values that an entry changed; none for a building that came in or was taken out. */
export function valueChanges({ before, after }: Entry): readonly ValueChange[] {
  if (before === null || after === null) return [];
  return (['footprint', ...EDITED_NAMES] as const)
    .filter((name) => name in before || name in after)
    .map((name) => ({
      path: name === 'footprint' ? 'Footprint' : factsOf(name).label,
      before: wordsOf(name, before[name]),
      after: wordsOf(name, after[name]),
    }));
}
