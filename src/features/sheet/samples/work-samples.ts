import { openSamples, type OpenedSamples } from '../../../../shared/assessment/opened-samples.ts';
import { sheetOfBuilding } from '../../../../shared/assessment/sheet-of-building.ts';
import type { RunBuilding, RunDetail } from '../../../../shared/schemas/runs.ts';

/** What samples are drawn for: a building as a run took it, by the design and rules of the run. */
export type SamplesAsked = {
  readonly run: Pick<RunDetail, 'design' | 'rules'>;
  readonly building: Pick<RunBuilding, 'facts' | 'rows'>;
  readonly seed: number;
};

/** Works the building out again and draws its samples; null where it has no strain stage. */
export function workSamples({ run, building, seed }: SamplesAsked): OpenedSamples | null {
  const { facts, rows } = building;
  const sheet = sheetOfBuilding(run.design, run.rules, facts, new Map([[facts.id, rows]]));
  return openSamples(sheet, seed);
}
