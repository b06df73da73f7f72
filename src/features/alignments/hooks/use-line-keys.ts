import { useHotkeys } from '../../../hooks/use-hotkeys.ts';
import { useKeyHelp } from '../../../hooks/use-key-help.ts';
import { removeCorner, takeLastBack } from '../../drawing/drafts/edit-corners.ts';
import { useDraftKeys } from '../../drawing/hooks/use-draft-keys.ts';
import { LINE_DRAFT_KEYS, LINE_KEYS } from '../alignment-keys.ts';
import { finishLine } from '../drafts/line-draft.ts';
import type { OptionEditor } from './use-option-editor.ts';

/** The keys of the line tool and of the line that is drawn. */
export function useLineKeys(
  { drafting, isEditing, giveUp }: OptionEditor,
  begin: (() => void) | null,
): void {
  const { line, chosen, edit, undo, redo } = drafting;
  useKeyHelp(LINE_KEYS, begin !== null);
  useKeyHelp(LINE_DRAFT_KEYS, isEditing);
  useHotkeys({ a: () => begin?.() }, begin !== null);
  useDraftKeys(
    {
      undo,
      redo,
      giveUp: () => {
        giveUp();
        return true;
      },
      takeBack: () => {
        if (line?.isSet !== false) return false;
        edit(takeLastBack);
        return true;
      },
      remove: () => {
        if (chosen === null) return false;
        edit((now) => removeCorner(now, chosen));
        return true;
      },
      close: () => {
        if (line?.isSet !== false) return false;
        edit(finishLine);
        return true;
      },
    },
    isEditing,
  );
}
