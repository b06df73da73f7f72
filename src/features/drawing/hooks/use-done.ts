import { useState } from 'react';
import { useUndoChanges } from '../../buildings/api/undo-changes.ts';

/** A change that was saved from here, and what was selected before it. */
export type Done = {
  readonly changeId: string;
  readonly words: string;
  readonly before: number | null;
};

/** What was saved from here, the last first to be taken back. */
export function useDone(schemeId: string, select: (buildingId: number | null) => void) {
  const [stack, setStack] = useState<readonly Done[]>([]);
  const [told, setTold] = useState<{ words: string; mayUndo: boolean } | null>(null);
  const undo = useUndoChanges(schemeId);
  const last = stack.at(-1);

  return {
    saved: stack.length,
    told,
    error: undo.error,
    isUndoing: undo.isPending,
    push: (done: Done) => {
      undo.reset();
      setStack((now) => [...now, done]);
      setTold({ words: done.words, mayUndo: true });
    },
    forget: () => {
      setTold(null);
    },
    undo: () => {
      if (last === undefined || undo.isPending) return;
      // what it made may be gone in a moment
      select(null);
      undo.mutate([last.changeId], {
        onSuccess: () => {
          setStack((now) => now.filter((one) => one !== last));
          setTold({ words: `Undone: ${last.words}`, mayUndo: false });
          select(last.before);
        },
      });
    },
  };
}
