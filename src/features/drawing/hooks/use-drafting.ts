import { useState } from 'react';
import type { CornerAt } from '../../map/map-drawing.ts';
import type { Draft, JoinDraft, ShapeDraft } from '../drafts/draft.ts';
import { begun, redone, stepped, undone, type History } from '../drafts/history.ts';
import { isWorthKeeping, lostBy } from '../drafts/lost-by.ts';

type Asking = { readonly corners: number; readonly next: () => void };

/** What is drawn, step by step, and asking before much of it would be lost. */
export function useDrafting() {
  const [history, setHistory] = useState<History<Draft> | null>(null);
  const [chosen, choose] = useState<CornerAt | null>(null);
  const [asking, setAsking] = useState<Asking | null>(null);

  function step(edit: (history: History<Draft>) => History<Draft>): void {
    choose(null);
    setHistory((now) => (now === null ? null : edit(now)));
  }
  function set(draft: Draft | null): void {
    choose(null);
    setAsking(null);
    setHistory(draft === null ? null : begun(draft));
  }
  return {
    draft: history?.present ?? null,
    steps: history === null ? null : { past: history.past.length, future: history.future.length },
    /** Something is drawn that leaving the page would lose. */
    isWorthKeeping: isWorthKeeping(history),
    chosen,
    choose,
    set,
    asking,
    keep: () => {
      setAsking(null);
    },
    /** Goes on to something else once what is drawn may be lost. */
    leave: (next: () => void) => {
      const corners = lostBy(history);
      if (corners === 0) next();
      else setAsking({ corners, next });
    },
    editShape: (edit: (draft: ShapeDraft) => ShapeDraft) => {
      step((now) => (now.present.tool === 'join' ? now : stepped(now, edit(now.present))));
    },
    editJoin: (edit: (draft: JoinDraft) => JoinDraft) => {
      step((now) => (now.present.tool === 'join' ? stepped(now, edit(now.present)) : now));
    },
    undo: () => {
      step(undone);
    },
    redo: () => {
      step(redone);
    },
  };
}

export type Drafting = ReturnType<typeof useDrafting>;
