import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { NotFoundPage } from '../../app/routes/not-found.tsx';
import { Page } from '../../components/layout/page.tsx';
import { Button } from '../../components/ui/button.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { letterSettingsQuery } from './api/letter-templates.ts';
import { SettingsForm } from './components/settings-form.tsx';
import { SettingsView } from './components/settings-view.tsx';

function Settings() {
  const scheme = useScheme();
  const [isEditing, setEditing] = useState(false);
  const { data, error, refetch } = useQuery(letterSettingsQuery(scheme.id));
  return (
    <Page
      title="Who gets which letter"
      lead="Rules with their source, days, what owners are promised, whom they may ask, and what happens when. A change makes a new version."
    >
      {error !== null && data === undefined && (
        <QueryError what="The settings" error={error} onRetry={() => void refetch()} />
      )}
      {data === undefined && error === null && <LoadingRows what="the settings" />}
      {data !== undefined && isEditing && (
        <SettingsForm
          held={data}
          onDone={() => {
            setEditing(false);
          }}
        />
      )}
      {data !== undefined && !isEditing && (
        <>
          <SettingsView held={data} />
          {can(scheme, 'updateLetterTemplates') && (
            <Button
              className="mt-4"
              onClick={() => {
                setEditing(true);
              }}
            >
              Change this
            </Button>
          )}
        </>
      )}
    </Page>
  );
}

/** What the letters of a scheme go by. */
export function LetterSettingsPage() {
  return can(useScheme(), 'readLetters') ? <Settings /> : <NotFoundPage />;
}
