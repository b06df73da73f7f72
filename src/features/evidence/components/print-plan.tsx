import { useState, type SubmitEvent } from 'react';
import { Link } from 'react-router-dom';
import { runName } from '../../../../shared/presentation/run-words.ts';
import type { RunAnswer } from '../../../../shared/schemas/runs.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { evidencePath } from '../../../config/paths.ts';
import { useAskPrint } from '../api/prints.ts';
import { readDraft, type LayoutDraft } from '../layout-draft.ts';
import { planAsShown, type PlanShown } from '../plan-as-shown.ts';
import { AskedPrint } from './print-list.tsx';
import { PaperField, ScaleField } from './sheet-fields.tsx';

type PrintPlanProps = PlanShown & {
  readonly schemeId: string;
  readonly run: RunAnswer;
  /** The grid in the middle of the map; null where the grid does not reach. */
  readonly middle: () => readonly [number, number] | null;
};

type FormProps = Pick<PrintPlanProps, 'schemeId' | 'run'> & { readonly begin: LayoutDraft };

function PrintForm({ schemeId, run, begin }: FormProps) {
  const [draft, setDraft] = useState(begin);
  const ask = useAskPrint(schemeId);
  const read = readDraft(draft);
  const faults = 'faults' in read ? read.faults : {};
  function change(some: Partial<LayoutDraft>) {
    setDraft({ ...draft, ...some });
  }
  function print(event: SubmitEvent) {
    event.preventDefault();
    if ('faults' in read || ask.isPending) return;
    ask.mutate({ runId: run.id, name: draft.fields.title, layout: read.layout });
  }
  if (ask.data !== undefined) return <AskedPrint {...{ schemeId }} print={ask.data} />;
  return (
    <form onSubmit={print} className="grid gap-3">
      <div className="grid grid-cols-2 items-start gap-3">
        <PaperField {...{ draft, faults }} onChange={change} />
        <ScaleField {...{ draft, faults }} onChange={change} />
      </div>
      <MutationError failed="Nothing is printed." error={ask.error} />
      <Button
        type="submit"
        kind="main"
        data-first-in-focus
        className="justify-self-start"
        busy={ask.isPending}
      >
        Print
      </Button>
    </form>
  );
}

/** A button that prints the piece of ground in the middle of the map, coloured as the map is. */
export function PrintPlan({ schemeId, run, by, end, middle }: PrintPlanProps) {
  const [isOpen, setOpen] = useState(false);
  const place = isOpen ? middle() : null;
  return (
    <>
      <button
        type="button"
        className="-my-1 min-h-6 underline underline-offset-2 hover:text-ink max-sm:min-h-11"
        onClick={() => {
          setOpen(true);
        }}
      >
        Print
      </button>
      <Dialog
        open={isOpen}
        title="Print what the Plan shows"
        onClose={() => {
          setOpen(false);
        }}
      >
        <div className="grid gap-3 text-body text-ink">
          <p>
            One sheet round the middle of the map, as {runName(run).toLowerCase()} found it. Series,
            sections and the title block are at <Link to={evidencePath(schemeId)}>Evidence</Link>.
          </p>
          {place === null ? (
            <p>The middle of the map lies outside of the scheme’s grid. Move the map first.</p>
          ) : (
            <PrintForm {...{ schemeId, run }} begin={planAsShown({ by, end }, place)} />
          )}
        </div>
      </Dialog>
    </>
  );
}
