import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { RegisterFilter } from '../../../../shared/schemas/register.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { usePerson } from '../../session/person-context.ts';
import { useAssignBuildings } from '../api/assign-buildings.ts';
import { assessorsQuery } from '../api/get-assessors.ts';

type GiveDialogProps = {
  readonly schemeId: string;
  readonly marks: { readonly filter: RegisterFilter; readonly count: number };
  readonly onClose: () => void;
  readonly onDone: (words: string) => void;
};

/** Gives all buildings that are marked to an assessor: to oneself, unless another is chosen. */
export function GiveDialog({ schemeId, marks, onClose, onDone }: GiveDialogProps) {
  // what was marked when it was opened
  const [{ filter, count }] = useState(marks);
  const { id: me } = usePerson();
  const { data: assessors = [], error } = useQuery(assessorsQuery(schemeId));
  const [chosen, setChosen] = useState<string>(me);
  const name = assessors.find(({ id }) => id === chosen)?.name;
  const assign = useAssignBuildings(schemeId, () => {
    onDone(`${formatCount(count)} given to ${name ?? 'nobody'}.`);
    onClose();
  });
  const many = count === 1 ? 'one building' : `${formatCount(count)} buildings`;
  return (
    <Dialog open title={`Give ${many} to an assessor`} onClose={onClose}>
      <div className="grid gap-3">
        <MutationError failed="The assessors could not be fetched." error={error} />
        <MutationError failed="Nothing was given." error={assign.error} />
        <Select
          label="Assessor"
          options={assessors.map((person) => ({
            value: person.id,
            label: person.id === me ? `${person.name} (you)` : person.name,
          }))}
          unchosen="Nobody"
          value={chosen}
          data-first-in-focus
          onChange={({ target }) => {
            setChosen(target.value);
          }}
        />
        <div className="flex gap-2">
          <Button
            kind="main"
            busy={assign.isPending}
            onClick={() => {
              const personId = name === undefined ? null : chosen;
              assign.mutate({ filter, expected: count, personId });
            }}
          >
            Give
          </Button>
          <Button onClick={onClose}>Leave it</Button>
        </div>
      </div>
    </Dialog>
  );
}
