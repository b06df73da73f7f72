import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { UnsavedEdits } from '../../../components/ui/unsaved-edits.tsx';
import type { OptionEditor } from '../hooks/use-option-editor.ts';

/** Asks before what is drawn or written of an option is lost. */
export function GiveUpLine({ editor }: { readonly editor: OptionEditor }) {
  const { isAsking, keepOn, end, hasEdits } = editor;
  return (
    <>
      {hasEdits && <UnsavedEdits hasEdits what="What you drew" />}
      <ConfirmDialog
        open={isAsking}
        title="Give up what you drew?"
        doIt="Give it up"
        onConfirm={end}
        onClose={keepOn}
      >
        <p>The line and values that you changed are not saved and would be lost.</p>
      </ConfirmDialog>
    </>
  );
}
