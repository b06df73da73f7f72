import { Link } from 'react-router-dom';
import { Content } from '../../components/layout/content.tsx';
import { PageTitle } from '../../components/layout/page-title.tsx';
import { EmptyState } from '../../components/ui/empty-state.tsx';
import { Panel } from '../../components/ui/panel.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { Select } from '../../components/ui/select.tsx';
import { UnsavedEdits } from '../../components/ui/unsaved-edits.tsx';
import { planPath } from '../../config/paths.ts';
import { runName } from '../../../shared/presentation/run-words.ts';
import { formatMoment } from '../../lib/format-date.ts';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { ContentFields } from './components/content-fields.tsx';
import { GroundFields } from './components/ground-fields.tsx';
import { LayoutBar } from './components/layout-bar.tsx';
import { PrintButton } from './components/print-button.tsx';
import { PrintList } from './components/print-list.tsx';
import { SheetFields } from './components/sheet-fields.tsx';
import { SheetPane } from './components/sheet-pane.tsx';
import { TitleFields } from './components/title-fields.tsx';
import { useEvidenceDesk, type EvidenceDesk } from './hooks/use-evidence-desk.ts';

function RunChoice({ runs: { runs = [], run, chooseRun } }: EvidenceDesk) {
  return (
    <Select
      label="What is printed was found by"
      options={runs.map((one) => ({
        value: one.id,
        label: `${runName(one)}, ${one.option.name}, ${formatMoment(one.startedAt)}`,
      }))}
      value={run?.id ?? ''}
      onChange={({ target }) => {
        chooseRun(target.value);
      }}
    />
  );
}

/** What is written of a layout, from what is printed to the title block. */
function Form({ desk, mayPrepare }: { readonly desk: EvidenceDesk; readonly mayPrepare: boolean }) {
  const { schemeId, writing, layout, faults } = desk;
  const { draft, change, kept, hasEdits, open, setKept } = writing;
  if (draft === null) return <EmptyState>What was found is being fetched.</EmptyState>;
  const props = { draft, faults, onChange: change };
  const hasPlans = draft.kind === 'plan' || draft.kind === 'strip';
  return (
    <>
      <Panel title="Sheet">
        <div className="grid gap-3 pt-3">
          <RunChoice {...desk} />
          <SheetFields {...props} />
          <GroundFields {...props} />
          {hasPlans && <ContentFields {...props} />}
          {mayPrepare && <PrintButton desk={desk} />}
        </div>
      </Panel>
      <Panel title="Named layouts">
        <div className="pt-3">
          <LayoutBar
            {...{ schemeId, kept, layout, hasEdits }}
            mayKeep={mayPrepare}
            onOpen={open}
            onKept={setKept}
          />
        </div>
      </Panel>
      <Panel title="Title block">
        <div className="pt-3">
          <TitleFields {...props} />
        </div>
      </Panel>
    </>
  );
}

function Desk({
  schemeId,
  mayPrepare,
}: {
  readonly schemeId: string;
  readonly mayPrepare: boolean;
}) {
  const desk = useEvidenceDesk(schemeId);
  const { runs, about, writing } = desk;
  const error = runs.error ?? about.error;
  if (error !== null && about.data === undefined) {
    const retry = () => void (runs.error === null ? about.refetch() : runs.refetch());
    return <QueryError what="What was found" error={error} onRetry={retry} />;
  }
  if (runs.runs?.length === 0) {
    return (
      <EmptyState action={<Link to={planPath(schemeId)}>Go to the Plan</Link>}>
        Nothing has been worked out yet. Draw a line and run it, then its evidence can be printed.
      </EmptyState>
    );
  }
  return (
    <div className="grid items-start gap-6 lg:grid-cols-[360px_minmax(0,1fr)]">
      <div className="grid min-w-0">
        <Form {...{ desk, mayPrepare }} />
      </div>
      <div className="grid min-w-0 gap-6">
        <SheetPane desk={desk} />
        <Panel title="Prints">
          <PrintList schemeId={schemeId} />
        </Panel>
      </div>
      <UnsavedEdits hasEdits={writing.hasEdits && writing.kept !== null} what="The layout" />
    </div>
  );
}

/** Plans, series, sections and schedules of a run, laid out and printed to scale. */
export function EvidencePage() {
  const scheme = useScheme();
  return (
    <Content>
      <PageTitle>{`Evidence of ${scheme.name}`}</PageTitle>
      <div className="p-6 max-sm:p-4">
        <h1 className="mb-3 text-h3">Evidence</h1>
        {can(scheme, 'readEvidence') ? (
          <Desk schemeId={scheme.id} mayPrepare={can(scheme, 'prepareEvidence')} />
        ) : (
          <EmptyState>Evidence is for those who work on the scheme.</EmptyState>
        )}
      </div>
    </Content>
  );
}
