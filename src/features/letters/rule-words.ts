import type { LetterRule } from '../../../shared/schemas/letter-settings.ts';
import type { RegisterFilter } from '../../../shared/schemas/register.ts';
import { formatCount } from '../../../shared/presentation/format-number.ts';
import { FILTER_PARTS, isSet } from '../register/filter-parts.ts';
import { partLabel, partWords } from '../register/filter-words.ts';

function filterWords(filter: RegisterFilter): string[] {
  const search = filter.search === undefined || filter.search === '' ? [] : [`“${filter.search}”`];
  const parts = FILTER_PARTS.filter((part) => isSet(filter, part));
  return [...search, ...parts.map((part) => `${partLabel(part)} ${partWords(filter, part)}`)];
}

/** Which buildings a rule means, in one line. */
export function ruleWords({ filter, near, shaftWithin, listedOnly }: LetterRule): string {
  const words = [
    ...filterWords(filter),
    ...(listedOnly ? ['listed'] : []),
    ...(shaftWithin === null
      ? []
      : [`within ${formatCount(shaftWithin)} m of a shaft of the line`]),
    ...(near === null ? [] : [`within ${formatCount(near.metres)} m of ${near.name}`]),
  ];
  return words.length === 0 ? 'every building' : words.join(', ');
}
