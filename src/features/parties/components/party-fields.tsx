import { capital } from '../../../../shared/presentation/capital.ts';
import { PARTY_CHANNELS, PARTY_KINDS } from '../../../../shared/schemas/parties.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import type { PartyDraft } from '../party-draft.ts';
import { CHANNEL_WORDS } from '../party-words.ts';
import { PartyName } from './party-name.tsx';
import { PartySearch } from './party-search.tsx';

type PartyFieldsProps = {
  readonly schemeId: string;
  readonly partyId: string | undefined;
  readonly draft: PartyDraft;
  readonly faults: Readonly<Record<string, string | undefined>>;
  readonly onChange: (change: Partial<PartyDraft>) => void;
};

const KINDS = PARTY_KINDS.map((kind) => ({ value: kind, label: capital(kind) }));
const CHANNELS = PARTY_CHANNELS.map((one) => ({ value: one, label: CHANNEL_WORDS[one] }));

function WhoTheyAre({ draft, faults, onChange: set }: PartyFieldsProps) {
  return (
    <>
      <div className="grid grid-cols-[minmax(0,1fr)_150px] gap-3 max-sm:grid-cols-1">
        <Field
          label="Name"
          data-first-in-focus
          dir="auto"
          value={draft.name}
          error={faults.name}
          onChange={({ target }) => {
            set({ name: target.value });
          }}
        />
        <Select
          label="Kind"
          options={KINDS}
          value={draft.kind}
          onChange={({ target }) => {
            const kind = PARTY_KINDS.find((one) => one === target.value);
            if (kind !== undefined) set({ kind });
          }}
        />
      </div>
      <TextArea
        label="Postal address"
        hint="Line by line as on an envelope, without the name."
        rows={3}
        dir="auto"
        value={draft.address}
        error={faults.address}
        onChange={({ target }) => {
          set({ address: target.value });
        }}
      />
    </>
  );
}

function HowTheyAreReached({ draft, faults, onChange: set }: PartyFieldsProps) {
  return (
    <div className="grid grid-cols-[minmax(0,1fr)_150px] gap-3 max-sm:grid-cols-1">
      <Field
        label="E-mail"
        type="email"
        value={draft.email}
        error={faults.email}
        onChange={({ target }) => {
          set({ email: target.value });
        }}
      />
      <Select
        label="Letters"
        options={CHANNELS}
        value={draft.channel}
        onChange={({ target }) => {
          const channel = PARTY_CHANNELS.find((one) => one === target.value);
          if (channel !== undefined) set({ channel });
        }}
      />
    </div>
  );
}

function Representative(props: PartyFieldsProps) {
  const { schemeId, partyId, draft, faults, onChange: set } = props;
  if (draft.representedBy !== null) {
    return (
      <div className="text-small">
        <p className="font-semibold">Represented by</p>
        <div className="flex items-baseline justify-between gap-2">
          <span className="min-w-0 break-words">
            <PartyName name={draft.representedBy.name} />
          </span>
          <Button
            kind="quiet"
            onClick={() => {
              set({ representedBy: null });
            }}
          >
            By nobody
          </Button>
        </div>
        {faults.representedBy !== undefined && (
          <p className="font-medium text-clay-deep">{faults.representedBy}</p>
        )}
      </div>
    );
  }
  return (
    <PartySearch
      schemeId={schemeId}
      label="Represented by"
      hint="Leave it empty where they answer for themselves."
      error={faults.representedBy}
      except={partyId}
      onChoose={({ id, name }) => {
        set({ representedBy: { id, name } });
      }}
    />
  );
}

/** Who a party is, how it is reached, and who represents it. */
export function PartyFields(props: PartyFieldsProps) {
  return (
    <>
      <WhoTheyAre {...props} />
      <HowTheyAreReached {...props} />
      <Representative {...props} />
    </>
  );
}
