import type { Range } from '../numerics/range.ts';
import { formatCount } from '../presentation/format-number.ts';
import { niceTicks } from '../presentation/nice-ticks.ts';
import { millimetresFromMetres } from '../units/millimetres-from-metres.ts';
import { lineMark, type Mark, type Spot, type Stroke } from './marks.ts';
import { ABOVE, type SectionScales } from './planned-sections.ts';

/**
 * Where a section is drawn: its ground line on paper, and where distances, levels and settlements lie.
 *
 * Units: mm of paper from m. Valid: made by `sectionPanel`; settlement is drawn down from the ground line.
 * Source: [own].
 */
export type SectionPanel = {
  readonly left: number;
  readonly right: number;
  readonly ground: number;
  readonly bottom: number;
  readonly x: (distance: number) => number;
  readonly y: (level: number) => number;
  readonly sunk: (settlement: number) => number;
};

/**
 * Lays out a section under a line of the paper: the ground at `groundLevel`, drawn `depth` down.
 *
 * Units: m, paper mm. Valid: from before to. Source: [own].
 */
export function sectionPanel(
  { left, top }: { readonly left: number; readonly top: number },
  { denominator, exaggeration, settlementExaggeration }: SectionScales,
  {
    from,
    to,
    groundLevel,
    depth,
  }: {
    readonly from: number;
    readonly to: number;
    readonly groundLevel: number;
    readonly depth: number;
  },
): SectionPanel {
  const scale = 1000 / denominator;
  const ground = top + ABOVE;
  return {
    ...{ left, ground },
    right: left + (to - from) * scale,
    bottom: ground + depth * exaggeration * scale,
    x: (distance) => left + (distance - from) * scale,
    y: (level) => ground + (groundLevel - level) * exaggeration * scale,
    sunk: (settlement) => ground + settlement * settlementExaggeration * scale,
  };
}

const THIN: Stroke = { ink: 'ink', width: 0.2 };
const FAINT: Stroke = { ink: 'hairline', width: 0.15 };
const [SIZE, TICK] = [7, 1.4];

/**
 * The axis of levels at the left of a section.
 *
 * Units: levels m. Valid: the panel of that ground. Source: [own].
 */
export function levelAxis(panel: SectionPanel, groundLevel: number, depth: number): Mark[] {
  const { left, ground, bottom, right, y } = panel;
  const count = Math.max(2, Math.floor((bottom - ground) / 14));
  const ticks = niceTicks(groundLevel - depth, groundLevel, count);
  return [
    {
      kind: 'words',
      words: 'Level, m',
      at: [left - TICK - 1, ground - 2],
      size: SIZE,
      anchor: 'end',
    },
    lineMark([[left, ground], [left, bottom]], THIN), // prettier-ignore
    ...ticks.flatMap((level): Mark[] => [
      lineMark([[left, y(level)], [right, y(level)]], FAINT), // prettier-ignore
      lineMark([[left - TICK, y(level)], [left, y(level)]], THIN), // prettier-ignore
      {
        ...{ kind: 'words', words: formatCount(level), size: SIZE, anchor: 'end' },
        at: [left - TICK - 1, y(level) + 0.9],
      },
    ]),
  ];
}

/**
 * The axis under a section, with words at some distances.
 *
 * Units: m. Valid: distances of the panel. Source: [own].
 */
export function lengthAxis(
  { left, right, bottom, x }: SectionPanel,
  distances: readonly number[],
  words: (distance: number) => string,
): Mark[] {
  const ticks = distances.flatMap((distance): Mark[] => [
    lineMark([[x(distance), bottom], [x(distance), bottom + TICK]], THIN), // prettier-ignore
    {
      ...{ kind: 'words', words: words(distance), size: SIZE, anchor: 'middle' },
      at: [x(distance), bottom + TICK + 3],
    },
  ]);
  return [lineMark([[left, bottom], [right, bottom]], THIN), ...ticks]; // prettier-ignore
}

/** The axis of settlement at the right of a section, from the ground down to its deepest. */
function settlementAxis({ right, ground, bottom, sunk }: SectionPanel, deepest: number): Mark[] {
  const lowest = Math.min(sunk(deepest), bottom);
  const most = (deepest * (lowest - ground)) / (sunk(deepest) - ground);
  const count = Math.max(2, Math.floor((lowest - ground) / 5));
  return [
    lineMark([[right, ground], [right, lowest]], THIN), // prettier-ignore
    ...niceTicks(0, most, count).flatMap((settlement): Mark[] => {
      const y = sunk(settlement);
      const words = formatCount(Number(millimetresFromMetres(settlement).toPrecision(4)));
      return [
        lineMark([[right, y], [right + TICK, y]], THIN), // prettier-ignore
        { kind: 'words', words: `${words} mm`, size: SIZE, at: [right + TICK + 1, y + 0.9] },
      ];
    }),
  ];
}

/** A point of a trough, and the same where settlement is known. */
type TroughPoint = { readonly distance: number; readonly settlement: Range | null };
type KnownPoint = { readonly distance: number; readonly settlement: Range };

/** The stretches over which settlement is known from point to point. */
function knownRuns(points: readonly TroughPoint[]): KnownPoint[][] {
  const runs: KnownPoint[][] = [[]];
  for (const { distance, settlement } of points) {
    if (settlement === null) runs.push([]);
    else runs.at(-1)?.push({ distance, settlement });
  }
  return runs.filter(({ length }) => length > 1);
}

function runMarks({ x, sunk }: SectionPanel, run: readonly KnownPoint[]): Mark[] {
  const of = (end: keyof Range) =>
    run.map(({ distance, settlement }): Spot => [x(distance), sunk(settlement[end])]);
  const band = [...of('low'), ...of('high').reverse()];
  return [
    { kind: 'shape', rings: [band], isClosed: true, fill: 'band' },
    lineMark(of('low'), { ink: 'contour', width: 0.18, dash: [0.5, 0.8] }),
    lineMark(of('high'), { ink: 'contour', width: 0.18, dash: [1.6, 0.9] }),
    lineMark(of('central'), { ink: 'contour', width: 0.4 }),
  ];
}

const CUT_OFF =
  'Settlement reaches below this drawing. Draw it fewer times as large to see all of it.';

/**
 * The ground line, and under it the trough: its range as a band, its central values as a line, and how deep that
 * is at the right.
 *
 * Units: m. Valid: where the method refuses nothing is drawn; what reaches below the panel is cut off there
 * and said to be. Source: as `settlementBracket`.
 */
export function troughMarks(panel: SectionPanel, points: readonly TroughPoint[]): Mark[] {
  const { left, right, ground, bottom, sunk } = panel;
  const runs = knownRuns(points);
  const deepest = Math.max(0, ...runs.flat().map(({ settlement }) => settlement.high));
  const isCut = sunk(deepest) > bottom;
  const window = { left, top: ground - 1, right, bottom };
  return [
    { kind: 'within', window, marks: runs.flatMap((run) => runMarks(panel, run)) },
    ...(deepest > 0 ? settlementAxis(panel, deepest) : []),
    ...(isCut
      ? [
          {
            kind: 'words' as const,
            words: CUT_OFF,
            at: [left + 2, bottom - 1.5] as const,
            size: SIZE,
          },
        ]
      : []),
    lineMark([[left, ground], [right, ground]], { ink: 'ink', width: 0.4 }), // prettier-ignore
  ];
}
