import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { LetterWords } from '../../../shared/presentation/letter-text.ts';
import type { BatchDetail, BatchPreview } from '../../../shared/schemas/letter-batches.ts';
import type { LetterKind } from '../../../shared/schemas/letter-settings.ts';
import { NotFoundPage } from '../../app/routes/not-found.tsx';
import { Page } from '../../components/layout/page.tsx';
import { Button } from '../../components/ui/button.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { Select } from '../../components/ui/select.tsx';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { batchQuery, recipientsQuery } from './api/letter-batches.ts';
import { ChooseParty } from './components/choose-party.tsx';
import { LetterLook } from './components/letter-look.tsx';
import { LetterWordsFields } from './components/letter-words-fields.tsx';
import { PrepareFound } from './components/prepare-found.tsx';
import { KIND_OPTIONS } from './letter-words.ts';
import { preparedAgainWords, preparedAgain } from './prepared-again.ts';
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

type NotFoundProps = {
  readonly asked: BatchPreview;
  readonly error: Error;
  readonly onChange: (asked: BatchPreview) => void;
  readonly onRetry: () => void;
};

/** Why nobody is listed; somebody who was chosen by hand and cannot get a letter can be taken back. */
function NotFound({ asked, error, onChange, onRetry }: NotFoundProps) {
  return (
    <div className="grid justify-items-start gap-3">
      <QueryError what="Who gets it" error={error} onRetry={onRetry} />
      {asked.chosen.length > 0 && (
        <Button
          onClick={() => {
            onChange({ ...asked, chosen: asked.chosen.slice(0, -1) });
          }}
        >
          Take back who was chosen last
        </Button>
      )}
    </div>
  );
}

function NewBatchForm({ earlier }: { readonly earlier: BatchDetail | null }) {
  const scheme = useScheme();
  const [asked, setAsked] = useState(() => preparedAgain(earlier));
  const own = useOwnText(asked.kind, earlier?.text ?? null);
  const { isFree, text, setTyped, hasWritten } = own;
  const { data, error, refetch } = useQuery(recipientsQuery(scheme.id, asked));
  const isReady = !isFree || text !== null;
  return (
    <>
      {earlier !== null && (
        <p className="mb-4 max-w-[72ch] text-body break-words">{preparedAgainWords(earlier)}</p>
      )}
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
      {own.error !== null && (
        <QueryError what="The letter" error={own.error} onRetry={own.refetch} />
      )}
      {text !== null && <OwnText asked={asked} written={text} onChange={setTyped} />}
      {error !== null && (
        <NotFound {...{ asked, error }} onChange={setAsked} onRetry={() => void refetch()} />
      )}
      {data === undefined && error === null && <LoadingRows what="who gets it" />}
      {data !== undefined && isReady && (
        <PrepareFound found={data} {...{ asked, text, hasWritten }} onChange={setAsked} />
      )}
    </>
  );
}

/** A batch that was not sent, prepared again. */
function PrepareAgain({ batchId }: { readonly batchId: string }) {
  const { data, error, refetch } = useQuery(batchQuery(useScheme().id, batchId));
  if (error !== null) {
    return <QueryError what="The earlier batch" error={error} onRetry={() => void refetch()} />;
  }
  return data === undefined ? (
    <LoadingRows what="the earlier batch" />
  ) : (
    <NewBatchForm earlier={data} />
  );
}

function Preparation() {
  const [search] = useSearchParams();
  const earlierId = search.get('again');
  return (
    <Page title="Prepare letters" lead="The rules say who gets which letter; each reason is kept.">
      {earlierId === null ? <NewBatchForm earlier={null} /> : <PrepareAgain batchId={earlierId} />}
    </Page>
  );
}

/** Who gets a letter of a kind and why; then the letters are written. */
export function NewBatchPage() {
  return can(useScheme(), 'prepareLetters') ? <Preparation /> : <NotFoundPage />;
}
