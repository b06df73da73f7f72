import { cornersOf, depthLimit, inwardAt, inwardAtCorner, pointOn } from './outline.ts';
import type { Corner, Outline } from './outline.ts';
import type { Random } from './prng.ts';
import { cyclic, itemAt } from './vector.ts';
import type { Point } from './vector.ts';

/** The line on which two neighbours meet; both walls are drawn from the same one. */
export type PartyLine = {
  readonly station: number;
  readonly at: Point;
  readonly inward: Point;
  /** How deep the plot may reach. */
  readonly limit: number;
};
/** One plot along the street, between two party lines. */
export type Plot = {
  readonly from: PartyLine;
  readonly to: PartyLine;
  readonly corner: Corner | null;
  readonly run: number;
  readonly open: boolean;
};
/** How plots are measured out along a frontage. */
export type PlotRule = {
  readonly depth: number;
  /** How much longer than deep a corner plot is along both streets. */
  readonly cornerExtra: number;
  readonly widths: (run: number, random: Random) => readonly { width: number; open: boolean }[];
};

const deepest = 60;

function lineAt(outline: Outline, station: number, low: number, high: number): PartyLine {
  const at = pointOn(outline, station);
  const inward = inwardAt(outline, Math.max(low, station - 3), Math.min(high, station + 3));
  return { station, at, inward, limit: depthLimit(outline.ring, at, inward, deepest) };
}

function bentLine(outline: Outline, corner: Corner): PartyLine {
  const inward = inwardAtCorner(outline, corner.station);
  return {
    station: corner.station,
    at: corner.at,
    inward,
    limit: depthLimit(outline.ring, corner.at, inward, deepest),
  };
}

/** Half a corner plot's street front: enough for its back to reach the corner's bisector. */
function cornerReach(
  corner: Corner,
  before: number,
  after: number,
  rule: PlotRule,
  random: Random,
): number {
  if (corner.turn < 0) return 0;
  const half = Math.tan((Math.PI - corner.turn) / 2);
  const wanted = rule.depth / Math.max(half, 0.3) + rule.cornerExtra * random.range(0.2, 1);
  return Math.min(wanted, before / 2, after / 2, 24);
}

/** Stretches the widths drawn so that they fill a run exactly. */
function fitWidths(
  run: number,
  rule: PlotRule,
  random: Random,
): { width: number; open: boolean }[] {
  const drawn = rule.widths(run, random);
  const total = drawn.reduce((sum, { width }) => sum + width, 0);
  return drawn.map(({ width, open }) => ({ width: (width * run) / total, open }));
}

type Run = {
  readonly low: number;
  readonly high: number;
  readonly start: PartyLine;
  readonly end: PartyLine;
};

function plotsOfRun(
  outline: Outline,
  run: Run,
  index: number,
  rule: PlotRule,
  random: Random,
): Plot[] {
  const size = run.end.station - run.start.station;
  if (size < 2) return [];
  const widths = fitWidths(size, rule, random);
  let [from, station] = [run.start, run.start.station];
  return widths.map(({ width, open }, count): Plot => {
    station += width;
    const to = count + 1 === widths.length ? run.end : lineAt(outline, station, run.low, run.high);
    const plot = { from, to, corner: null, run: index, open };
    from = to;
    return plot;
  });
}

function roundRow(outline: Outline, rule: PlotRule, random: Random): Plot[] {
  const first = lineAt(outline, 0, -10, 10);
  const last = { ...first, station: outline.total };
  const run = { low: -10, high: outline.total + 10, start: first, end: last };
  return plotsOfRun(outline, run, 0, rule, random);
}

/** Measures out the plots all round a block, corner plots included. */
export function planRow(outline: Outline, rule: PlotRule, random: Random): Plot[] {
  const corners = cornersOf(outline);
  if (corners.length === 0) return roundRow(outline, rule, random);
  const ahead = corners.map((corner, index) => {
    const gap = cyclic(corners, index + 1).station - corner.station;
    return gap <= 0 ? gap + outline.total : gap;
  });
  const reaches = corners.map((corner, index) =>
    cornerReach(corner, cyclic(ahead, index - 1), itemAt(ahead, index), rule, random),
  );
  const bent = corners.map((corner, index) =>
    itemAt(reaches, index) < 0.01 ? bentLine(outline, corner) : null,
  );
  const runs = corners.map((corner, index): Run => {
    const [low, high] = [corner.station, corner.station + itemAt(ahead, index)];
    const start = itemAt(bent, index) ?? lineAt(outline, low + itemAt(reaches, index), low, high);
    const next = cyclic(bent, index + 1);
    const end =
      next === null
        ? lineAt(outline, high - cyclic(reaches, index + 1), low, high)
        : { ...next, station: high };
    return { low, high, start, end };
  });
  return corners.flatMap((corner, index): Plot[] => {
    const run = itemAt(runs, index);
    const row = plotsOfRun(outline, run, index, rule, random);
    if (itemAt(bent, index) !== null) return row;
    const before = cyclic(runs, index - 1).end;
    return [{ from: before, to: run.start, corner, run: index, open: false }, ...row];
  });
}

/** Tells party lines apart: lines at the same point are one, whichever plot holds them. */
export function keyOf(line: PartyLine): string {
  return `${line.at[0].toFixed(3)} ${line.at[1].toFixed(3)}`;
}
