import { useQuery } from '@tanstack/react-query';
import { useState, type SubmitEvent } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { useDelayedValue } from '../../../hooks/use-delayed-value.ts';
import { partiesQuery } from '../../parties/api/list-parties.ts';
import { useScheme } from '../../schemes/scheme-context.ts';

type Chosen = { readonly partyId: string; readonly why: string };

const WHILE_TYPING = 200;

function ChooseForm({ onChoose }: { readonly onChoose: (chosen: Chosen) => void }) {
  const [search, setSearch] = useState('');
  const [partyId, setPartyId] = useState('');
  const [why, setWhy] = useState('');
  const settled = useDelayedValue(search, WHILE_TYPING);
  const { data } = useQuery(partiesQuery(useScheme().id, { search: settled }));
  const options = data?.parties.map(({ id, name }) => ({ value: id, label: name })) ?? [];
  function choose(event: SubmitEvent) {
    event.preventDefault();
    if (partyId !== '' && why.trim() !== '') onChoose({ partyId, why: why.trim() });
  }
  return (
    <form onSubmit={choose} className="grid gap-3">
      <Field
        label="Search by name, address or building"
        value={search}
        onChange={(event) => {
          setSearch(event.target.value);
          setPartyId('');
        }}
      />
      <Select
        required
        label="Party"
        unchosen={options.length === 0 ? 'Nobody is called so' : 'Choose one'}
        options={options}
        value={partyId}
        onChange={(event) => {
          setPartyId(event.target.value);
        }}
      />
      <Field
        required
        label="Why they get it"
        hint="Kept with the letter"
        value={why}
        onChange={(event) => {
          setWhy(event.target.value);
        }}
      />
      <div>
        <Button kind="main" type="submit">
          Take them in
        </Button>
      </div>
    </form>
  );
}

/** Gives a letter to somebody whom no rule names. */
export function ChooseParty({ onChoose }: { readonly onChoose: (chosen: Chosen) => void }) {
  const [isOpen, setOpen] = useState(false);
  return (
    <div>
      <Button
        onClick={() => {
          setOpen(true);
        }}
      >
        Choose somebody by hand…
      </Button>
      <Dialog
        open={isOpen}
        title="Somebody whom no rule names"
        onClose={() => {
          setOpen(false);
        }}
      >
        <ChooseForm
          onChoose={(chosen) => {
            setOpen(false);
            onChoose(chosen);
          }}
        />
      </Dialog>
    </div>
  );
}
