import type { OptionEditor } from '../alignments/hooks/use-option-editor.ts';
import type { PlanLine } from '../alignments/hooks/use-plan-line.ts';

/** What a section asks of the line that it cuts. */
export type SectionLine = Pick<
  PlanLine,
  'design' | 'preview' | 'thread' | 'isKnown' | 'options' | 'mayEdit' | 'mayBegin' | 'draw'
> & { readonly editor: Pick<OptionEditor, 'isEditing' | 'isDrawing'> };
