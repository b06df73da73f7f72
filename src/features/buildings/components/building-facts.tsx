import { LISTED_FACTS } from '../../../../shared/presentation/facts-of-run.ts';
import { factsOf } from '../../../../shared/presentation/field-words.ts';
import { shownValue, type BuildingValues } from '../../../../shared/presentation/shown-value.ts';
import { Shown } from './shown.tsx';

/** What the register says of a building, line by line; what the method assumes is marked and counted. */
export function BuildingFacts({ building }: { readonly building: BuildingValues }) {
  const assumed = building.assumed.length;
  return (
    <>
      <dl className="mt-2.5 border-t-2 border-ink">
        {LISTED_FACTS.map((column) => {
          const { label, unit } = factsOf(column);
          const shown = shownValue(column, building);
          return (
            <div
              key={column}
              className="grid min-h-row grid-cols-[minmax(0,1fr)_auto_26px] items-baseline gap-x-1.5 border-b border-hairline py-1 text-small"
            >
              <dt className="text-ink-2">{label}</dt>
              <dd className="col-span-2 grid grid-cols-subgrid text-right">
                <span className="break-words">
                  <Shown shown={shown} />
                </span>
                {unit !== undefined && shown.kind !== 'unknown' && (
                  <span className="text-left text-ink-3">{unit}</span>
                )}
              </dd>
            </div>
          );
        })}
      </dl>
      {assumed > 0 && (
        <p className="mt-2 text-cap text-ink-3">
          {assumed === 1 ? 'One value is' : `${assumed} values are`} assumed by the method, over
          dotted lines.
        </p>
      )}
    </>
  );
}
