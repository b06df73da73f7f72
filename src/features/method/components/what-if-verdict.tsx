import { CATEGORIES } from '../../../../shared/damage/categories.ts';
import { DamageChip } from '../../../components/ui/damage-chip.tsx';
import {
  categoriesWords,
  percentWords,
  settledWords,
} from '../../../../shared/presentation/bracket-words.ts';
import type { WorkedWhatIf } from '../what-if/work-what-if.ts';

/** The category in a sentence, with what it rests on. */
export function WhatIfVerdict({ worked }: { readonly worked: WorkedWhatIf }) {
  const { result, bracket, sensitivity } = worked.opened;
  const { category, strain, zones, governingZone } = result;
  const governing = zones[governingZone];
  return (
    <div role="status" className="flex items-baseline gap-x-4 border-b-2 border-ink pb-2">
      <span className="text-h3">
        <DamageChip category={category} />
      </span>
      <span className="min-w-0 text-roomy">
        <b className="inline-block font-semibold first-letter:uppercase">
          {CATEGORIES[category]?.name}
        </b>{' '}
        at the central values, strain {percentWords(strain, 4)}
        {governing !== undefined && `, ${governing.mode}, ${governing.governing}`}.{' '}
        {categoriesWords(bracket)} over the bracket. {settledWords(sensitivity)}
      </span>
    </div>
  );
}
