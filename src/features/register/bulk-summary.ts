import type {
  BuildingAttributes,
  BuildingField,
  BuildingValue,
} from '../../../shared/schemas/building-fields.ts';
import { BUILDING_FIELD_NAMES } from '../../../shared/schemas/building-fields.ts';
import { formatCount } from '../../../shared/presentation/format-number.ts';
import { factsOf, formatFigure, inSentence } from '../../../shared/presentation/field-words.ts';

/** One value to be set, and how many buildings have what now. */
export type BulkLine = {
  readonly field: BuildingField;
  readonly value: BuildingValue;
  readonly same: number;
  readonly unknown: number;
};

/** The fields that are to be set, with their values. */
export function fieldsSet(
  attributes: BuildingAttributes,
): readonly { readonly field: BuildingField; readonly value: BuildingValue }[] {
  return BUILDING_FIELD_NAMES.flatMap((field) => {
    const value = attributes[field];
    return value === undefined ? [] : [{ field, value }];
  });
}

function buildings(count: number): string {
  return count === 1 ? '1 building' : `${formatCount(count)} buildings`;
}

function valueWords(field: BuildingField, value: BuildingValue): string {
  if (value === null) return 'not known';
  if (typeof value === 'string') return value;
  const { unit } = factsOf(field);
  return `${formatFigure(field, value)}${unit === undefined ? '' : ` ${unit}`}`;
}

/** As "Set construction to masonry". */
export function setWords(field: BuildingField, value: BuildingValue): string {
  return `Set ${inSentence(field)} to ${valueWords(field, value)}`;
}

/** As "Set construction to masonry for 43 buildings; 12 of them have another value now." */
export function lineWords({ field, value, same, unknown }: BulkLine, count: number): string {
  const other = count - same - (value === null ? 0 : unknown);
  const start = `${setWords(field, value)} for ${buildings(count)}`;
  if (same === count) return `${start}; ${count === 1 ? 'it has' : 'all have'} it already.`;
  if (other <= 0) return `${start}; none of them has another value now.`;
  const have = other === 1 ? 'has' : 'have';
  return `${start}; ${formatCount(other)} of them ${have} another value now.`;
}

/** What was done, for the note that offers to undo it. */
export function doneWords(attributes: BuildingAttributes, count: number): string {
  const set = fieldsSet(attributes).map(({ field, value }) =>
    setWords(field, value).replace(/^Set (.*) to /, '$1 set to '),
  );
  const words = set.join(', ');
  return `${words.charAt(0).toUpperCase()}${words.slice(1)} for ${buildings(count)}.`;
}
