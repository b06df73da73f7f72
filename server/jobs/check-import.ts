import {
  findKnownBuildings,
  findRemovedBuildings,
  findTakenReferences,
} from '../models/known-buildings.ts';
import { findEarlierFootprints } from '../models/building-changes.ts';
import { writeCheckedRows, type CheckedRow } from '../models/checked-rows.ts';
import { crowdOf } from '../imports/crowd.ts';
import { describePlace, unknownPlace } from '../imports/describe-place.ts';
import { createFootprintStore } from '../imports/footprint-store.ts';
import { joinRow } from '../imports/join-row.ts';
import { judgeRow, type CheckMemory } from '../imports/judge-row.ts';
import { missingChoices } from '../imports/missing-choices.ts';
import { createNumbering } from '../imports/numbering.ts';
import { placementOf, type Placement } from '../imports/placement.ts';
import { createStandingBuildings, type StandingBuildings } from '../imports/standing-buildings.ts';
import { countAbsent, countUnsettled, sumImport } from '../models/import-report.ts';
import { RegisterImport } from '../models/register-import.ts';
import { rowRanges } from '../models/row-ranges.ts';
import { Scheme } from '../models/scheme.ts';
import { findFirstCorners, findStagedRows } from '../models/staged-rows.ts';
import type { UploadRow } from '../importers/upload.ts';
import { ahead } from '../register/ahead.ts';
import type { JobTools } from './job.ts';
import { noteOverlaps } from './note-overlaps.ts';
import { createProgress } from './progress.ts';

const AT_ONCE = 1000;

type Checking = {
  readonly tools: JobTools;
  readonly row: RegisterImport;
  readonly scheme: Scheme;
};

async function placementFor({ row, scheme }: Checking): Promise<Placement | undefined> {
  const { place } = row.options;
  const { crs } = place;
  if (row.kind !== 'footprints' || crs === null) return undefined;
  return placementOf({ ...place, crs }, scheme.crs);
}

async function memoryOf(
  { tools: { database }, row, scheme }: Checking,
  placement: Placement | undefined,
): Promise<CheckMemory> {
  const { options } = row;
  const isCounted = row.kind === 'footprints' && options.columns.reference === undefined;
  const taken = isCounted ? await findTakenReferences(database, scheme.id) : [];
  const corners = placement === undefined ? [] : await findFirstCorners(database, row.id);
  return {
    options,
    placement,
    crowd: crowdOf(corners.map((corner) => placement?.toGrid(corner) ?? corner)),
    numbering: createNumbering(options.prefix, taken),
    references: new Map(),
    footprints: createFootprintStore(),
  };
}

async function checkedOf(
  { tools: { database }, row, scheme }: Checking,
  memory: CheckMemory,
  staged: readonly UploadRow[],
): Promise<CheckedRow[]> {
  const judged = staged.map((one) => judgeRow(memory, one));
  const references = judged.flatMap(({ reference }) => reference ?? []);
  const withFootprints = row.kind === 'footprints';
  const known = await findKnownBuildings(database, scheme.id, references, { withFootprints });
  // a number that was counted is not the file's word for a building that is gone
  const isNamed = withFootprints && row.options.columns.reference !== undefined;
  const removed = await findRemovedBuildings(database, scheme.id, isNamed ? references : []);
  const drawn = withFootprints ? [...known.values()].map(({ id }) => id) : [];
  const earlier = await findEarlierFootprints(database, drawn);
  const joining = { settle: row.options.settle, mayCreate: withFootprints, removed, earlier };
  return judged.map((one) => joinRow(one, known.get(one.reference ?? ''), joining));
}

async function* checkedRows(checking: Checking, memory: CheckMemory): AsyncGenerator<CheckedRow[]> {
  const { tools, row } = checking;
  for await (const range of rowRanges(tools.database, row.id, AT_ONCE)) {
    tools.signal.throwIfAborted();
    const staged = await findStagedRows(tools.database, row.id, range);
    if (staged.length > 0) yield await checkedOf(checking, memory, staged);
  }
}

async function checkRows(checking: Checking, memory: CheckMemory): Promise<StandingBuildings> {
  const { tools, row } = checking;
  const standing = createStandingBuildings();
  const progress = createProgress(row.id);
  let done = 0;
  for await (const checked of ahead(checkedRows(checking, memory))) {
    await writeCheckedRows(tools.database, row.id, checked);
    checked.forEach(standing.add);
    done += checked.length;
    await progress(done);
  }
  return standing;
}

/** What the person sees once every row is checked. */
async function sumUp({ tools: { database }, row, scheme }: Checking) {
  const { bounds, ...sums } = await sumImport(database, row.id);
  const absent = await countAbsent(database, scheme.id, row.id);
  const { others, rows } = row.options.settle;
  const settled = Object.keys(rows);
  const unsettled = others === 'ask' ? await countUnsettled(database, row.id, settled) : 0;
  return { counts: { ...sums, absent }, bounds, isUnsettled: unsettled > 0 };
}

/**
 * Checks every row of an import by the options that were chosen, against the other rows and against the
 * register; where something is missing to do so, asks for it.
 */
export async function checkImport(tools: JobTools, importId: string): Promise<void> {
  const row = await RegisterImport.findByPk(importId);
  const scheme = row && (await Scheme.findByPk(row.schemeId));
  if (row?.state !== 'checking' || !scheme) return;
  const checking = { tools, row, scheme };
  const where = { id: importId, state: 'checking', version: row.version } as const;
  const missing = missingChoices(row);
  const placement = await placementFor(checking);
  const place = row.said && (placement ? describePlace(row.said, row.options.place, placement) : unknownPlace(row.said)); // prettier-ignore
  if (missing.length > 0) {
    const nothing = { counts: null, bounds: null };
    await RegisterImport.update({ ...nothing, place, missing, state: 'asking' }, { where });
    return;
  }
  const memory = await memoryOf(checking, placement);
  const standing = await checkRows(checking, memory);
  await noteOverlaps(tools, row, memory.footprints, standing);
  const { counts, bounds, isUnsettled } = await sumUp(checking);
  const still = isUnsettled ? (['settle'] as const) : [];
  const asked = { place, counts, bounds, missing: [...still], state: 'asking' as const };
  tools.signal.throwIfAborted();
  await RegisterImport.update({ ...asked, done: counts.rows, of: counts.rows }, { where });
}
