import { useRef } from 'react';
import { VISIT_LIMITS } from '../../../../shared/schemas/visits.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import type { WrittenDefect } from '../draft/kept-visit.ts';
import type { VisitDraft } from '../hooks/use-visit-draft.ts';
import { DefectFields } from './defect-fields.tsx';

/** What is not as it should be, one after the other. */
export function DefectsPart({ draft }: { readonly draft: VisitDraft }) {
  const { defects } = draft.visit.findings;
  const adds = useRef<HTMLButtonElement>(null);
  function add(): void {
    const blank = {
      id: crypto.randomUUID(),
      place: '',
      kind: 'crack',
      width: '',
      note: '',
    } as const;
    draft.change({ defects: [...defects, blank] });
  }
  function change(id: string, part: Partial<WrittenDefect>): void {
    draft.change({ defects: defects.map((one) => (one.id === id ? { ...one, ...part } : one)) });
  }
  return (
    <Panel title="Defects">
      {defects.map((defect, index) => (
        <DefectFields
          key={defect.id}
          defect={defect}
          number={index + 1}
          onChange={(part) => {
            change(defect.id, part);
          }}
          onRemove={() => {
            draft.change({ defects: defects.filter(({ id }) => id !== defect.id) });
            adds.current?.focus();
          }}
        />
      ))}
      {defects.length < VISIT_LIMITS.defects && (
        <div className="mt-3">
          <Button ref={adds} onClick={add}>
            Add a defect
          </Button>
        </div>
      )}
    </Panel>
  );
}
