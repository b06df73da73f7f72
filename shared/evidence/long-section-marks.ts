import { longSection } from '../assessment/long-section.ts';
import { assessmentRules } from '../assessment/run-inputs.ts';
import { settlementBracket } from '../assessment/settlement-bracket.ts';
import { planDistance } from '../geometry/plan-distance.ts';
import { chainageWords } from '../presentation/chainage-words.ts';
import { niceTicks } from '../presentation/nice-ticks.ts';
import { oneUnderTheOther, type DrawnSections, type SectionRoom } from './drawn-sections.ts';
import type { LineOnGround } from './line-on-ground.ts';
import { lineMark, type Mark, type Spot, type Stroke } from './marks.ts';
import type { PlanMaterial } from './plan-material.ts';
import { ABOVE, sectionHeight, type PlannedSection, type Stretch } from './planned-sections.ts';
import {
  lengthAxis,
  levelAxis,
  sectionPanel,
  troughMarks,
  type SectionPanel,
} from './section-panel.ts';
import type { AboutSheets } from './sheet.ts';
import { standingMarks, standingOn, type Standing } from './standing-marks.ts';

const LINES: readonly (readonly ['crown' | 'axis' | 'invert', string, Stroke])[] = [
  ['crown', 'Crown', { ink: 'ink', width: 0.3 }],
  ['axis', 'Axis', { ink: 'ink', width: 0.25, dash: [4, 1, 0.8, 1] }],
  ['invert', 'Invert', { ink: 'ink', width: 0.3 }],
];

function levelAt(
  rows: ReturnType<typeof longSection>,
  name: 'crown' | 'axis' | 'invert',
  chainage: number,
): number {
  const after = rows.findIndex((row) => row.chainage >= chainage);
  const [before, next] = [
    rows[Math.max(0, after - 1)],
    rows[after === -1 ? rows.length - 1 : after],
  ];
  if (before === undefined || next === undefined) return 0;
  const long = next.chainage - before.chainage;
  const share = long > 0 ? (chainage - before.chainage) / long : 0;
  return before[name] + share * (next[name] - before[name]);
}

function driveLines(panel: SectionPanel, { from, to }: Stretch, about: AboutSheets): Mark[] {
  const rows = longSection(about.run.design);
  const stations = [
    from,
    ...rows.map(({ chainage }) => chainage).filter((one) => one > from && one < to),
    to,
  ];
  return LINES.flatMap(([name, words, stroke]): Mark[] => {
    const line = stations.map((one): Spot => [panel.x(one), panel.y(levelAt(rows, name, one))]);
    const [x, y] = line[0] ?? [0, 0];
    return [lineMark(line, stroke), { kind: 'words', words, at: [x + 2, y - 1], size: 7 }];
  });
}

/** What stands right over the line, part by part of it. */
function standingAlong(
  line: LineOnGround,
  { from, to }: Stretch,
  { buildings }: PlanMaterial,
): Standing[] {
  const points = line.between(from, to);
  let passed = from;
  return points.slice(1).flatMap((end, k) => {
    const start = points[k] ?? end;
    const length = planDistance(start, end);
    const direction = [(end[0] - start[0]) / length, (end[1] - start[1]) / length] as const;
    const found = length > 0 ? standingOn(buildings, { start, direction, length }, passed) : [];
    passed += length;
    return found;
  });
}

/** Points of the trough along a stretch on paper lie so far apart, in mm. */
const APART = 1.5;

type SettlementAt = ReturnType<typeof settlementBracket>;

function settlements(
  panel: SectionPanel,
  line: LineOnGround,
  { from, to }: Stretch,
  bracket: SettlementAt,
) {
  const count = Math.max(2, Math.ceil((panel.right - panel.left) / APART));
  return Array.from({ length: count + 1 }, (_, k) => {
    const distance = from + (k * (to - from)) / count;
    return { distance, settlement: bracket.at(line.pointAt(distance)) };
  });
}

function stretchMarks(
  { panel, stretch, depth }: { panel: SectionPanel; stretch: Stretch; depth: number },
  { line, about, material, measure }: SectionRoom,
  bracket: SettlementAt,
): DrawnSections {
  const { from, to } = stretch;
  const ticks = niceTicks(from, to, Math.max(2, Math.floor((panel.right - panel.left) / 40)));
  const words = `Long section from ${chainageWords(from)} to ${chainageWords(to)}`;
  const title: Spot = [panel.left, panel.ground - ABOVE + 5];
  const standing = standingMarks(panel, standingAlong(line, stretch, material), measure);
  return {
    marks: [
      { kind: 'words', words, at: title, size: 9, isStrong: true },
      ...levelAxis(panel, about.run.design.groundLevel, depth),
      ...lengthAxis(panel, ticks, chainageWords),
      ...troughMarks(panel, settlements(panel, line, stretch, bracket)),
      ...standing.marks,
      ...driveLines(panel, stretch, about),
    ],
    unnamed: standing.unnamed.map((one) => ({
      reference: one.building.reference,
      where: `${chainageWords(one.from)} to ${chainageWords(one.to)}`,
    })),
  };
}

/**
 * Stretches of the long section, one under the other: ground, drives with their levels, settlement of the surface
 * over the line, and what stands right over it.
 *
 * Units: mm. Valid: stretches of that line. Source: as `settlementBracket`.
 */
export function longSectionMarks(
  { left, top }: { readonly left: number; readonly top: number },
  planned: Extract<PlannedSection, { kind: 'long section' }>,
  room: SectionRoom,
): DrawnSections {
  const { design, rules } = room.about.run;
  const { groundLevel } = design;
  const bracket = settlementBracket(design, assessmentRules(rules));
  const { depth } = planned;
  const each = sectionHeight(planned);
  const drawn = planned.stretches.map((stretch, k) => {
    const at = { left, top: top + k * each };
    const panel = sectionPanel(at, planned, { ...stretch, groundLevel, depth });
    return stretchMarks({ panel, stretch, depth }, room, bracket);
  });
  return oneUnderTheOther(drawn);
}
