import { VISIT_LIMITS } from '../../../../shared/schemas/visits.ts';
import { Panel } from '../../../components/ui/panel.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import type { VisitDraft } from '../hooks/use-visit-draft.ts';

/** Whatever else is to be said. */
export function NotesPart({ draft }: { readonly draft: VisitDraft }) {
  return (
    <Panel title="Notes">
      <div className="mt-2">
        <TextArea
          label="What else you saw"
          rows={5}
          maxLength={VISIT_LIMITS.notes}
          value={draft.visit.findings.notes}
          onChange={({ target }) => {
            draft.change({ notes: target.value });
          }}
        />
      </div>
    </Panel>
  );
}
