import type { ReactNode } from 'react';
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
  if (line.editor.isEditing) return <OptionEditorPanel editor={line.editor} fault={line.fault} />;
  return (
    <>
      {children}
      {isOptionShown && <OptionPanel line={line} />}
    </>
  );
}
