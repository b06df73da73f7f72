import type { RegisterField, RegisterFilter } from '../../../shared/schemas/register.ts';
import { formatCount } from '../../../shared/presentation/format-number.ts';
import { factsOf } from '../../../shared/presentation/field-words.ts';
import { choiceWords } from './choice-words.ts';
import {
  columnFilter,
  isBesideFields,
  type ColumnFilter,
  type FilterPart,
} from './filter-parts.ts';

const LABELS = {
  assumed: 'Assumed values',
  within: 'On the map',
  inside: 'Inside',
  importId: 'Import',
  ids: 'Chosen',
  except: 'Left out',
} as const;

/** What a part of a filter is called. */
export function partLabel(part: FilterPart): string {
  return isBesideFields(part) ? LABELS[part] : factsOf(part).label;
}

const MOST_NAMED = 2;

function anyWords(part: RegisterField, values: readonly (string | null)[]): string {
  const named = values.slice(0, MOST_NAMED).map((value) => choiceWords(part, value));
  const more = values.length - named.length;
  return more > 0 ? `${named.join(', ')} and ${more} more` : named.join(' or ');
}

function rangeWords({ from, to }: NonNullable<ColumnFilter['range']>, unit: string): string {
  const figure = (value: number) => `${formatCount(value)}${unit}`;
  if (from === undefined) return to === undefined ? 'any' : `up to ${figure(to)}`;
  if (to === undefined) return `from ${figure(from)}`;
  return from === to ? figure(from) : `${formatCount(from)} to ${figure(to)}`;
}

/** What a filter asks for here, in words; `importName` is what the import is called by. */
export function partWords(filter: RegisterFilter, part: FilterPart, importName = 'one'): string {
  if (!isBesideFields(part)) {
    const { any, range, unknown } = columnFilter(filter, part);
    const { unit } = factsOf(part);
    if (unknown === true && part !== 'area') return choiceWords(part, null);
    if (any !== undefined && part !== 'area') return anyWords(part, any);
    return range === undefined ? 'any' : rangeWords(range, unit === undefined ? '' : ` ${unit}`);
  }
  if (filter[part] === undefined) return 'any';
  switch (part) {
    case 'assumed':
      return filter.assumed === true ? 'some' : 'none';
    case 'within':
      return 'in view then';
    case 'inside':
      return 'the outline drawn';
    case 'importId':
      return importName;
    case 'ids':
    case 'except':
      return `${formatCount(filter[part].length)} buildings`;
  }
}
