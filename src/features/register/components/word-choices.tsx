import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { RegisterField } from '../../../../shared/schemas/register.ts';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { registerChoicesQuery } from '../api/get-choices.ts';
import { choiceWords } from '../choice-words.ts';

type Value = string | null;

type WordChoicesProps = {
  readonly schemeId: string;
  readonly field: RegisterField;
  readonly chosen: readonly Value[];
  readonly onChoose: (chosen: readonly Value[]) => void;
};

/** More than these are searched through. */
const A_FEW = 12;

function toggled(chosen: readonly Value[], value: Value): readonly Value[] {
  return chosen.includes(value) ? chosen.filter((one) => one !== value) : [...chosen, value];
}

/** The words that a field holds, with how often each does, to be ticked. */
export function WordChoices({ schemeId, field, chosen: atFirst, onChoose }: WordChoicesProps) {
  const { data, error, refetch } = useQuery(registerChoicesQuery(schemeId, field));
  const [sought, setSought] = useState('');
  // the tick does not wait until the address has followed
  const [chosen, setChosen] = useState(atFirst);
  if (error !== null) {
    return <QueryError what="The choices" error={error} onRetry={() => void refetch()} />;
  }
  if (data === undefined) return <LoadingRows what="the choices" rows={3} />;
  if (data.length === 0) return <p className="text-small text-ink-2">No building has any.</p>;
  const shown = data.filter(({ value }) =>
    choiceWords(field, value).toLowerCase().includes(sought.trim().toLowerCase()),
  );
  return (
    <>
      {data.length > A_FEW && (
        <Field
          label="Find a word"
          frameClassName="mb-2"
          value={sought}
          onChange={({ target }) => {
            setSought(target.value);
          }}
        />
      )}
      <ul>
        {shown.map(({ value, count }) => (
          <li key={value ?? ''} className="flex items-center justify-between gap-4">
            <Checkbox
              label={
                value === null ? (
                  <span className="text-ink-3">{choiceWords(field, null)}</span>
                ) : (
                  choiceWords(field, value)
                )
              }
              checked={chosen.includes(value)}
              onChange={() => {
                const next = toggled(chosen, value);
                setChosen(next);
                onChoose(next);
              }}
            />
            <span className="text-cap text-ink-3">{formatCount(count)}</span>
          </li>
        ))}
      </ul>
    </>
  );
}
