import { assessmentRules } from '../assessment/run-inputs.ts';
import {
  sectionsOfDesign,
  type SectionAcross,
  type SectionsOfDesign,
} from '../assessment/sections-of-design.ts';
import { chainageWords } from '../presentation/chainage-words.ts';
import { formatCount } from '../presentation/format-number.ts';
import { niceTicks } from '../presentation/nice-ticks.ts';
import { sine } from '../numerics/sine.ts';
import { millimetresFromMetres } from '../units/millimetres-from-metres.ts';
import type { Mark, Measure, Spot } from './marks.ts';
import { oneUnderTheOther, type DrawnSections, type SectionRoom } from './drawn-sections.ts';
import { ABOVE, sectionHeight, type PlannedSection } from './planned-sections.ts';
import {
  lengthAxis,
  levelAxis,
  sectionPanel,
  troughMarks,
  type SectionPanel,
} from './section-panel.ts';
import { standingMarks, standingOn, type Standing } from './standing-marks.ts';

type Planned = Extract<PlannedSection, { kind: 'cross sections' }>;

const [AROUND, HALF_TURN] = [48, 3.141592653589793];

/** A bore, round where levels are drawn as large as lengths and upright where they are larger. */
function boreMark(
  { x, y }: SectionPanel,
  { offset, axis, diameter }: SectionAcross['bores'][number],
): Mark {
  const ring = Array.from({ length: AROUND }, (_, k): Spot => {
    const turn = (2 * HALF_TURN * k) / AROUND;
    // the section looks along increasing chainage, so that left is at the left
    return [
      x(-offset + (diameter / 2) * sine(turn + HALF_TURN / 2)),
      y(axis + (diameter / 2) * sine(turn)),
    ];
  });
  return {
    ...{ kind: 'shape', rings: [ring], isClosed: true, fill: 'paper' },
    stroke: { ink: 'ink', width: 0.4 },
  };
}

/** The largest settlement that is drawn; nothing is said where a point of it could not be worked out. */
function largestWords({ points }: SectionAcross): string {
  const known = points.flatMap(({ settlement }) => settlement ?? []);
  if (known.length < points.length) return 'settlement not worked out everywhere';
  const largest = (end: 'low' | 'central' | 'high') =>
    millimetresFromMetres(Math.max(...known.map((one) => one[end]))).toFixed(1);
  return `largest settlement drawn ${largest('low')} / ${largest('central')} / ${largest('high')} mm low / central / high`;
}

/** How far to the left or right of the line, as one looks along it. */
function asideWords(offset: number): string {
  if (offset === 0) return '0';
  return `${formatCount(Math.abs(offset))} m ${offset < 0 ? 'left' : 'right'}`;
}

function titleMarks([x, y]: Spot, section: SectionAcross, measure: Measure): Mark[] {
  const title = `Section at ${chainageWords(section.chainage)}`;
  const words = `looking along the line; ${largestWords(section)}`;
  return [
    { kind: 'words', words: title, at: [x, y], size: 9, isStrong: true },
    { kind: 'words', words, at: [x + measure(title, 9, true) + 2, y], size: 7.5 },
  ];
}

/** From the left of a building to its right, as one looks along the line. */
function spanWords({ from, to }: Standing): string {
  return `${asideWords(Math.round(from))} to ${asideWords(Math.round(to))}`;
}

function sectionMarks(
  panel: SectionPanel,
  section: SectionAcross,
  { depth, halfWidth }: Planned,
  { material, measure }: SectionRoom,
): DrawnSections {
  const { middle, left, groundLevel, points, bores } = section;
  const start = [middle[0] + halfWidth * left[0], middle[1] + halfWidth * left[1]] as const;
  const cut = { start, direction: [-left[0], -left[1]] as const, length: 2 * halfWidth };
  const ticks = niceTicks(-halfWidth, halfWidth, 8);
  const trough = points
    .map(({ offset, settlement }) => ({ distance: -offset, settlement }))
    .reverse();
  const standing = standingMarks(panel, standingOn(material.buildings, cut, -halfWidth), measure);
  return {
    marks: [
      ...titleMarks([panel.left, panel.ground - ABOVE + 5], section, measure),
      ...levelAxis(panel, groundLevel, depth),
      ...lengthAxis(panel, ticks, asideWords),
      ...troughMarks(panel, trough),
      ...standing.marks,
      ...bores.map((bore) => boreMark(panel, bore)),
    ],
    unnamed: standing.unnamed.map((one) => ({
      reference: one.building.reference,
      where: `${chainageWords(section.chainage)}, ${spanWords(one)}`,
    })),
  };
}

/**
 * Sections across the line, one under the other: ground, bores, the trough with its range, and the buildings
 * that the cut goes through.
 *
 * Units: mm. Valid: chainages of that line. Source: as SectionAcross.
 */
export function crossSectionMarks(
  { left, top }: { readonly left: number; readonly top: number },
  planned: Planned,
  room: SectionRoom,
): DrawnSections {
  const { design, rules } = room.about.run;
  const { halfWidth, depth } = planned;
  const sections: SectionsOfDesign = sectionsOfDesign(design, assessmentRules(rules));
  const each = sectionHeight(planned);
  const drawn = planned.chainages.map((chainage, k) => {
    const section = sections(chainage, halfWidth);
    const span = { from: -halfWidth, to: halfWidth, groundLevel: section.groundLevel, depth };
    const panel = sectionPanel({ left, top: top + k * each }, planned, span);
    return sectionMarks(panel, section, planned, room);
  });
  return oneUnderTheOther(drawn);
}
