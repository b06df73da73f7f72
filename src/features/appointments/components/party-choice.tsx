import { useQuery } from '@tanstack/react-query';
import { Select } from '../../../components/ui/select.tsx';
import { partiesQuery } from '../../parties/api/list-parties.ts';

type PartyChoiceProps = {
  readonly schemeId: string;
  readonly buildingId: number;
  readonly label: string;
  readonly unchosen: string;
  readonly error?: string | undefined;
  readonly value: string;
  readonly onChoose: (party: { readonly id: string; readonly name: string } | null) => void;
};

/** One of those who have a part in a building. */
export function PartyChoice(props: PartyChoiceProps) {
  const { schemeId, buildingId, label, unchosen, error, value, onChoose } = props;
  const { data } = useQuery(partiesQuery(schemeId, { building: buildingId }));
  const parties = data?.parties ?? [];
  return (
    <Select
      {...{ label, unchosen, error, value }}
      hint={data?.found === 0 ? 'Nobody is known who has a part in this building.' : undefined}
      options={parties.map(({ id, name }) => ({ value: id, label: name }))}
      onChange={({ target }) => {
        onChoose(parties.find(({ id }) => id === target.value) ?? null);
      }}
    />
  );
}
