/** Joins class names; what is false or missing is left out. */
export function classNames(...names: readonly (string | false | undefined)[]): string {
  return names.filter((name) => name !== undefined && name !== false && name !== '').join(' ');
}
