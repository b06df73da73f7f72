import { useQuery } from '@tanstack/react-query';
import { useState, type SubmitEvent } from 'react';
import { LETTER_MARKS } from '../../../../shared/presentation/letter-text.ts';
import type { Template } from '../../../../shared/schemas/letter-templates.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Facts } from '../../../components/ui/facts.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import { UnsavedEdits } from '../../../components/ui/unsaved-edits.tsx';
import { useDelayedValue } from '../../../hooks/use-delayed-value.ts';
import { formatDay } from '../../../lib/format-date.ts';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { previewQuery, useKeepTemplate } from '../api/letter-templates.ts';
import { LetterParts } from './letter-parts.tsx';

const WHILE_TYPING = 400;

const MARKS = Object.entries(LETTER_MARKS).map(([name, words]) => [`{${name}}`, words] as const);

function versionWords({ version, by, at }: Template): string {
  if (version === 0 || at === null) return 'The letter that every scheme starts with.';
  return `Version ${version}, ${by ?? 'somebody'}, ${formatDay(at)}.`;
}

/** How a real party would read what is being written. */
function Look({ written }: { readonly written: Pick<Template, 'kind' | 'subject' | 'body'> }) {
  const scheme = useScheme();
  const [partyId, setPartyId] = useState('');
  const settled = useDelayedValue(written, WHILE_TYPING);
  const { data } = useQuery(previewQuery(scheme.id, settled, partyId === '' ? null : partyId));
  if (data === undefined) return null;
  const { faults, parties, letter } = data;
  return (
    <section aria-label="As it is read" className="min-w-0">
      {parties.length > 0 && (
        <Select
          label="As it is read by"
          options={parties.map(({ id, name }) => ({ value: id, label: name }))}
          value={partyId === '' ? (parties[0]?.id ?? '') : partyId}
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
      {parties.length === 0 && (
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

/** Writes the next version of a template. */
export function TemplateEditor({ template }: { readonly template: Template }) {
  const scheme = useScheme();
  const { kind, version } = template;
  const [written, setWritten] = useState({ subject: template.subject, body: template.body });
  const mayChange = can(scheme, 'updateLetterTemplates');
  const hasEdits = written.subject !== template.subject || written.body !== template.body;
  const keep = useKeepTemplate(scheme.id, kind, () => undefined);
  function save(event: SubmitEvent) {
    event.preventDefault();
    keep.mutate({ basedOn: version, ...written });
  }
  return (
    <div className="grid grid-cols-2 gap-8 max-lg:grid-cols-1">
      <form onSubmit={save} className="grid content-start gap-3">
        <MutationError failed="The letter was not kept." error={keep.error} />
        <p className="text-small text-ink-2">{versionWords(template)}</p>
        <Field
          label="Subject"
          readOnly={!mayChange}
          value={written.subject}
          onChange={(event) => {
            setWritten({ ...written, subject: event.target.value });
          }}
        />
        <TextArea
          label="Letter"
          hint="Empty lines part paragraphs; lines that begin with “- ” are a list."
          rows={24}
          readOnly={!mayChange}
          value={written.body}
          onChange={(event) => {
            setWritten({ ...written, body: event.target.value });
          }}
        />
        {mayChange && hasEdits && (
          <div>
            <Button kind="main" type="submit" busy={keep.isPending}>
              {`Keep as version ${version + 1}`}
            </Button>
          </div>
        )}
        <details className="text-small">
          <summary className="cursor-pointer">What can be put in</summary>
          <Facts facts={MARKS} />
        </details>
      </form>
      <Look written={{ kind, ...written }} />
      <UnsavedEdits hasEdits={hasEdits && !keep.isPending} what="What you wrote of this letter" />
    </div>
  );
}
