import { UNDERTAKING_LIMITS } from '../../../../shared/schemas/undertakings.ts';
import { Field } from '../../../components/ui/field.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import type { Faults } from '../../../lib/faults-by-path.ts';
import { BuildingChoice } from '../../appointments/components/building-choice.tsx';
import { PartyChoice } from '../../appointments/components/party-choice.tsx';
import type { UndertakingDraft } from '../undertaking-draft.ts';

type UndertakingFieldsProps = {
  readonly schemeId: string;
  readonly draft: UndertakingDraft;
  readonly faults: Faults;
  readonly onChange: (change: Partial<UndertakingDraft>) => void;
};

type LineName = 'madeTo' | 'source' | 'responsible' | 'from' | 'to' | 'due' | 'doneOn';

type LineProps = Pick<UndertakingFieldsProps, 'draft' | 'faults' | 'onChange'> & {
  readonly name: LineName;
  readonly label: string;
  readonly type?: string;
  readonly unit?: string;
  readonly hint?: string;
};

const PLACES: Readonly<Partial<Record<LineName, string>>> = {
  from: 'stretch.from',
  to: 'stretch.to',
};

function Line({ draft, faults, onChange, name, ...field }: LineProps) {
  return (
    <Field
      {...field}
      value={draft[name]}
      error={faults[PLACES[name] ?? name]}
      onChange={({ target }) => {
        onChange({ [name]: target.value });
      }}
    />
  );
}

function Where({ schemeId, draft, faults, onChange }: UndertakingFieldsProps) {
  const line = { draft, faults, onChange };
  return (
    <>
      <BuildingChoice
        {...{ schemeId, value: draft.building }}
        error={faults.buildingId}
        onChoose={(building) => {
          onChange({ building, partyId: null });
        }}
      />
      <div className="grid grid-cols-2 gap-3 max-sm:grid-cols-1">
        <Line {...line} name="from" label="Or from chainage" unit="m" />
        <Line {...line} name="to" label="To chainage" unit="m" />
      </div>
    </>
  );
}

function Whom({ schemeId, draft, faults, onChange }: UndertakingFieldsProps) {
  const { building, partyId } = draft;
  return (
    <>
      {building !== null && (
        <PartyChoice
          label="Made to"
          unchosen="Somebody who is not listed"
          buildingId={building.id}
          {...{ schemeId, value: partyId ?? '' }}
          error={faults.partyId}
          onChoose={(party) => {
            onChange({ partyId: party?.id ?? null, madeTo: party?.name ?? '' });
          }}
        />
      )}
      {
        partyId === null &&
        <Line {...{ draft, faults, onChange }} name="madeTo" label={building === null ? 'Made to' : 'Their name'} /> // prettier-ignore
      }
    </>
  );
}

/** What is written of an undertaking. */
export function UndertakingFields(props: UndertakingFieldsProps) {
  const { draft, faults, onChange } = props;
  const line = { draft, faults, onChange };
  return (
    <>
      <TextArea
        label="What was promised"
        rows={2}
        data-first-in-focus
        maxLength={UNDERTAKING_LIMITS.promise}
        value={draft.promise}
        error={faults.promise}
        onChange={({ target }) => {
          onChange({ promise: target.value });
        }}
      />
      <Where {...props} />
      <Whom {...props} />
      <Line
        {...line}
        name="source"
        label="Source"
        hint="Where it is written: a letter, a hearing, a page."
      />
      <div className="grid grid-cols-2 gap-3 max-sm:grid-cols-1">
        <Line {...line} name="responsible" label="Who sees to it" />
        <Line {...line} name="due" label="Due" type="date" />
      </div>
      <div className="grid grid-cols-[150px_minmax(0,1fr)] gap-3 max-sm:grid-cols-1">
        <Line {...line} name="doneOn" label="Done on" type="date" />
        <TextArea
          label="Evidence"
          hint="What shows that it is done."
          rows={2}
          maxLength={UNDERTAKING_LIMITS.evidence}
          value={draft.evidence}
          error={faults.evidence}
          onChange={({ target }) => {
            onChange({ evidence: target.value });
          }}
        />
      </div>
    </>
  );
}
