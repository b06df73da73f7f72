type Point = readonly [number, number];

/** How far a footprint lies from the rest of a file, in kilometres; 0 where it is among it. */
export type Crowd = { readonly distance: (point: Point) => number };

/** Cells of so many metres; neighbours belong together. */
const CELL = 25_000;
/** Beyond so many metres a few footprints are strays. */
const FAR = 50_000;
/** Groups of a larger share of all are towns of their own. */
const STRAYS = 0.05;

type Cell = { readonly column: number; readonly row: number; count: number };

function keyOf(column: number, row: number): string {
  return `${column}:${row}`;
}

function cellsOf(points: Iterable<Point>): Map<string, Cell> {
  const cells = new Map<string, Cell>();
  for (const [x, y] of points) {
    if (!Number.isFinite(x) || !Number.isFinite(y)) continue;
    const [column, row] = [Math.floor(x / CELL), Math.floor(y / CELL)];
    const cell = cells.get(keyOf(column, row));
    if (cell === undefined) cells.set(keyOf(column, row), { column, row, count: 1 });
    else cell.count += 1;
  }
  return cells;
}

/** Takes a cell and all that hang together with it out of the map. */
function takeGroup(cells: Map<string, Cell>, first: Cell): Cell[] {
  const group: Cell[] = [];
  const open = [first];
  for (let cell = open.pop(); cell !== undefined; cell = open.pop()) {
    if (!cells.delete(keyOf(cell.column, cell.row))) continue;
    group.push(cell);
    for (const dx of [-1, 0, 1]) {
      for (const dy of [-1, 0, 1]) {
        const next = cells.get(keyOf(cell.column + dx, cell.row + dy));
        if (next !== undefined) open.push(next);
      }
    }
  }
  return group;
}

function countOf(cells: readonly Cell[]): number {
  return cells.reduce((sum, { count }) => sum + count, 0);
}

function distanceTo({ column, row }: Cell, [x, y]: Point): number {
  const dx = Math.max(column * CELL - x, x - (column + 1) * CELL, 0);
  const dy = Math.max(row * CELL - y, y - (row + 1) * CELL, 0);
  return Math.sqrt(dx * dx + dy * dy);
}

/** Finds where most of a file lies: a long line of towns hangs together, a few strays far off do not. */
export function crowdOf(points: Iterable<Point>): Crowd {
  const cells = cellsOf(points);
  const total = countOf([...cells.values()]);
  const groups: Cell[][] = [];
  for (let [first] = cells.values(); first !== undefined; [first] = cells.values()) {
    groups.push(takeGroup(cells, first));
  }
  const largest = Math.max(0, ...groups.map(countOf));
  const home = groups
    .filter((group) => countOf(group) === largest || countOf(group) > STRAYS * total)
    .flat();
  return {
    distance: (point) => {
      const metres = Math.min(...home.map((cell) => distanceTo(cell, point)));
      return metres > FAR && Number.isFinite(metres) ? metres / 1000 : 0;
    },
  };
}
