import { Page } from '../../components/layout/page.tsx';
import { Panel } from '../../components/ui/panel.tsx';
import { CrsFacts } from '../../features/crs/components/crs-facts.tsx';
import { can } from '../../features/schemes/can.ts';
import { ArchiveScheme } from '../../features/schemes/components/archive-scheme.tsx';
import { DescriptionForm } from '../../features/schemes/components/description-form.tsx';
import { useScheme } from '../../features/schemes/scheme-context.ts';

export function DescriptionPage() {
  const scheme = useScheme();
  return (
    <Page title={can(scheme, 'updateScheme') ? 'Description' : scheme.name}>
      <div className="grid max-w-[620px] gap-5">
        {can(scheme, 'updateScheme') ? (
          <DescriptionForm scheme={scheme} />
        ) : (
          scheme.description !== '' && (
            <p className="text-roomy whitespace-pre-line">{scheme.description}</p>
          )
        )}
        <CrsFacts code={scheme.crs} />
        {can(scheme, 'archiveScheme') && (
          <Panel title={scheme.archivedAt === null ? 'Archive' : 'Archived'}>
            <ArchiveScheme scheme={scheme} />
          </Panel>
        )}
      </div>
    </Page>
  );
}
