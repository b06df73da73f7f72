import { assessCaseSchema, type AssessCase } from '../../../shared/schemas/assess-case.ts';
import { runBuildingSchema, type RunBuilding } from '../../../shared/schemas/runs.ts';
import { runMapSchema, type RunMap } from '../../../shared/schemas/run-map.ts';
import { answered } from './api.ts';
import type { Visitor } from './visitor.ts';

/** Waits until the sheet of a building is shown. */
export async function sheetIs({ page }: Visitor, reference: string): Promise<void> {
  await page.getByText(`Sheet · ${reference} · `).waitFor();
  await page.getByText(/the same figures as recorded, to the last digit/).waitFor();
}

/** The figures of a run by which the map is coloured. */
export async function mapOfRun(visitor: Visitor, run: string): Promise<RunMap> {
  return runMapSchema.parse(await answered(visitor, `${run}/map`));
}

/** What a run knows of a building. */
export async function buildingOfRun(
  visitor: Visitor,
  run: string,
  id: number,
): Promise<RunBuilding> {
  return runBuildingSchema.parse(await answered(visitor, `${run}/buildings/${id}`));
}

/** The case of a building, as it is downloaded. */
export async function caseOfRun(visitor: Visitor, run: string, id: number): Promise<AssessCase> {
  return assessCaseSchema.parse(await answered(visitor, `${run}/buildings/${id}/case`));
}

/** So many buildings of a run, as unlike each other by stage and categories as they come. */
export function unlikeBuildings(map: RunMap, count: number): number[] {
  const alike = new Map<string, number[]>();
  for (const [k, id] of map.ids.entries()) {
    const key = [map.stage[k], map.low[k], map.central[k], map.high[k]].join();
    alike.set(key, [...(alike.get(key) ?? []), id]);
  }
  const most = Math.max(...[...alike.values()].map(({ length }) => length));
  const inTurn = Array.from({ length: most }, (_, turn) =>
    [...alike.values()].flatMap((ids) => {
      // spread over the town, which is numbered street by street
      const id = ids[(turn * Math.max(1, Math.floor(ids.length / count))) % ids.length];
      return turn < ids.length && id !== undefined ? [id] : [];
    }),
  );
  return [...new Set(inTurn.flat())].slice(0, count);
}
