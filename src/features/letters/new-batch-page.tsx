import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { LetterWords } from '../../../shared/presentation/letter-text.ts';
import type { Batch, BatchPreview } from '../../../shared/schemas/letter-batches.ts';
import type { LetterKind } from '../../../shared/schemas/letter-settings.ts';
import { NotFoundPage } from '../../app/routes/not-found.tsx';
import { Page } from '../../components/layout/page.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { Select } from '../../components/ui/select.tsx';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { recipientsQuery } from './api/letter-batches.ts';
import { ChooseParty } from './components/choose-party.tsx';
import { LetterLook } from './components/letter-look.tsx';
import { LetterWordsFields } from './components/letter-words-fields.tsx';
import { PrepareFound } from './components/prepare-found.tsx';
import { KIND_OPTIONS } from './letter-words.ts';
import { useOwnText } from './use-own-text.ts';

type OwnTextProps = {
  readonly asked: BatchPreview;
  readonly written: LetterWords;
  readonly onChange: (written: LetterWords) => void;
};

/** Free text is written for the batch, beside how those who get it will read it. */
function OwnText({ asked, written, onChange }: OwnTextProps) {
  return (
    <div className="mt-5 grid grid-cols-2 gap-8 max-lg:grid-cols-1">
      <div className="grid content-start gap-3">
        <LetterWordsFields written={written} rows={16} onChange={onChange} />
      </div>
      <LetterLook written={written} asked={asked} />
    </div>
  );
}

/** Which batch the text comes from, and why that one was returned. */
function Earlier({ batch }: { readonly batch: Batch }) {
  const { number, comment } = batch;
  return (
    <p className="mt-4 max-w-[72ch] text-body break-words">
      The text is that of batch {number}.{comment !== null && ` Its check said: “${comment}”`}
    </p>
  );
}

function NewBatchForm() {
  const scheme = useScheme();
  const [search] = useSearchParams();
  const earlierId = search.get('text');
  const [asked, setAsked] = useState<BatchPreview>({
    kind: earlierId === null ? 'first information' : 'free text',
    leftOut: [],
    chosen: [],
  });
  const { isFree, text, setTyped, hasWritten, earlier, ...begun } = useOwnText(
    asked.kind,
    earlierId,
  );
  const { data, error, refetch } = useQuery(recipientsQuery(scheme.id, asked));
  const isReady = !isFree || text !== null;
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
      {begun.error !== null && (
        <QueryError what="The letter" error={begun.error} onRetry={begun.refetch} />
      )}
      {earlier !== undefined && <Earlier batch={earlier} />}
      {text !== null && <OwnText asked={asked} written={text} onChange={setTyped} />}
      {error !== null && (
        <QueryError what="Who gets it" error={error} onRetry={() => void refetch()} />
      )}
      {data === undefined && error === null && <LoadingRows what="who gets it" />}
      {data !== undefined && isReady && (
        <PrepareFound found={data} {...{ asked, text, hasWritten }} onChange={setAsked} />
      )}
    </Page>
  );
}

/** Who gets a letter of a kind and why; then the letters are written. */
export function NewBatchPage() {
  return can(useScheme(), 'prepareLetters') ? <NewBatchForm /> : <NotFoundPage />;
}
