import type { ReactNode } from 'react';
import { RunButton } from '../../runs/components/run-button.tsx';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import type { PlanLine } from '../hooks/use-plan-line.ts';
import { OptionEditorPanel } from './option-editor-panel.tsx';
import { OptionPanel } from './option-panel.tsx';

type LineSideProps = {
  readonly line: PlanLine;
  readonly isOptionShown: boolean;
  /** Stands there while no line is drawn. */
  readonly children: ReactNode;
};

/** At the side of the map: the line that is drawn; else the rest, and the option that is shown. */
export function LineSide({ line, isOptionShown, children }: LineSideProps) {
  const scheme = useScheme();
  const { editor, fault } = line;
  if (editor.isEditing) {
    const run = can(scheme, 'startRuns') && <RunButton option={editor.base} isEditing />;
    return <OptionEditorPanel editor={editor} fault={fault} action={run} />;
  }
  return (
    <>
      {children}
      {isOptionShown && <OptionPanel line={line} />}
    </>
  );
}
