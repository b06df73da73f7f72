import { z } from 'zod';
import { centralSurface } from '../../shared/assessment/central-surface.ts';
import {
  outcomesOfBuildings,
  rowsOfPrepared,
} from '../../shared/assessment/outcomes-of-buildings.ts';
import { preparedBuilding } from '../../shared/assessment/prepared-building.ts';
import { resultOfOutcome } from '../../shared/assessment/result-of-outcome.ts';
import { assessmentRules, runInputs } from '../../shared/assessment/run-inputs.ts';
import type { Segment } from '../../shared/geometry/point.ts';
import { CONTOUR_LEVELS, settlementContours } from '../../shared/ground/settlement-contours.ts';
import { alignmentDesignSchema } from '../../shared/schemas/alignments.ts';
import { rulesSchema } from '../../shared/schemas/rules.ts';
import { runFactsSchema, type RunResult } from '../../shared/schemas/runs.ts';
import type { LettersMaterial } from '../documents/letter/letter-material.ts';
import type { SheetMaterial } from '../documents/sheet/sheet-material.ts';
import { boxesOnGrid, type BoxInDegrees } from './boxes-on-grid.ts';
import { planChunks, type Chunk } from './plan-chunks.ts';
import { reachOfDesign } from './reach-of-design.ts';

/** Arithmetic of a run, by plain data: what a thread is asked. Facts come as the text of the database. */
export type Asked =
  | {
      readonly kind: 'plan';
      readonly design: unknown;
      readonly buildings: readonly BoxInDegrees[];
      readonly definition: string;
    }
  | { readonly kind: 'contours'; readonly design: unknown; readonly rules: unknown }
  | {
      readonly kind: 'chunk';
      readonly design: unknown;
      readonly rules: unknown;
      readonly members: string;
      readonly beside: string;
    }
  | {
      readonly kind: 'rows';
      readonly design: unknown;
      readonly rules: unknown;
      readonly id: string;
      readonly neighbours: string;
    }
  | { readonly kind: 'sheet'; readonly material: SheetMaterial }
  | { readonly kind: 'letters'; readonly material: LettersMaterial };

/** A result as the table keeps it. */
export type ResultRow = RunResult & { readonly buildingId: number };

const factsSchema = z.array(runFactsSchema);

function chunkResults({ design, rules, members, beside }: Asked & { kind: 'chunk' }): ResultRow[] {
  const ofDesign = alignmentDesignSchema.parse(design);
  const inputs = runInputs(ofDesign, rulesSchema.parse(rules));
  const asked = factsSchema.parse(JSON.parse(members));
  const standing = factsSchema.parse(JSON.parse(beside));
  return outcomesOfBuildings(inputs, ofDesign.groundLevel, asked, standing).map(
    ({ id, outcome }) => ({ buildingId: Number(id), ...resultOfOutcome(outcome) }),
  );
}

function contoursText({ design, rules }: Asked & { kind: 'contours' }): string {
  const ofMethod = assessmentRules(rulesSchema.parse(rules));
  const surface = centralSurface(alignmentDesignSchema.parse(design), ofMethod);
  return JSON.stringify(settlementContours(surface, CONTOUR_LEVELS));
}

function chunksOf({ design, buildings, definition }: Asked & { kind: 'plan' }): Chunk[] {
  const ofDesign = alignmentDesignSchema.parse(design);
  const near = { line: ofDesign.line, reach: reachOfDesign(ofDesign) };
  return planChunks(boxesOnGrid(buildings, definition), near);
}

function rowsOf({ design, rules, id, neighbours }: Asked & { kind: 'rows' }): BuildingRows {
  const { groundLevel } = alignmentDesignSchema.parse(design);
  const { model } = runInputs(alignmentDesignSchema.parse(design), rulesSchema.parse(rules));
  const facts = factsSchema.parse(JSON.parse(neighbours));
  const prepared = facts.map((one) => preparedBuilding(one, model, groundLevel));
  return [...(rowsOfPrepared(prepared).get(id) ?? [])];
}

type BuildingRows = { readonly wallIndex: number; readonly segment: Segment }[];

/** Only where one is asked for: all that a document needs takes a while to load. */
async function sheetOf({ material }: Asked & { kind: 'sheet' }): Promise<Uint8Array> {
  const { sheetDocument } = await import('../documents/sheet/sheet-document.ts');
  return sheetDocument(material);
}

async function lettersOf({ material }: Asked & { kind: 'letters' }): Promise<Uint8Array> {
  const { lettersDocument } = await import('../documents/letter/letters-document.ts');
  return lettersDocument(material);
}

/**
 * What a thread answers: the parts of a run, a building's rows, the bytes of a document, or a text of JSON
 * for the database.
 */
export type Computed<A extends Asked> = A extends { kind: 'plan' }
  ? Chunk[]
  : A extends { kind: 'rows' }
    ? BuildingRows
    : A extends { kind: 'sheet' | 'letters' }
      ? Uint8Array
      : string;

/** Does a piece of a run's arithmetic; knows nothing of the database. */
export function compute<A extends Asked>(asked: A): Computed<A> | Promise<Computed<A>>;
export function compute(asked: Asked): Chunk[] | BuildingRows | string | Promise<Uint8Array> {
  switch (asked.kind) {
    case 'plan':
      return chunksOf(asked);
    case 'contours':
      return contoursText(asked);
    case 'chunk':
      return JSON.stringify(chunkResults(asked));
    case 'rows':
      return rowsOf(asked);
    case 'sheet':
      return sheetOf(asked);
    case 'letters':
      return lettersOf(asked);
  }
}
