import {
  REGISTER_COLUMNS,
  REGISTER_ORDER,
  registerFilterSchema,
  type RegisterFilter,
  type RegisterSort,
} from '../../../shared/schemas/register.ts';
import type { Which } from './api/which-buildings.ts';

const NAMES = { filter: 'filter', sort: 'sort', opened: 'building' } as const;

function readFilter(text: string | null): RegisterFilter {
  if (text === null) return {};
  try {
    const parsed = registerFilterSchema.safeParse(JSON.parse(text));
    return parsed.success ? parsed.data : {};
  } catch {
    return {};
  }
}

function readSort(text: string | null): RegisterSort {
  const descending = text?.startsWith('-') === true;
  const column = REGISTER_COLUMNS.find((one) => one === text?.slice(descending ? 1 : 0));
  return column === undefined ? REGISTER_ORDER : { column, descending };
}

/** What an address says of the register; what makes no sense is as if it were not there. */
export function readWhich(search: URLSearchParams): Which {
  return {
    filter: readFilter(search.get(NAMES.filter)),
    sort: readSort(search.get(NAMES.sort)),
  };
}

/** The building that an address opens. */
export function readOpened(search: URLSearchParams): number | null {
  const id = Number(search.get(NAMES.opened) ?? '');
  return Number.isSafeInteger(id) && id > 0 ? id : null;
}

function put(search: URLSearchParams, name: string, text: string | null): URLSearchParams {
  const next = new URLSearchParams(search);
  if (text === null) next.delete(name);
  else next.set(name, text);
  return next;
}

/** The address with another filter. */
export function withFilter(search: URLSearchParams, filter: RegisterFilter): URLSearchParams {
  const text = JSON.stringify(filter);
  return put(search, NAMES.filter, text === '{}' ? null : text);
}

/** The address with another order. */
export function withSort(
  search: URLSearchParams,
  { column, descending }: RegisterSort,
): URLSearchParams {
  const isUsual = column === REGISTER_ORDER.column && descending === REGISTER_ORDER.descending;
  return put(search, NAMES.sort, isUsual ? null : `${descending ? '-' : ''}${column}`);
}

/** The address with another building opened. */
export function withOpened(search: URLSearchParams, buildingId: number | null): URLSearchParams {
  return put(search, NAMES.opened, buildingId === null ? null : String(buildingId));
}
