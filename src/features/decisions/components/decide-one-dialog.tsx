import { needsReason } from '../../../../shared/assessment/decision-kinds.ts';
import type { BuildingDecisions } from '../../../../shared/schemas/decision-answers.ts';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { usePrepareDecisions } from '../api/prepare-decisions.ts';
import { DecideForm, NOTHING_PROPOSED } from './decide-form.tsx';

type DecideOneDialogProps = {
  readonly schemeId: string;
  readonly runId: string;
  readonly building: { readonly id: number; readonly reference: string };
  readonly answer: BuildingDecisions;
  readonly onClose: () => void;
};

/** Prepares a decision for the building whose sheet is open; what cannot be had says why. */
export function DecideOneDialog(props: DecideOneDialogProps) {
  const { schemeId, runId, building, answer, onClose } = props;
  const prepare = usePrepareDecisions(schemeId, onClose);
  const { open, conclusion, version } = answer;
  const first = open.find(({ why }) => why === null);
  return (
    <Dialog open title={`Decide for ${building.reference}`} onClose={onClose}>
      <MutationError failed="Nothing was prepared." error={prepare.error} />
      <DecideForm
        draft={{ ...NOTHING_PROPOSED, ...(first !== undefined && { kind: first.kind }) }}
        doIt="Prepare for check"
        busy={prepare.isPending}
        whyNot={(kind) => open.find((one) => one.kind === kind)?.why ?? null}
        needsReason={(kind) => needsReason(kind, conclusion)}
        onClose={onClose}
        onPropose={({ kind, category, reason }) => {
          const filter = { ids: [building.id] };
          const asked = { runId, filter, kind, reason, version, expected: 1 };
          prepare.mutate({ ...asked, ...(category !== null && { category }) });
        }}
      />
    </Dialog>
  );
}
