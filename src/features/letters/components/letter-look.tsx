import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { LetterWords } from '../../../../shared/presentation/letter-text.ts';
import type { BatchPreview } from '../../../../shared/schemas/letter-batches.ts';
import { Select } from '../../../components/ui/select.tsx';
import { useDelayedValue } from '../../../hooks/use-delayed-value.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { previewQuery } from '../api/letter-templates.ts';
import { LetterParts } from './letter-parts.tsx';

const WHILE_TYPING = 400;

/** How a real party of those who get it would read what is being written. */
export function LetterLook({
  written,
  asked,
}: {
  readonly written: LetterWords;
  readonly asked: BatchPreview;
}) {
  const scheme = useScheme();
  const [partyId, setPartyId] = useState('');
  const settled = useDelayedValue(written, WHILE_TYPING);
  const by = partyId === '' ? null : partyId;
  const { data } = useQuery(previewQuery(scheme.id, asked, { ...settled, partyId: by }));
  if (data === undefined) return null;
  const { faults, parties, letter } = data;
  const [first] = parties;
  return (
    <section aria-label="As it is read" className="min-w-0">
      {first !== undefined && (
        <Select
          label="As it is read by"
          options={parties.map(({ id, name }) => ({ value: id, label: name }))}
          value={parties.some(({ id }) => id === partyId) ? partyId : first.id}
          onChange={(event) => {
            setPartyId(event.target.value);
          }}
        />
      )}
      {faults.length > 0 && (
        <ul role="alert" className="mt-3 list-disc pl-5 text-small">
          {faults.map((fault) => (
            <li key={fault}>{fault}</li>
          ))}
        </ul>
      )}
      {first === undefined && (
        <p className="mt-3 text-small text-ink-2">
          The rules name nobody yet, so there is nobody to look at it with.
        </p>
      )}
      {letter !== null && (
        <div className="mt-3 border border-hairline bg-paper-raised px-5 py-4">
          <h2 className="mb-3 text-lead break-words">{letter.subject}</h2>
          <LetterParts parts={letter.parts} />
        </div>
      )}
    </section>
  );
}
