import { useState } from 'react';
import { begun, redone, stepped, undone, type History } from '../../drawing/drafts/history.ts';
import type { CornerAt } from '../../map/map-drawing.ts';
import type { LineDraft } from '../drafts/line-draft.ts';

/** The line that is drawn, step by step. */
export function useLineDraft() {
  const [history, setHistory] = useState<History<LineDraft> | null>(null);
  const [chosen, setChosen] = useState<CornerAt | null>(null);

  function step(edit: (history: History<LineDraft>) => History<LineDraft>): void {
    setChosen(null);
    setHistory((now) => (now === null ? null : edit(now)));
  }
  return {
    line: history?.present ?? null,
    steps: { past: history?.past.length ?? 0, future: history?.future.length ?? 0 },
    chosen,
    choose: (at: CornerAt | null) => {
      setChosen(at);
    },
    set: (line: LineDraft | null) => {
      setChosen(null);
      setHistory(line === null ? null : begun(line));
    },
    edit: (edit: (line: LineDraft) => LineDraft) => {
      step((now) => stepped(now, edit(now.present)));
    },
    undo: () => {
      step(undone);
    },
    redo: () => {
      step(redone);
    },
  };
}

export type LineDrafting = ReturnType<typeof useLineDraft>;
