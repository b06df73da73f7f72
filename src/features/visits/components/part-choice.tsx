import { VISIT_PARTS } from '../../../../shared/schemas/visits.ts';
import { Segments } from '../../../components/ui/segments.tsx';
import type { VisitDraft } from '../hooks/use-visit-draft.ts';

const LABELS = { inside: 'Inside', outside: 'Outside', 'inside and outside': 'Both' } as const;

/** Where the visitor was. */
export function PartChoice({ draft }: { readonly draft: VisitDraft }) {
  return (
    <div className="mt-2">
      <p aria-hidden="true" className="mb-1 text-small font-semibold">
        Seen from
      </p>
      <Segments
        label="Seen from"
        segments={VISIT_PARTS.map((part) => ({ value: part, label: LABELS[part] }))}
        value={draft.visit.findings.part ?? ''}
        onChange={(value) => {
          draft.change({ part: VISIT_PARTS.find((part) => part === value) ?? null });
        }}
      />
    </div>
  );
}
