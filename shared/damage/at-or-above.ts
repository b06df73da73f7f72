/**
 * The one comparison of a figure with a limit: a figure on the limit belongs above it.
 *
 * Units: any, alike. Valid: finite numbers. Source: [common].
 */
export function atOrAbove(figure: number, limit: number): boolean {
  return figure >= limit;
}
