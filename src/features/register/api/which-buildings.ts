import type { RegisterFilter, RegisterSort } from '../../../../shared/schemas/register.ts';

/** Which buildings of the register are meant, and in which order. */
export type Which = { readonly filter: RegisterFilter; readonly sort: RegisterSort };

/** The same in the words of a query. */
export function asQuery(
  { filter, sort }: Which,
  more: Readonly<Record<string, string>> = {},
): string {
  const words = { filter: JSON.stringify(filter), sort: JSON.stringify(sort), ...more };
  return new URLSearchParams(words).toString();
}
