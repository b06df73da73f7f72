import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useAskPrint } from '../api/prints.ts';
import type { EvidenceDesk } from '../hooks/use-evidence-desk.ts';
import { AskedPrint } from './print-list.tsx';

/** Asks for what is laid out, and shows how it fares. */
export function PrintButton({ desk }: { readonly desk: EvidenceDesk }) {
  const { schemeId, layout, faults, runs, writing } = desk;
  const ask = useAskPrint(schemeId);
  const { run } = runs;
  if (layout === null || run === null || Object.keys(faults).length > 0) return null;
  const { title, subtitle } = layout.fields;
  const name = [writing.kept?.name ?? title, subtitle].filter((one) => one !== '').join(', ');
  return (
    <div className="grid gap-2">
      <Button
        kind="main"
        className="justify-self-start"
        busy={ask.isPending}
        onClick={() => {
          ask.mutate({ runId: run.id, name: name.slice(0, 80) || 'Evidence', layout });
        }}
      >
        Print
      </Button>
      <MutationError failed="Nothing is printed." error={ask.error} />
      {ask.data !== undefined && <AskedPrint {...{ schemeId }} print={ask.data} />}
    </div>
  );
}
