import { Button } from '../../../components/ui/button.tsx';
import { ConflictChoice } from '../../../components/ui/conflict-choice.tsx';
import { ErrorNote } from '../../../components/ui/error-note.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import type { OptionEditor } from '../hooks/use-option-editor.ts';
import { optionChanges } from '../option-changes.ts';

/** Why an option was not saved; where somebody else was faster, what they changed and what to keep. */
export function OptionClash({ editor }: { readonly editor: OptionEditor }) {
  const { base, theirs, error, isGone, keepMine, takeTheirs, saveAsNew } = editor;
  if (base !== null && theirs !== null) {
    return (
      <ErrorNote
        failed={`${theirs.changedBy ?? 'Somebody else'} changed ${base.name} meanwhile.`}
        stands="Nothing of yours is saved yet, and nothing is lost."
        action={
          <div className="grid gap-2">
            <ConflictChoice changes={optionChanges(base, theirs)} onKeepMine={keepMine} />
            <div>
              <Button onClick={takeTheirs}>Take theirs</Button>
            </div>
          </div>
        }
      />
    );
  }
  if (isGone) {
    return (
      <ErrorNote
        failed="Somebody else removed this option meanwhile."
        stands="What you drew is still here."
        action={<Button onClick={saveAsNew}>Make it an option of its own</Button>}
      />
    );
  }
  return <MutationError failed="The option was not saved." error={error} shown={['name']} />;
}
