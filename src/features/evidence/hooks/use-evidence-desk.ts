import { useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { lineOnGround } from '../../../../shared/evidence/line-on-ground.ts';
import type { Spot } from '../../../../shared/evidence/marks.ts';
import type { LayoutAnswer } from '../../../../shared/schemas/evidence.ts';
import { runsQuery } from '../../runs/api/list-runs.ts';
import { completeOf } from '../../runs/run-states.ts';
import { aboutQuery } from '../api/material.ts';
import { draftOfLayout, newDraft, readDraft, type LayoutDraft } from '../layout-draft.ts';
import { useSheets } from './use-sheets.ts';

/** The runs that can be printed, and the one that is. */
function useRuns(schemeId: string) {
  const found = useQuery(runsQuery(schemeId));
  const [chosen, chooseRun] = useState<string | null>(null);
  const runs = found.data === undefined ? undefined : completeOf(found.data);
  const run = runs?.find(({ id }) => id === chosen) ?? runs?.[0] ?? null;
  return { runs, run, chooseRun, error: found.error, refetch: found.refetch };
}

/** A layout that is being written: what was opened, what stands now, and whether that is kept. */
function useDraft(begin: LayoutDraft | null) {
  const [written, setWritten] = useState<LayoutDraft | null>(null);
  const [kept, setKept] = useState<LayoutAnswer | null>(null);
  const draft = written ?? begin;
  const first = useMemo(
    () => (kept === null || begin === null ? begin : draftOfLayout(kept.layout, begin)),
    [kept, begin],
  );
  const read = useMemo(() => (draft === null ? null : readDraft(draft)), [draft]);
  const hasEdits = written !== null && JSON.stringify(written) !== JSON.stringify(first);
  return {
    ...{ draft, kept, read, hasEdits },
    change: (change: Partial<LayoutDraft>) => {
      if (draft !== null) setWritten({ ...draft, ...change });
    },
    /** Opens a named layout; null begins a new one. */
    open: (layout: LayoutAnswer | null) => {
      setKept(layout);
      setWritten(layout === null || begin === null ? null : draftOfLayout(layout.layout, begin));
    },
    /** What was written is kept now, or is to stand on top of what somebody else kept. */
    setKept,
  };
}

/** Everything that the page of evidence goes by. */
export function useEvidenceDesk(schemeId: string) {
  const runs = useRuns(schemeId);
  const about = useQuery({
    ...aboutQuery(schemeId, runs.run?.id ?? ''),
    enabled: runs.run !== null,
  });
  const line = about.data?.run.design.line;
  const begin = useMemo(() => {
    if (line === undefined) return null;
    const { length, pointAt } = lineOnGround(line);
    return newDraft(pointAt(length / 2));
  }, [line]);
  const writing = useDraft(begin);
  const { draft, read, change } = writing;
  const layout = read !== null && 'layout' in read ? read.layout : null;
  const [number, setNumber] = useState(1);
  const sheets = useSheets(schemeId, about.data, layout, number);
  const faults = read !== null && 'faults' in read ? read.faults : sheets.faults;
  const what = sheets.one?.what;
  const move =
    draft?.kind === 'plan' && what?.kind === 'plan'
      ? ([dx, dy]: Spot) => {
          const { window, ground } = what.frame;
          const middle: Spot = [(window.left + window.right) / 2, (window.top + window.bottom) / 2];
          const [e, n] = ground([middle[0] - dx, middle[1] - dy]);
          change({ east: e.toFixed(1), north: n.toFixed(1) });
        }
      : null;
  return {
    ...{ schemeId, runs, about, writing, layout, faults, sheets, move },
    number: Math.min(number, Math.max(1, sheets.count)),
    setNumber,
  };
}

export type EvidenceDesk = ReturnType<typeof useEvidenceDesk>;
