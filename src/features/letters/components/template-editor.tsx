import { useState, type SubmitEvent } from 'react';
import type { Template } from '../../../../shared/schemas/letter-templates.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { UnsavedEdits } from '../../../components/ui/unsaved-edits.tsx';
import { formatDay } from '../../../lib/format-date.ts';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useKeepTemplate } from '../api/letter-templates.ts';
import { LetterLook } from './letter-look.tsx';
import { LetterWordsFields } from './letter-words-fields.tsx';

function versionWords({ version, by, at }: Template): string {
  if (version === 0 || at === null) return 'The letter that every scheme starts with.';
  return `Version ${version}, ${by ?? 'somebody'}, ${formatDay(at)}.`;
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
        <p className="text-small text-ink-2">
          {versionWords(template)}
          {kind === 'free text' && ' Free text begins with it and is written for each batch.'}
        </p>
        <LetterWordsFields
          written={written}
          rows={24}
          readOnly={!mayChange}
          onChange={setWritten}
        />
        {mayChange && hasEdits && (
          <div>
            <Button kind="main" type="submit" busy={keep.isPending}>
              {`Keep as version ${version + 1}`}
            </Button>
          </div>
        )}
      </form>
      <LetterLook written={written} asked={{ kind, leftOut: [], chosen: [] }} />
      <UnsavedEdits hasEdits={hasEdits && !keep.isPending} what="What you wrote of this letter" />
    </div>
  );
}
