import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { LetterKind } from '../../../shared/schemas/letter-settings.ts';
import { NotFoundPage } from '../../app/routes/not-found.tsx';
import { Page } from '../../components/layout/page.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { Select } from '../../components/ui/select.tsx';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { templatesQuery } from './api/letter-templates.ts';
import { TemplateEditor } from './components/template-editor.tsx';
import { KIND_OPTIONS } from './letter-words.ts';

function Templates() {
  const scheme = useScheme();
  const [kind, setKind] = useState<LetterKind>('first information');
  const { data, error, refetch } = useQuery(templatesQuery(scheme.id));
  const template = data?.find((one) => one.kind === kind);
  return (
    <Page
      title="What letters say"
      lead="A change makes a new version; letters keep the one that they were written from."
    >
      <div className="mb-4 max-w-[320px]">
        <Select
          label="Kind of letter"
          options={KIND_OPTIONS}
          value={kind}
          onChange={(event) => {
            setKind(event.target.value as LetterKind);
          }}
        />
      </div>
      {error !== null && (
        <QueryError what="The templates" error={error} onRetry={() => void refetch()} />
      )}
      {data === undefined && error === null && <LoadingRows what="the templates" />}
      {template !== undefined && (
        <TemplateEditor key={`${kind} ${template.version}`} template={template} />
      )}
    </Page>
  );
}

/** The templates of letters, beside how a real party would read them. */
export function TemplatesPage() {
  return can(useScheme(), 'readLetters') ? <Templates /> : <NotFoundPage />;
}
