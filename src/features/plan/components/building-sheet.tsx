import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import { buildingFacts, type BuildingFact } from '../building-facts.ts';

function Fact({ label, value, unit = '' }: BuildingFact) {
  return (
    <div className="grid min-h-row grid-cols-[auto_1fr_auto] items-baseline gap-x-2 border-b border-hairline py-1 text-small">
      <dt className="text-ink-2">{label}</dt>
      <dd className="col-span-2 grid grid-cols-subgrid text-right">
        {value === null ? (
          <span className="col-span-2 text-ink-3">not known</span>
        ) : (
          <>
            <span className={unit === '' ? 'col-span-2' : ''}>{value}</span>
            {unit !== '' && <span className="text-left text-ink-3">{unit}</span>}
          </>
        )}
      </dd>
    </div>
  );
}

/** What is known of one building: which, where, and the register's facts. */
export function BuildingSheet({ building }: { readonly building: BuildingAnswer }) {
  const { reference, name, address } = building;
  return (
    <>
      <p className="text-small text-ink-3">{reference}</p>
      <h2 className="mt-0.5 mb-1 text-h2 break-words">{name ?? address ?? reference}</h2>
      {name !== null && <p className="text-small text-ink-2">{address ?? 'Address not known.'}</p>}
      {name === null && address === null && (
        <p className="text-small text-ink-2">Name and address not known.</p>
      )}
      <dl className="mt-2.5 border-t-2 border-ink">
        {buildingFacts(building).map((fact) => (
          <Fact key={fact.label} {...fact} />
        ))}
      </dl>
    </>
  );
}
