import { CATEGORIES } from '../../../../shared/damage/categories.ts';
import type { RunResult } from '../../../../shared/schemas/runs.ts';
import { HatchSwatch } from '../../../components/ui/hatch-swatch.tsx';
import { RangeBar } from '../../assessment/components/range-bar.tsx';
import { reserveWords } from '../../../../shared/presentation/result-words.ts';
import { rangeOfCategories } from '../tip-of-run.ts';

type FoundCategoryProps = { readonly result: RunResult };

/** The category of a building with its range, its strain on the scale, and what would break it. */
export function FoundCategory({ result }: FoundCategoryProps) {
  const { category, categoryLow, categoryHigh, strainLow, strain, strainHigh } = result;
  const row = category === null ? undefined : CATEGORIES[category];
  if (row === undefined || categoryLow === null || categoryHigh === null) {
    return <p className="text-small">No category: let go at stage 1.</p>;
  }
  return (
    <>
      <div className="flex items-center gap-3">
        <HatchSwatch category={row.category} className="h-[34px] w-[52px]" />
        <span className="text-h1 leading-none font-semibold">
          <span className="sr-only">Category </span>
          {row.label}
        </span>
        <span className="text-lead font-semibold first-letter:uppercase">{row.name}</span>
      </div>
      <p className="mt-1.5 text-small text-ink-2">{row.repair}</p>
      {strainLow !== null && strain !== null && strainHigh !== null && (
        <div className="mt-2">
          <p className="text-small font-semibold">Strain over the range, %</p>
          <RangeBar strain={{ low: strainLow, central: strain, high: strainHigh }} />
        </div>
      )}
      <p className="text-small">{rangeOfCategories(categoryLow, category ?? 0, categoryHigh)}.</p>
      <p className="mt-1 mb-1.5 text-small">{reserveWords(result)}</p>
    </>
  );
}
