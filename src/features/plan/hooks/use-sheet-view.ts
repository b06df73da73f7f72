import { useState } from 'react';
import type { SheetView } from '../../buildings/components/building-sheet.tsx';

type Kept = { readonly of: number | null; readonly view: SheetView };

/** What of the selected building is shown; every other building begins with its facts. */
export function useSheetView(selected: number | null) {
  const [kept, keep] = useState<Kept>({ of: null, view: 'facts' });
  const view: SheetView = selected !== null && kept.of === selected ? kept.view : 'facts';
  return {
    view,
    /** What is written would be lost by whatever takes the form away. */
    isWriting: view === 'edit',
    setView: (next: SheetView) => {
      keep({ of: selected, view: next });
    },
  };
}
