import type { BuildingResult } from '../../../shared/assessment/assess-building.ts';
import { openSamples, type OpenedSamples } from '../../../shared/assessment/opened-samples.ts';
import { openWall, type OpenedWall } from '../../../shared/assessment/open-wall.ts';
import { resultOfOutcome } from '../../../shared/assessment/result-of-outcome.ts';
import {
  sheetOfBuilding,
  type BuildingSheet,
} from '../../../shared/assessment/sheet-of-building.ts';
import type { Paper } from '../pdf/paper.ts';
import type { SheetMaterial } from './sheet-material.ts';

/** What every part of a sheet is written from. */
export type SheetParts = {
  readonly paper: Paper;
  readonly material: SheetMaterial;
  readonly sheet: BuildingSheet;
  /** The strain stage, where the building came so far; null where it was let go before or nothing was found. */
  readonly strain: BuildingResult | null;
  /** The governing wall opened up; null where there is none. */
  readonly opened: OpenedWall | null;
  /** The sampled run that was asked for; null where none was, or nothing could be worked out. */
  readonly samples: OpenedSamples | null;
  /** Whether the figures that were worked out for the sheet are those on record. */
  readonly isAsRecorded: boolean;
};

/** Works the building out again, by the same functions as the run and the screen. */
export function sheetParts(paper: Paper, material: SheetMaterial): SheetParts {
  const { run, building } = material;
  const { facts, rows, result } = building;
  const sheet = sheetOfBuilding(run.design, run.rules, facts, new Map([[facts.id, rows]]));
  const { inputs } = sheet;
  const strain = result.stage === 1 || result.fault !== null ? null : sheet.strain;
  const wall = strain?.walls[Math.max(0, strain.governing)]?.wall;
  return {
    paper,
    material,
    sheet,
    strain,
    opened: wall === undefined ? null : openWall(inputs.model, wall, inputs.rules, []),
    samples: material.samples === null ? null : openSamples(sheet, material.samples),
    isAsRecorded: JSON.stringify(resultOfOutcome(sheet.outcome)) === JSON.stringify(result),
  };
}
