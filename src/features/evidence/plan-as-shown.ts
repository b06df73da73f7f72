import type { PlanContent } from '../../../shared/schemas/evidence.ts';
import type { Colouring, End } from '../runs/shades-of-run.ts';
import { newDraft, type LayoutDraft } from './layout-draft.ts';

/** What the Plan shows: what its buildings are coloured by, at which value. */
export type PlanShown = { readonly by: Colouring; readonly end: End };

const TITLES: Readonly<Record<PlanContent['shows'], string>> = {
  ...{ low: 'Buildings by damage category', high: 'Buildings by damage category' },
  ...{ central: 'Buildings by damage category', settlement: 'Buildings by settlement' },
  stage: 'Buildings by stage of assessment',
};

/** A plan round a point of the grid that shows what the Plan does. */
export function planAsShown(
  { by, end }: PlanShown,
  middle: readonly [number, number],
): LayoutDraft {
  const ofCategory = by === 'category' ? end : 'central';
  const shows = by === 'settlement' || by === 'stage' ? by : ofCategory;
  const { content, fields, ...draft } = newDraft(middle);
  return { ...draft, content: { ...content, shows }, fields: { ...fields, title: TITLES[shows] } };
}
