import {
  REGISTER_COLUMNS,
  REGISTER_FIELDS,
  type RegisterFilter,
} from '../../shared/schemas/register.ts';
import { headingOf } from './register-columns.ts';

function anyInWords({ any = {}, unknown = [] }: RegisterFilter): string[] {
  const among = REGISTER_FIELDS.flatMap((field) => {
    const values = any[field];
    if (values === undefined) return [];
    return [`${headingOf(field)} is ${values.map((value) => value ?? 'unknown').join(' or ')}`];
  });
  return [...among, ...unknown.map((field) => `${headingOf(field)} is unknown`)];
}

function rangesInWords({ ranges = {} }: RegisterFilter): string[] {
  return REGISTER_COLUMNS.flatMap((column) => {
    const { from, to } = ranges[column] ?? {};
    if (from === undefined && to === undefined) return [];
    const least = from === undefined ? '' : ` from ${from}`;
    return [`${headingOf(column)}${least}${to === undefined ? '' : ` to ${to}`}`];
  });
}

/** A filter as people read it on a sheet. */
export function filterInWords(filter: RegisterFilter): string {
  const { search, assumed, importId, within, inside, ids, except } = filter;
  const conditions = [
    ...(search !== undefined && search !== '' ? [`Words: ${search}`] : []),
    ...anyInWords(filter),
    ...rangesInWords(filter),
    ...(assumed === true ? ['The method has to assume something'] : []),
    ...(assumed === false ? ['Nothing has to be assumed'] : []),
    ...(importId === undefined ? [] : [`From import ${importId}`]),
    ...(within === undefined ? [] : [`In the box ${within.join(', ')} (degrees)`]),
    ...(inside === undefined ? [] : [`Inside an outline of ${inside.length} corners on the map`]),
    ...(ids === undefined ? [] : [`${ids.length} chosen buildings`]),
    ...(except === undefined ? [] : [`All but ${except.length} of them`]),
  ];
  return conditions.length === 0 ? 'All buildings' : conditions.join('; ');
}
