import { Page } from '../../components/layout/page.tsx';
import { Panel } from '../../components/ui/panel.tsx';
import { CrsFacts } from '../../features/crs/components/crs-facts.tsx';
import { can } from '../../features/schemes/can.ts';
import { ArchiveScheme } from '../../features/schemes/components/archive-scheme.tsx';
import { DescriptionForm } from '../../features/schemes/components/description-form.tsx';
import { useScheme } from '../../features/schemes/scheme-context.ts';
import { classNames } from '../../lib/class-names.ts';

const OWNERS_READ = 'text-owner leading-owner';

export function DescriptionPage() {
  const scheme = useScheme();
  const worksOnIt = can(scheme, 'readRegister');
  return (
    <Page title={can(scheme, 'updateScheme') ? 'Description' : scheme.name}>
      <div className="grid max-w-[620px] gap-5">
        {can(scheme, 'updateScheme') ? (
          <DescriptionForm scheme={scheme} />
        ) : (
          <p className={classNames('whitespace-pre-line', worksOnIt ? 'text-roomy' : OWNERS_READ)}>
            {scheme.description === '' ? 'Nothing is written about it yet.' : scheme.description}
          </p>
        )}
        {worksOnIt && <CrsFacts code={scheme.crs} />}
        {can(scheme, 'archiveScheme') && (
          <Panel title={scheme.archivedAt === null ? 'Archive' : 'Archived'}>
            <ArchiveScheme scheme={scheme} />
          </Panel>
        )}
      </div>
    </Page>
  );
}
