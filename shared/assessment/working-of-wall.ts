import { at } from '../numerics/at.ts';
import { CENTRAL } from '../numerics/range.ts';
import type { Wall } from '../building/wall.ts';
import { wallExtremes } from '../building/wall-extremes.ts';
import { strainedZone } from '../building/strained-zone.ts';
import { zoneShape } from '../building/zone-shape.ts';
import { categoryOfStrain } from '../damage/category-of-strain.ts';
import { rankinClass } from '../damage/rankin.ts';
import { fieldAtPoints } from '../ground/field-at-points.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import { FIELD } from '../ground/kernel.ts';
import { levelField } from '../ground/level-field.ts';
import { lossFactorsAt } from '../ground/loss-factors-at.ts';
import type { Piece } from '../ground/piece.ts';
import { nearestPart } from '../ground/nearest-part.ts';
import { recordPart, type PointOnWall } from '../ground/record-part.ts';
import type { Recorder, WorkingLine } from '../working.ts';
import { resultOfWall, type WallResult } from './assess-wall.ts';
import { loadedProfile } from './loaded-profile.ts';
import type { AssessmentRules } from './rules.ts';
import { directionOf, siteOfWall, wallField } from './wall-field.ts';

/**
 * A part of a working under its heading.
 *
 * Units: as the lines. Valid: in the order of computing. Source: [own].
 */
export type WorkingSection = { readonly title: string; readonly lines: readonly WorkingLine[] };

type Sections = { title: string; lines: WorkingLine[] }[];

function section(sections: Sections, title: string): Recorder {
  const lines: WorkingLine[] = [];
  sections.push({ title, lines });
  return (line) => {
    lines.push(line);
  };
}

type Context = {
  readonly model: GroundModel;
  readonly wall: Wall;
  readonly faces: readonly (number | undefined)[];
};

function pointAt({ wall }: Context, x: number): PointOnWall {
  const direction = directionOf(wall);
  const [E, N] = wall.segment.start;
  return { point: [E + x * direction[0], N + x * direction[1]], direction };
}

/** Each drive at one point: its nearest part opened up, the sum of all its parts, and all drives. */
function recordPoint(context: Context, x: number, sections: Sections): void {
  const { model, wall, faces } = context;
  const on = pointAt(context, x);
  const site = siteOfWall(model, wall);
  const factors = lossFactorsAt(model, 'central');
  const settlements: Record<string, number> = {};
  const movements: Record<string, number> = {};
  for (const [drive, { name }] of model.drives.entries()) {
    const only = (piece: Piece) => piece.drive === drive;
    const state = { position: CENTRAL, faces, only };
    const field = levelField(model, site, state);
    const part = nearestPart(field, model.pieces[drive] ?? [], on.point);
    if (part === undefined) continue;
    const record = section(
      sections,
      `Drive "${name}" at ${x.toFixed(3)} m along the wall, its nearest part from chainage ${part.piece.from.toFixed(1)} m`,
    );
    const one = recordPart(model, part, site.place, on, CENTRAL, record);
    const all = fieldAtPoints(field, Float64Array.from(on.point), factors);
    const parts = field.packs.reduce((sum, { count }) => sum + count, 0);
    const total = at(all, FIELD.settlement);
    const [tx, ty] = on.direction;
    const movement = at(all, FIELD.displacementEast) * tx + at(all, FIELD.displacementNorth) * ty;
    record({
      symbol: `S_${drive + 1}`,
      meaning: `settlement from drive "${name}": this part and ${parts - 1} others`,
      expression: 'S_part + S_others',
      inputs: { S_part: one.settlement, S_others: total - one.settlement },
      value: total,
      unit: 'm',
      reference: 'own',
    });
    record({
      symbol: `u_${drive + 1}`,
      meaning: `horizontal movement along the wall from drive "${name}"`,
      expression: 'u_part + u_others',
      inputs: { u_part: one.displacement, u_others: movement - one.displacement },
      value: movement,
      unit: 'm',
      reference: 'own',
    });
    settlements[`S_${drive + 1}`] = total;
    movements[`u_${drive + 1}`] = movement;
  }
  const record = section(sections, `All drives at ${x.toFixed(3)} m along the wall`);
  recordSum(record, settlements, movements);
}

function recordSum(
  record: Recorder,
  settlements: Record<string, number>,
  movements: Record<string, number>,
): void {
  const sum = (values: Record<string, number>) =>
    Object.values(values).reduce((total, value) => total + value, 0);
  record({
    symbol: 'S',
    meaning: 'settlement from all drives',
    expression: Object.keys(settlements).join(' + ') || '0',
    inputs: settlements,
    value: sum(settlements),
    unit: 'm',
    reference: 'new-oreilly-1991',
  });
  record({
    symbol: 'u',
    meaning: 'horizontal movement along the wall from all drives',
    expression: Object.keys(movements).join(' + ') || '0',
    inputs: movements,
    value: sum(movements),
    unit: 'm',
    reference: 'new-oreilly-1991',
  });
}

/**
 * The whole working of a wall at the central value of every input, written by the code that computes
 * it: each drive at the two ends and the lowest point of the governing zone's chord, every zone, and
 * the category.
 *
 * Units: SI. Valid: as `assessWall`. Source: each line names its own.
 */
export function workingOfWall(
  model: GroundModel,
  wall: Wall,
  rules: AssessmentRules,
  faces: readonly (number | undefined)[],
): { result: WallResult; sections: readonly WorkingSection[] } {
  const field = wallField(model, wall, siteOfWall(model, wall), rules.cutOff, {
    position: CENTRAL,
    faces,
  });
  const loaded = loadedProfile(field, lossFactorsAt(model, 'central'));
  const result = resultOfWall(field, loaded, wall, rules);
  const context = { model, wall, faces };
  const sections: Sections = [];
  const governing = result.zones[result.governingZone];
  const points =
    governing === undefined
      ? [result.settlementMaxAt]
      : [governing.start, governing.deflectionAt, governing.end];
  for (const x of points) recordPoint(context, x, sections);
  for (const [index, zone] of result.zones.entries()) {
    const governs = index === result.governingZone ? ', which governs' : '';
    const title = `Zone ${index + 1}: ${zone.mode} from ${zone.start.toFixed(3)} to ${zone.end.toFixed(3)} m${governs}`;
    const record = section(sections, title);
    const shape = zoneShape(loaded.profile, loaded.scale, zone, rules, record);
    const { height, poisson, eOverG } = wall;
    strainedZone(shape, { height, poisson, eOverG: eOverG.central }, record);
  }
  const record = section(sections, 'The wall as a whole');
  wallExtremes(loaded.profile, loaded.scale, field.length, record);
  categoryOfStrain(result.strain, record);
  rankinClass(result.slopeMax, result.settlementMax, record);
  return { result, sections };
}
