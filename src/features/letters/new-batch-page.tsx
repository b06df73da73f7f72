import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { LetterKind } from '../../../shared/schemas/letter-settings.ts';
import type { NewBatch, Recipients } from '../../../shared/schemas/letter-batches.ts';
import { NotFoundPage } from '../../app/routes/not-found.tsx';
import { Page } from '../../components/layout/page.tsx';
import { Button } from '../../components/ui/button.tsx';
import { EmptyState } from '../../components/ui/empty-state.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { MutationError } from '../../components/ui/mutation-error.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { Select } from '../../components/ui/select.tsx';
import { letterPagePath } from '../../config/paths.ts';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { recipientsQuery, usePrepareBatch } from './api/letter-batches.ts';
import { ChooseParty } from './components/choose-party.tsx';
import { RecipientsTable } from './components/recipients-table.tsx';
import { KIND_OPTIONS, lettersWords } from './letter-words.ts';

type Asked = Omit<NewBatch, 'expected'>;

function countsWords({ letters, byMail, byPost, without, runNumber }: Recipients): string {
  const run = runNumber === null ? 'No run is complete yet' : `By run ${runNumber}`;
  const nobody =
    without === 0
      ? ''
      : ` ${without.toLocaleString('en-GB')} buildings are named in which nobody has an interest: bring their parties in.`;
  return `${run}: ${lettersWords(letters)}, ${byMail} by e-mail and ${byPost} by post.${nobody}`;
}

function Found({
  found,
  asked,
  onChange,
}: {
  readonly found: Recipients;
  readonly asked: Asked;
  readonly onChange: (asked: Asked) => void;
}) {
  const scheme = useScheme();
  const navigate = useNavigate();
  const prepare = usePrepareBatch(scheme.id);
  function write() {
    prepare.mutate(
      { ...asked, expected: found.letters },
      { onSuccess: ({ id }) => void navigate(letterPagePath(scheme.id, id)) },
    );
  }
  return (
    <>
      <p className="mt-4 text-body">{countsWords(found)}</p>
      <MutationError failed="No letter was written." error={prepare.error} />
      {found.letters > 0 && (
        <Button kind="main" className="mt-3" busy={prepare.isPending} onClick={write}>
          {`Write ${lettersWords(found.letters)}`}
        </Button>
      )}
      <p className="mt-2 mb-3 text-small text-ink-2">
        Nothing is sent yet: you can read each letter, and a second person checks them.
      </p>
      {found.recipients.length === 0 ? (
        <EmptyState>
          The rules name nobody who has an interest today. Choose somebody by hand, or look at the
          rules.
        </EmptyState>
      ) : (
        <RecipientsTable found={found} asked={asked} onChange={onChange} />
      )}
    </>
  );
}

function NewBatchForm() {
  const scheme = useScheme();
  const [asked, setAsked] = useState<Asked>({
    kind: 'first information',
    leftOut: [],
    chosen: [],
  });
  const { data, error, refetch } = useQuery(recipientsQuery(scheme.id, asked));
  return (
    <Page title="Prepare letters" lead="The rules say who gets which letter; each reason is kept.">
      <div className="grid max-w-[640px] grid-cols-2 items-end gap-3 max-sm:grid-cols-1">
        <Select
          label="Kind of letter"
          options={KIND_OPTIONS}
          value={asked.kind}
          onChange={(event) => {
            setAsked({ ...asked, kind: event.target.value as LetterKind, leftOut: [] });
          }}
        />
        <ChooseParty
          onChoose={(one) => {
            const others = asked.chosen.filter(({ partyId }) => partyId !== one.partyId);
            setAsked({ ...asked, chosen: [...others, one] });
          }}
        />
      </div>
      {error !== null && (
        <QueryError what="Who gets it" error={error} onRetry={() => void refetch()} />
      )}
      {data === undefined && error === null && <LoadingRows what="who gets it" />}
      {data !== undefined && <Found found={data} asked={asked} onChange={setAsked} />}
    </Page>
  );
}

/** Who gets a letter of a kind and why; then the letters are written. */
export function NewBatchPage() {
  return can(useScheme(), 'prepareLetters') ? <NewBatchForm /> : <NotFoundPage />;
}
