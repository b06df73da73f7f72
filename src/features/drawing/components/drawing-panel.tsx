import { useState } from 'react';
import type { Draft } from '../drafts/draft.ts';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';
import { DrawPanel } from './draw-panel.tsx';
import { EditPanel } from './edit-panel.tsx';
import { JoinPanel } from './join-panel.tsx';
import { NamePanel } from './name-panel.tsx';
import { SplitPanel } from './split-panel.tsx';

type DrawingPanelProps = { readonly drawing: PlanDrawing; readonly draft: Draft };

/** The figures and the next steps of what is drawn with one tool. */
export function DrawingPanel({ drawing, draft }: DrawingPanelProps) {
  // stays while a courtyard is added
  const [written, setWritten] = useState<string | null>(null);
  switch (draft.tool) {
    case 'draw':
      return draft.open === null ? (
        <NamePanel {...{ drawing, draft, written }} onWrite={setWritten} />
      ) : (
        <DrawPanel drawing={drawing} draft={draft} />
      );
    case 'edit':
      return draft.open === null ? (
        <EditPanel drawing={drawing} draft={draft} />
      ) : (
        <DrawPanel drawing={drawing} draft={draft} />
      );
    case 'split':
      return <SplitPanel drawing={drawing} draft={draft} />;
    case 'join':
      return <JoinPanel drawing={drawing} draft={draft} />;
  }
}
