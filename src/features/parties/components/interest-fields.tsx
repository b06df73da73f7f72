import { useState } from 'react';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { capital } from '../../../../shared/presentation/capital.ts';
import { INTEREST_KINDS } from '../../../../shared/schemas/parties.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { BuildingSearch } from '../../plan/components/building-search.tsx';
import type { InterestDraft, PartyDraft } from '../party-draft.ts';

type Faults = Readonly<Record<string, string | undefined>>;

type InterestFieldsProps = {
  readonly schemeId: string;
  readonly interests: PartyDraft['interests'];
  readonly faults: Faults;
  readonly onChange: (interests: PartyDraft['interests']) => void;
};

type OneProps = {
  readonly interest: InterestDraft;
  readonly faultOf: (field: string) => string | undefined;
  readonly onChange: (change: Partial<InterestDraft>) => void;
  readonly onRemove: () => void;
};

/** So many are written at once; a body may hold hundreds. */
const FIRST = 10;
const KINDS = INTEREST_KINDS.map((kind) => ({ value: kind, label: capital(kind) }));

function OneInterest({ interest, faultOf, onChange, onRemove }: OneProps) {
  const { building, kind, from, to } = interest;
  const { reference, address } = building;
  return (
    <li className="border-b border-hairline py-2 last:border-0">
      <div className="flex items-baseline justify-between gap-2 text-small">
        <span className="min-w-0 break-words">
          <b className="font-semibold">{reference}</b> {address ?? 'address not known'}
        </span>
        <Button kind="quiet" aria-label={`Take ${reference} away`} onClick={onRemove}>
          Take away
        </Button>
      </div>
      <div className="grid grid-cols-3 gap-3 max-sm:grid-cols-1">
        <Select
          label="Interest"
          options={KINDS}
          value={kind}
          error={faultOf('kind')}
          onChange={({ target }) => {
            const chosen = INTEREST_KINDS.find((one) => one === target.value);
            if (chosen !== undefined) onChange({ kind: chosen });
          }}
        />
        <Field
          label="From"
          type="date"
          value={from}
          error={faultOf('from')}
          onChange={({ target }) => {
            onChange({ from: target.value });
          }}
        />
        <Field
          label="To"
          type="date"
          value={to}
          error={faultOf('to')}
          onChange={({ target }) => {
            onChange({ to: target.value });
          }}
        />
      </div>
    </li>
  );
}

/** What a party has to do with which buildings. */
export function InterestFields({ schemeId, interests, faults, onChange }: InterestFieldsProps) {
  const [shown, setShown] = useState(FIRST);
  return (
    <fieldset className="min-w-0 border-t border-rule pt-2">
      <legend className="sr-only">Interests in buildings</legend>
      <p aria-hidden="true" className="text-small font-semibold">
        Interests in buildings
      </p>
      {faults.interests !== undefined && (
        <p role="alert" className="text-small font-medium text-clay-deep">
          {faults.interests}
        </p>
      )}
      <ul>
        {interests.slice(0, shown).map((interest, index) => (
          <OneInterest
            key={interest.key}
            interest={interest}
            faultOf={(field) => faults[`interests.${index}.${field}`]}
            onChange={(change) => {
              onChange(interests.map((one) => (one === interest ? { ...one, ...change } : one)));
            }}
            onRemove={() => {
              onChange(interests.filter((one) => one !== interest));
            }}
          />
        ))}
      </ul>
      {interests.length > shown && (
        <Button
          kind="quiet"
          className="-ml-1.5"
          onClick={() => {
            setShown(interests.length);
          }}
        >
          Show {formatCount(interests.length - shown)} more
        </Button>
      )}
      <BuildingSearch
        schemeId={schemeId}
        onChoose={(building) => {
          const { id, reference, address } = building;
          const key = `${id} ${interests.length} ${Date.now()}`;
          const added = { key, building: { id, reference, address }, from: '', to: '' };
          onChange([{ ...added, kind: 'freeholder' }, ...interests]);
        }}
      />
    </fieldset>
  );
}
