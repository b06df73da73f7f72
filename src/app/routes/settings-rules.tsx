import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { RulesVersion } from '../../../shared/schemas/rules.ts';
import { Page } from '../../components/layout/page.tsx';
import { Button } from '../../components/ui/button.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { Panel } from '../../components/ui/panel.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { rulesQuery } from '../../features/rules/api/list-rules.ts';
import { RulesChange } from '../../features/rules/components/rules-change.tsx';
import { RulesForm } from '../../features/rules/components/rules-form.tsx';
import { RulesHistory } from '../../features/rules/components/rules-history.tsx';
import { RulesView } from '../../features/rules/components/rules-view.tsx';
import { can } from '../../features/schemes/can.ts';
import { useScheme } from '../../features/schemes/scheme-context.ts';
import { NotFoundPage } from './not-found.tsx';

const LEAD =
  'Each with its source. A change makes a new version; results keep the one they were worked out by.';

function Versions({
  versions,
  newest,
}: {
  versions: readonly RulesVersion[];
  newest: RulesVersion;
}) {
  const scheme = useScheme();
  const [chosen, setChosen] = useState<number>();
  const [isEditing, setEditing] = useState(false);
  const shown = versions.find(({ version }) => version === chosen) ?? newest;
  const before = versions.find(({ version }) => version === shown.version - 1);
  if (isEditing) {
    return (
      <Page title="Rules and limits" lead={LEAD}>
        <RulesForm
          schemeId={scheme.id}
          newest={newest}
          onDone={() => {
            setChosen(undefined);
            setEditing(false);
          }}
        />
      </Page>
    );
  }
  return (
    <Page
      title="Rules and limits"
      lead={LEAD}
      aside={
        <Panel title="Versions">
          <RulesHistory versions={versions} shown={shown.version} onShow={setChosen} />
        </Panel>
      }
    >
      <RulesView rules={shown.rules} />
      {before !== undefined && <RulesChange before={before} after={shown} />}
      {shown === newest && can(scheme, 'updateRules') && (
        <Button
          className="mt-4"
          onClick={() => {
            setEditing(true);
          }}
        >
          Change the rules
        </Button>
      )}
    </Page>
  );
}

function Rules() {
  const { data: versions, error, refetch } = useQuery(rulesQuery(useScheme().id));
  const newest = versions?.[0];
  if (versions !== undefined && newest !== undefined) {
    return <Versions versions={versions} newest={newest} />;
  }
  return (
    <Page title="Rules and limits" lead={LEAD}>
      {error === null ? (
        <LoadingRows what="the rules" />
      ) : (
        <QueryError what="The rules" error={error} onRetry={() => void refetch()} />
      )}
    </Page>
  );
}

export function RulesPage() {
  return can(useScheme(), 'readRules') ? <Rules /> : <NotFoundPage />;
}
