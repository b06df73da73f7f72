import { CAUTIONS } from '../cautions.ts';
import { designParts, figure, percent, rangeWords } from '../presentation/design-words.ts';
import { chainageWords } from '../presentation/chainage-words.ts';
import { formatCount } from '../presentation/format-number.ts';
import type { PlanContent } from '../schemas/evidence.ts';
import { MATERIAL_LIMITS } from '../schemas/evidence-material.ts';
import type { PlanBuilding, PlanMaterial } from './plan-material.ts';
import type { AboutSheets } from './sheet.ts';

const MEANING: Readonly<Record<PlanContent['shows'], string>> = {
  low: 'Categories are by the largest tensile strain of a building’s walls, the least of the whole range. The figure in a building is its category.',
  central:
    'Categories are by the largest tensile strain of a building’s walls, at the central values. The figure in a building is its category.',
  high: 'Categories are by the largest tensile strain of a building’s walls, the most of the whole range. The figure in a building is its category.',
  settlement:
    'Settlement is the largest under a building at founding level over the whole range. The figure in a building is in mm.',
  stage:
    'The figure in a building is the stage that it came to. A plain outline was let go at stage 1.',
};

function intervalsNote({ run: { design } }: AboutSheets): string[] {
  return design.intervals.map(
    ({ from, to, volumeLoss, troughWidth }) =>
      `From ${chainageWords(from)} to ${chainageWords(to)} volume loss ${rangeWords(volumeLoss, percent)} %, K ${rangeWords(troughWidth, (k) => figure(k, 3))}.`,
  );
}

/**
 * What every sheet says of the run that it stands on: the method and its inputs, and how far they hold.
 *
 * Units: none. Valid: a complete run. Source: [own].
 */
export function runNotes(about: AboutSheets): string[] {
  const { run, scheme } = about;
  const { option } = run;
  return [
    `Run ${run.number} of ${option.name}, version ${option.version}; method ${run.methodVersion}, rules version ${run.rulesVersion}, register version ${run.registerVersion}, started ${run.startedAt.slice(0, 10)} UTC.`,
    `Low / central / high: ${designParts(run.design).join('. ')}.`,
    ...intervalsNote(about),
    'Ground movement is greenfield: as if no building stood there. Walls follow the ground; no stiffness of buildings is counted on.',
    `Grid EPSG:${scheme.crs.code}, ${scheme.crs.name}, in metres. Levels are in metres above the scheme’s datum.`,
  ];
}

function bracketNote(buildings: readonly PlanBuilding[], about: AboutSheets): string[] {
  const line = about.run.rules.leadingCategory.value;
  const reaching = (end: 'category' | 'categoryHigh') =>
    buildings.filter(({ result }) => (result[end] ?? -1) >= line).length;
  return [
    `Buildings with their middle on this sheet that come to category ${line} or more: ${reaching('categoryHigh')} over the whole range, ${reaching('category')} at the central values.`,
  ];
}

/** What is fetched for a sheet is bounded, and whoever misses a street is told. */
function backgroundNote(isShown: boolean, { background }: PlanMaterial): string[] {
  const most = MATERIAL_LIMITS.background;
  if (!isShown || background.length < most) return [];
  return [`Of the background the ${formatCount(most)} largest shapes are drawn.`];
}

/**
 * The notes of a plan.
 *
 * Units: none. Valid: the buildings of the sheet, and all that it was drawn from. Source: [own].
 */
export function planNotes(
  { shows, background }: PlanContent,
  { buildings, material }: { buildings: readonly PlanBuilding[]; material: PlanMaterial },
  about: AboutSheets,
): string[] {
  return [
    MEANING[shows],
    ...runNotes(about),
    ...bracketNote(buildings, about),
    ...backgroundNote(background, material),
    CAUTIONS.join(' '),
  ];
}
