import { useState } from 'react';
import { useUndoChanges } from '../../buildings/api/undo-changes.ts';

/** A change that was saved from here, and what was selected before it. */
export type Done = {
  readonly changeId: string;
  readonly words: string;
  /** What is told besides when it is saved, and not when it is undone. */
  readonly remark?: string;
  readonly before: number | null;
};

type Told = { readonly words: string; readonly next: 'undo' | 'redo' };

/** What was saved from here, the last first to be taken back, and what was taken back, to be done again. */
export function useDone(schemeId: string, select: (buildingId: number | null) => void) {
  const [stack, setStack] = useState<readonly Done[]>([]);
  const [undone, setUndone] = useState<readonly Done[]>([]);
  const [told, setTold] = useState<Told | null>(null);
  const undo = useUndoChanges(schemeId);
  const redo = useUndoChanges(schemeId);
  const isBusy = undo.isPending || redo.isPending;

  /** To undo and to do again are the same step the other way. */
  function turn(way: 'undo' | 'redo'): void {
    const last = (way === 'undo' ? stack : undone).at(-1);
    if (last === undefined || isBusy) return;
    const [step, other] = way === 'undo' ? [undo, redo] : [redo, undo];
    other.reset();
    // what it made may be gone in a moment
    select(null);
    step.mutate([last.changeId], {
      onSuccess: ([made]) => {
        if (made === undefined) return;
        const [from, onto] = way === 'undo' ? [setStack, setUndone] : [setUndone, setStack];
        from((now) => now.filter((one) => one !== last));
        onto((now) => [...now, { ...last, changeId: made.changeId }]);
        if (way === 'undo') setTold({ words: `Undone: ${last.words}`, next: 'redo' });
        else setTold({ words: `Done again: ${last.words}`, next: 'undo' });
        select(way === 'undo' ? last.before : (made.buildingIds[0] ?? null));
      },
    });
  }
  return {
    saved: stack.length,
    undone: undone.length,
    told,
    /** Why the last step did not go, and which it was. */
    failed: { undo: undo.error, redo: redo.error },
    isBusy,
    push: (done: Done) => {
      undo.reset();
      redo.reset();
      setStack((now) => [...now, done]);
      setUndone([]);
      setTold({ words: `${done.words}${done.remark ?? ''}`, next: 'undo' });
    },
    forget: () => {
      setTold(null);
    },
    undo: () => {
      turn('undo');
    },
    redo: () => {
      turn('redo');
    },
  };
}
