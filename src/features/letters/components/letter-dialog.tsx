import { useQuery } from '@tanstack/react-query';
import { useState, type SubmitEvent } from 'react';
import { capital } from '../../../../shared/presentation/capital.ts';
import type { Letter } from '../../../../shared/schemas/letters.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { Facts } from '../../../components/ui/facts.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { apiPath } from '../../../lib/api-path.ts';
import { formatDay } from '../../../lib/format-date.ts';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { letterQuery, useAcknowledge } from '../api/letters.ts';
import { reasonWords } from '../letter-words.ts';
import { LetterParts } from './letter-parts.tsx';

function standing({ delivery, serverWords, acknowledgedAt, remindedAt }: Letter): string {
  return [
    capital(delivery),
    ...(delivery === 'failed' && serverWords !== null ? [`“${serverWords}”`] : []),
    ...(remindedAt === null ? [] : [`reminded on ${formatDay(remindedAt)}`]),
    ...(acknowledgedAt === null ? [] : [`acknowledged on ${formatDay(acknowledgedAt)}`]),
  ].join(', ');
}

function Acknowledge({ letterId, onDone }: { readonly letterId: string; onDone: () => void }) {
  const [how, setHow] = useState('');
  const acknowledge = useAcknowledge(useScheme().id, letterId, onDone);
  function keep(event: SubmitEvent) {
    event.preventDefault();
    acknowledge.mutate(how);
  }
  return (
    <form onSubmit={keep} className="grid gap-2 border-t border-hairline pt-3">
      <MutationError failed="Nothing was kept." error={acknowledge.error} />
      <Field
        label="Acknowledged in another way"
        hint="As: by telephone on Tuesday, to the surveyor"
        value={how}
        onChange={(event) => {
          setHow(event.target.value);
        }}
        action={
          <Button type="submit" busy={acknowledge.isPending}>
            Record it
          </Button>
        }
      />
    </form>
  );
}

function WholeLetter({ letter, onDone }: { readonly letter: Letter; readonly onDone: () => void }) {
  const scheme = useScheme();
  const { id, name, address, email, channel, subject, parts, reasons } = letter;
  const isSent = letter.delivery !== 'not sent';
  const mayRecord = can(scheme, 'prepareLetters') && isSent && letter.acknowledgedAt === null;
  return (
    <div className="grid gap-4">
      <Facts
        facts={[
          ['To', `${name}, ${channel === 'post' ? address.split('\n').join(', ') : (email ?? '')}`],
          ['Because', reasonWords(reasons)],
          ['Stands', standing(letter)],
        ]}
      />
      <div
        className="max-h-[46vh] overflow-auto border border-hairline bg-paper px-5 py-4"
        tabIndex={0}
        role="region"
        aria-label="The letter"
      >
        <h3 className="mb-3 text-lead">{subject}</h3>
        <LetterParts parts={parts} />
      </div>
      <a href={apiPath`/api/schemes/${scheme.id}/letters/${id}/pdf`} download>
        As a PDF
      </a>
      {mayRecord && <Acknowledge letterId={id} onDone={onDone} />}
    </div>
  );
}

/** One letter, as it was written for good. */
export function LetterDialog({
  letterId,
  onClose,
}: {
  readonly letterId: string;
  readonly onClose: () => void;
}) {
  const scheme = useScheme();
  const { data, error, refetch } = useQuery(letterQuery(scheme.id, letterId));
  const title = data === undefined ? 'Letter' : `Letter ${data.number}`;
  return (
    <Dialog open title={title} onClose={onClose}>
      {error !== null && (
        <QueryError what="The letter" error={error} onRetry={() => void refetch()} />
      )}
      {data === undefined && error === null && <LoadingRows what="the letter" />}
      {data !== undefined && <WholeLetter letter={data} onDone={onClose} />}
    </Dialog>
  );
}
