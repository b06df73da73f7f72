import {
  undertakingValuesSchema,
  type Undertaking,
  type UndertakingValues,
} from '../../../shared/schemas/undertakings.ts';
import { faultsOfIssues, type Faults } from '../../lib/faults-by-path.ts';
import { numberOf } from '../../lib/number-of.ts';
import type { ChosenBuilding } from '../appointments/components/building-choice.tsx';

/** An undertaking as it is written: figures and days as text, until they are read. */
export type UndertakingDraft = {
  readonly promise: string;
  readonly madeTo: string;
  readonly partyId: string | null;
  readonly source: string;
  readonly building: ChosenBuilding | null;
  readonly from: string;
  readonly to: string;
  readonly due: string;
  readonly responsible: string;
  readonly doneOn: string;
  readonly evidence: string;
};

/** A new undertaking, for a building where it begins at one. */
export function newUndertaking(building: ChosenBuilding | null): UndertakingDraft {
  return {
    ...{ promise: '', madeTo: '', partyId: null, source: '', building, from: '', to: '' },
    ...{ due: '', responsible: '', doneOn: '', evidence: '' },
  };
}

/** An undertaking as it would be written again. */
export function draftOfUndertaking(undertaking: Undertaking): UndertakingDraft {
  const { promise, madeTo, partyId, source, building, stretch } = undertaking;
  const { due, responsible, doneOn, evidence } = undertaking;
  return {
    ...{ promise, partyId, source, building, responsible, evidence },
    madeTo: madeTo ?? '',
    from: stretch === null ? '' : String(stretch.from),
    to: stretch === null ? '' : String(stretch.to),
    due: due ?? '',
    doneOn: doneOn ?? '',
  };
}

function stretchOf({ from, to }: UndertakingDraft) {
  if (from.trim() === '' && to.trim() === '') return null;
  return { from: numberOf(from) ?? NaN, to: numberOf(to) ?? NaN };
}

/** What a draft comes to, or what is wrong with it, by field. */
export function readUndertaking(
  draft: UndertakingDraft,
): { readonly values: UndertakingValues } | { readonly faults: Faults } {
  const { promise, madeTo, partyId, source, building, due, responsible, doneOn, evidence } = draft;
  const read = undertakingValuesSchema.safeParse({
    ...{ promise, partyId, source, responsible, evidence },
    // of a party that was erased no name is left
    madeTo: partyId !== null && madeTo === '' ? 'Erased' : madeTo,
    buildingId: building?.id ?? null,
    stretch: stretchOf(draft),
    due: due === '' ? null : due,
    doneOn: doneOn === '' ? null : doneOn,
  });
  return read.success ? { values: read.data } : { faults: faultsOfIssues(read.error.issues) };
}
