import { footprintMiddle } from '../building/footprint-middle.ts';
import type { PlanPoint } from '../geometry/point.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import type { PlanContent } from '../schemas/evidence.ts';
import { categoryLabels, nameLabels, type LabelledBuilding } from './building-labels.ts';
import { outlineOf } from './building-outlines.ts';
import { buildingsOn } from './buildings-on.ts';
import { chainageLabels, chainageTicks, type ChainageTick } from './chainage-marks.ts';
import { contourLabels } from './contour-labels.ts';
import type { GroundFrame } from './ground-frame.ts';
import { labelBoxOf, type LabelBox } from './label-box.ts';
import type { Measure, Spot } from './marks.ts';
import { placeLabels, type Placement, type Wanted } from './place-labels.ts';
import type { PlanBuilding, PlanMaterial } from './plan-material.ts';
import { northBox, scaleBarBox } from './plan-signs.ts';
import { toneOfBuilding, wordsOfTone } from './tone-of-building.ts';

/**
 * A label that a plan wants: the figure in a building, its name, a contour's level or a chainage, with the
 * place that it belongs to.
 *
 * Units: mm. Valid: `building` where it belongs to one, `along` of a chainage the way of its line.
 * Source: [own].
 */
export type PlanLabel = {
  readonly kind: 'figure' | 'name' | 'contour' | 'chainage';
  readonly words: string;
  readonly at: Spot;
  readonly building?: PlanBuilding;
  readonly tick?: ChainageTick;
};

/**
 * The labels of a plan: those that stand on it, and those that had no room. Boxes are what is taken on the
 * sheet afterwards.
 *
 * Units: mm. Valid: placed and listed together are all that were wanted. Source: [own].
 */
export type PlanLabels = Placement<PlanLabel> & {
  readonly taken: readonly LabelBox[];
  readonly ticks: readonly ChainageTick[];
};

function meant<T>(
  wanted: readonly Wanted<T>[],
  label: (what: T) => PlanLabel,
): Wanted<PlanLabel>[] {
  return wanted.map(({ what, spots }) => ({ what: label(what), spots }));
}

type Toned = LabelledBuilding & { readonly building: PlanBuilding };

/** The buildings on the sheet that take a colour. */
function tonedOf(
  frame: GroundFrame,
  buildings: readonly PlanBuilding[],
  { shows }: PlanContent,
): Toned[] {
  return buildingsOn(frame, buildings).flatMap((building) => {
    const tone = toneOfBuilding(building, shows);
    if (tone === null) return [];
    const middle = frame.place(footprintMiddle(building.parts));
    const rings = outlineOf(frame, building);
    return [{ id: building.id, rings, middle, words: wordsOfTone(tone, building), building }];
  });
}

function buildingLabel(kind: 'figure' | 'name', toned: readonly Toned[]) {
  const byId = new Map(toned.map((one) => [one.id, one.building]));
  return ({ id, words, middle }: LabelledBuilding): PlanLabel => {
    const building = byId.get(id);
    return { kind, words, at: middle, ...(building !== undefined && { building }) };
  };
}

function namesOf(toned: readonly Toned[], names: PlanContent['names']): Toned[] {
  if (names === 'none') return [];
  return toned.map((one) => {
    const { reference, address } = one.building;
    return { ...one, words: names === 'addresses' ? (address ?? reference) : reference };
  });
}

function levelsOf(
  frame: GroundFrame,
  material: PlanMaterial,
  toned: readonly Toned[],
  measure: Measure,
) {
  const contours = material.contours.map(({ level, line }) => ({
    level,
    line: line.map((point: PlanPoint) => frame.place(point)),
  }));
  const outlines = toned.map(({ rings }) => rings);
  return contourLabels(contours, { window: frame.window, measure, outlines });
}

/**
 * Finds room for the labels of a plan: figures in buildings first, then contours, chainages and names.
 *
 * Units: mm. Valid: a frame of the material's ground. Source: [own].
 */
export function planLabels(
  frame: GroundFrame,
  material: PlanMaterial,
  {
    content,
    design,
    measure,
    kept = [],
  }: {
    readonly content: PlanContent;
    readonly design: AlignmentDesign;
    readonly measure: Measure;
    /** What else stands on the plan, and is not written over. */
    readonly kept?: readonly LabelBox[];
  },
): PlanLabels {
  const toned = tonedOf(frame, material.buildings, content);
  const ticks = content.line ? chainageTicks(frame, design.line) : [];
  const wanted = [
    ...meant(categoryLabels(toned, measure), buildingLabel('figure', toned)),
    ...(content.contours
      ? meant(levelsOf(frame, material, toned, measure), ({ words, at }) => ({
          kind: 'contour',
          words,
          at,
        }))
      : []),
    ...meant(chainageLabels(ticks, measure), (tick) => ({
      ...{ kind: 'chainage', words: tick.words, at: tick.at, tick },
    })),
    ...meant(nameLabels(namesOf(toned, content.names), measure), buildingLabel('name', toned)),
  ];
  const signs = [...[northBox(frame), scaleBarBox(frame)].map(labelBoxOf), ...kept];
  const { placed, listed } = placeLabels(frame.window, signs, wanted);
  return { placed, listed, ticks, taken: [...signs, ...placed.map(({ box }) => box)] };
}
