import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { VISITED_FIELDS } from '../../../../shared/schemas/visits.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { visitPath } from '../../../config/paths.ts';
import { ClashChoice } from '../../buildings/components/clash-choice.tsx';
import type { KeptVisit } from '../draft/kept-visit.ts';
import { useSettleVisit } from '../hooks/use-settle-visit.ts';

/** A visit that was not recorded as it was: why, and what can be done. Nothing of it is lost until then. */
export function HeldUpVisit({ visit }: { readonly visit: KeptVisit }) {
  const { clash, isGone, settle, reopen, remove } = useSettleVisit(visit);
  const [asks, setAsks] = useState(false);
  const navigate = useNavigate();
  async function write() {
    await reopen();
    await navigate(visitPath(visit.schemeId, visit.buildingId));
  }
  const values = visit.seen?.values ?? {};
  return (
    <section aria-label={`Visit of ${visit.title}`} className="mb-4 border-b border-rule pb-3">
      <h2 className="text-lead">{visit.title}</h2>
      {clash !== null && (
        <ClashChoice
          clash={clash}
          busy={false}
          before={(name) => values[VISITED_FIELDS.find((field) => field === name) ?? 'use'] ?? null}
          onSave={(mine) => void settle(mine)}
          onBack={() => void write()}
        />
      )}
      {clash === null && (
        <>
          <p className="mt-1 text-body">{visit.fault}</p>
          <div className="mt-2 flex flex-wrap gap-2">
            {isGone && (
              <Button onClick={() => void settle([])}>Record it beside the register</Button>
            )}
            {!visit.isRecorded && !isGone && (
              <Button onClick={() => void write()}>Back to the form</Button>
            )}
            <Button
              onClick={() => {
                setAsks(true);
              }}
            >
              Remove from this phone
            </Button>
          </div>
        </>
      )}
      <ConfirmDialog
        open={asks}
        title="Remove this visit from this phone?"
        doIt="Remove it"
        onConfirm={() => void remove()}
        onClose={() => {
          setAsks(false);
        }}
      >
        What was not recorded is gone then.
      </ConfirmDialog>
    </section>
  );
}
