import type { Grid, Sampler } from './ground.ts';

type Point = readonly [number, number];

/** Reads levels between the four nearest cells; where some have none, from the nearest of them that has. */
export function gridSampler(grid: Grid, place: (point: Point) => Point): Sampler {
  const { columns, rows, west, south, width, height, levels } = grid;
  const levelAt = (column: number, row: number) =>
    levels[(rows - 1 - row) * columns + column] ?? NaN;
  return (point) => {
    const [x, y] = place(point);
    const [across, up] = [(x - west) / width, (y - south) / height];
    const isOn = across >= -0.5 && across <= columns - 0.5 && up >= -0.5 && up <= rows - 0.5;
    if (!isOn) return null;
    const column = Math.max(0, Math.min(columns - 2, Math.floor(across)));
    const row = Math.max(0, Math.min(rows - 2, Math.floor(up)));
    const [right, above] = [Math.min(columns - 1, column + 1), Math.min(rows - 1, row + 1)];
    const [u, v] = [Math.max(0, Math.min(1, across - column)), Math.max(0, Math.min(1, up - row))];
    const cells = [
      [levelAt(column, row), (1 - u) * (1 - v)],
      [levelAt(right, row), u * (1 - v)],
      [levelAt(column, above), (1 - u) * v],
      [levelAt(right, above), u * v],
    ] as const;
    const level = cells.reduce((sum, [one, share]) => (share === 0 ? sum : sum + one * share), 0);
    if (!Number.isNaN(level)) return { level, isNearest: false };
    const [nearest] = cells.filter(([one]) => !Number.isNaN(one)).sort((a, b) => b[1] - a[1]);
    return nearest === undefined ? null : { level: nearest[0], isNearest: true };
  };
}
