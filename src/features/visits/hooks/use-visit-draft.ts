import { useRef, useState } from 'react';
import type { VisitedField } from '../../../../shared/schemas/visits.ts';
import type { Findings, KeptVisit } from '../draft/kept-visit.ts';
import { useVisitStore } from '../draft/visit-store-context.ts';
import { useDraftPhotographs } from './use-draft-photographs.ts';
import { useKeptChanged } from './use-kept-visits.ts';

const NOT_KEPT =
  'This phone does not keep what is written. Free some space, or leave this page open.';

/** A visit while it is written: every letter and photograph is kept on this phone at once. */
export function useVisitDraft(opened: KeptVisit) {
  const store = useVisitStore();
  const changed = useKeptChanged();
  const [visit, setVisit] = useState(opened);
  const newest = useRef(opened);
  const [fault, setFault] = useState<string | null>(null);

  async function keep(next: KeptVisit): Promise<boolean> {
    newest.current = next;
    setVisit(next);
    try {
      await store.put(next);
      return true;
    } catch {
      setFault(NOT_KEPT);
      return false;
    }
  }
  function change(part: Partial<Findings>): void {
    const { findings } = newest.current;
    void keep({ ...newest.current, findings: { ...findings, ...part } });
  }
  const photographs = useDraftPhotographs({ newest, keep, setFault, notKept: NOT_KEPT });
  return {
    visit,
    fault,
    change,
    changeText: (field: VisitedField, text: string) => {
      change({ texts: { ...newest.current.findings.texts, [field]: text } });
    },
    photographs,
    /** It is not changed on this phone from then on, so that what is sent twice is the same twice. */
    record: async (whole: KeptVisit) => {
      await keep(whole);
      await changed();
    },
  };
}

export type VisitDraft = ReturnType<typeof useVisitDraft>;
