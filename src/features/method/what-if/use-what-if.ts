import { useDeferredValue, useMemo, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { LeftOut } from './left-out.ts';
import { whatIfPath } from './what-if-address.ts';
import type { WhatIfDraft, WhatIfFaults, WhatIfName } from './what-if-fields.ts';
import { workWhatIf, type WorkedWhatIf } from './work-what-if.ts';

/** Said with an address that the fields themselves have written. */
export const TYPED = 'typed';

export type WhatIf = {
  readonly draft: WhatIfDraft;
  readonly faults: WhatIfFaults;
  /** The last that could be worked out; null while there was none. */
  readonly shown: WorkedWhatIf | null;
  /** Whether the fields say something else than what is shown. */
  readonly isBehind: boolean;
  readonly change: (name: WhatIfName, text: string) => void;
};

/** A what-if as it is being written: worked out at each change, and kept in the address. */
export function useWhatIf(start: WhatIfDraft, leftOut: readonly LeftOut[] | null): WhatIf {
  const navigate = useNavigate();
  const [draft, setDraft] = useState(start);
  const settled = useDeferredValue(draft);
  const answer = useMemo(() => workWhatIf(settled), [settled]);
  const [last, setLast] = useState<WorkedWhatIf | null>(null);
  if (answer.kind === 'worked' && answer !== last) setLast(answer);
  const shown = answer.kind === 'worked' ? answer : last;
  return {
    draft,
    shown,
    faults: answer.kind === 'faults' ? answer.faults : {},
    isBehind: answer.kind === 'faults',
    change: (name, text) => {
      const next = { ...draft, [name]: text };
      setDraft(next);
      void navigate(whatIfPath(next, leftOut), { replace: true, state: TYPED });
    },
  };
}
