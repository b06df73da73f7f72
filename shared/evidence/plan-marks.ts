import type { AlignmentDesign } from '../schemas/alignments.ts';
import { backgroundMarks } from './background-marks.ts';
import { outlineOf } from './building-outlines.ts';
import { gridCrosses, gridTickMarks } from './grid-marks.ts';
import type { GroundFrame } from './ground-frame.ts';
import { labelMarks } from './label-marks.ts';
import { driveMarks, tickMarks } from './line-marks.ts';
import { lineMark, type Mark, type Stroke } from './marks.ts';
import type { PlanLabels } from './plan-labels.ts';
import type { PlanBuilding, PlanMaterial } from './plan-material.ts';
import type { PlannedPlan } from './planned-sheets.ts';
import { northMarks, scaleBarMarks } from './plan-signs.ts';
import { toneOfBuilding } from './tone-of-building.ts';

const OUTLINE: Stroke = { ink: 'buildingEdge', width: 0.15 };
/** The line that everything is read by, and the one that is only where settlement is no longer drawn. */
const [EMPHASISED, LEAST] = [0.01, 0.001];

function buildingMark(frame: GroundFrame, building: PlanBuilding, { content }: PlannedPlan): Mark {
  const tone = toneOfBuilding(building, content.shows);
  const rings = outlineOf(frame, building);
  return tone === null
    ? { kind: 'shape', rings, isClosed: true, fill: 'paper', stroke: OUTLINE }
    : { kind: 'toned', tone, rings };
}

/** Those without a colour first, so that edges of those that have one are whole. */
function buildingMarks(
  frame: GroundFrame,
  buildings: readonly PlanBuilding[],
  plan: PlannedPlan,
): Mark[] {
  const marks = buildings.map((building) => buildingMark(frame, building, plan));
  return [
    ...marks.filter(({ kind }) => kind === 'shape'),
    ...marks.filter(({ kind }) => kind === 'toned'),
  ];
}

/**
 * How the contour of a level is drawn.
 *
 * Units: level m, widths mm. Valid: any level. Source: [own].
 */
export function contourStroke(level: number): Stroke {
  const width = level === EMPHASISED ? 0.5 : 0.22;
  return { ink: 'contour', width, ...(level === LEAST && { dash: [1.6, 1] }) };
}

function contourMarks({ place }: GroundFrame, { contours }: PlanMaterial): Mark[] {
  return contours.map(({ level, line }) => lineMark(line.map(place), contourStroke(level)));
}

/**
 * All that stands inside the neat line of a plan but the signs over it.
 *
 * Units: mm. Valid: labels and names of streets of the same plan. Source: [own].
 */
export function groundMarks(
  plan: PlannedPlan,
  material: PlanMaterial,
  {
    design,
    labels: { placed, ticks },
    streets,
  }: {
    readonly design: AlignmentDesign;
    readonly labels: Pick<PlanLabels, 'placed' | 'ticks'>;
    readonly streets: readonly Mark[];
  },
): Mark[] {
  const { frame, content } = plan;
  return [
    ...(content.background ? backgroundMarks(frame, material.background) : []),
    ...buildingMarks(frame, material.buildings, plan),
    ...gridCrosses(frame),
    ...streets,
    ...(content.contours ? contourMarks(frame, material) : []),
    ...(content.line ? driveMarks(frame, design) : []),
    ...tickMarks(ticks),
    // what was placed last lies lowest: lines that lead from names end under the figures
    ...placed.toReversed().flatMap(({ what, box }) => labelMarks(what, box)),
  ];
}

/**
 * The grid outside the neat line, the north point and the scale bar of a plan.
 *
 * Units: mm. Valid: any plan. Source: [own].
 */
export function signMarks({ frame }: PlannedPlan, paper: string): Mark[] {
  return [...gridTickMarks(frame), ...northMarks(frame), ...scaleBarMarks(frame, paper)];
}
