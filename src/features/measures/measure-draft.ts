import {
  measureValuesSchema,
  type Measure,
  type MeasureValues,
} from '../../../shared/schemas/measures.ts';
import { percentFromRatio } from '../../../shared/units/percent-from-ratio.ts';

/** A measure as it is written: figures as text, until they are read. */
export type MeasureDraft = {
  readonly kind: MeasureValues['kind'];
  readonly title: string;
  readonly detail: string;
  readonly state: MeasureValues['state'];
  readonly responsible: string;
  readonly due: string;
  readonly volumeLoss: string;
  readonly from: string;
  readonly to: string;
};

export const NO_MEASURE: MeasureDraft = {
  ...{ kind: 'at the tunnel', title: '', detail: '', state: 'proposed' },
  ...{ responsible: '', due: '', volumeLoss: '', from: '', to: '' },
};

/** A measure as it would be written again. */
export function draftOfMeasure({ limit, due, ...measure }: Measure): MeasureDraft {
  const { kind, title, detail, state, responsible } = measure;
  return {
    ...{ kind, title, detail, state, responsible },
    due: due ?? '',
    volumeLoss: limit === null ? '' : String(percentFromRatio(limit.volumeLoss)),
    from: limit === null ? '' : String(limit.from),
    to: limit === null ? '' : String(limit.to),
  };
}

function figure(text: string): number {
  return text.trim() === '' ? NaN : Number(text.replace(',', '.'));
}

const PERCENT = 100;

/** What a draft comes to, or what is wrong with it, by field. */
export function readMeasure(
  draft: MeasureDraft,
  buildings: readonly number[],
): { readonly values: MeasureValues } | { readonly faults: Readonly<Record<string, string>> } {
  const { volumeLoss, from, to, due, ...words } = draft;
  const hasLimit =
    draft.kind === 'at the tunnel' && [volumeLoss, from, to].some((text) => text.trim() !== '');
  const parsed = measureValuesSchema.safeParse({
    ...words,
    due: due === '' ? null : due,
    limit: hasLimit
      ? { volumeLoss: figure(volumeLoss) / PERCENT, from: figure(from), to: figure(to) }
      : null,
    buildings: [...buildings],
  });
  if (parsed.success) return { values: parsed.data };
  const faults = parsed.error.issues.map(({ path, message }) => [path.join('.'), message]);
  return { faults: Object.fromEntries(faults.reverse()) as Record<string, string> };
}
