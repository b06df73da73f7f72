/** The next or previous of some buildings; the first or last where none of them is selected. */
export function stepThrough(
  ids: readonly number[],
  selected: number | null,
  by: 1 | -1,
): number | null {
  const place = selected === null ? -1 : ids.indexOf(selected);
  if (place === -1) return ids.at(by === 1 ? 0 : -1) ?? null;
  return ids[Math.max(0, Math.min(ids.length - 1, place + by))] ?? null;
}
