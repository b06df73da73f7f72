import { useState } from 'react';
import type { AlignmentAnswer } from '../../../../shared/schemas/alignments.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useCopyAlignment } from '../api/copy-alignment.ts';
import { useRemoveAlignment } from '../api/remove-alignment.ts';
import { useRenameAlignment } from '../api/rename-alignment.ts';
import { NameDialog } from './name-dialog.tsx';

type OptionActionsProps = {
  readonly option: AlignmentAnswer;
  readonly onEdit: () => void;
  readonly onChoose: (alignmentId: string) => void;
};

type Asking = 'copy' | 'rename' | 'remove' | null;

type DialogProps = Omit<OptionActionsProps, 'onEdit'> & { readonly onClose: () => void };

function CopyDialog({ option, onChoose, onClose }: DialogProps) {
  const copy = useCopyAlignment(useScheme().id, option.id);
  return (
    <NameDialog
      title={`Copy ${option.name}`}
      doIt="Copy it"
      failed="The option was not copied."
      startsAs={`${option.name}, copy`}
      busy={copy.isPending}
      error={copy.error}
      onClose={onClose}
      onName={(name) => {
        copy.mutate(name, {
          onSuccess: ({ id }) => {
            onClose();
            onChoose(id);
          },
        });
      }}
    />
  );
}

function RenameDialog({ option, onClose }: DialogProps) {
  const rename = useRenameAlignment(useScheme().id, option);
  return (
    <NameDialog
      title={`Rename ${option.name}`}
      doIt="Rename it"
      failed="The option was not renamed."
      startsAs={option.name}
      busy={rename.isPending}
      error={rename.error}
      onClose={onClose}
      onName={(name) => {
        rename.mutate(name, { onSuccess: onClose });
      }}
    />
  );
}

function RemoveOption({ option, onClose }: DialogProps) {
  const remove = useRemoveAlignment(useScheme().id, option.id);
  return (
    <ConfirmDialog
      open
      title={`Delete ${option.name}?`}
      doIt="Delete it"
      busy={remove.isPending}
      onClose={onClose}
      onConfirm={() => {
        remove.mutate(undefined, { onSuccess: onClose });
      }}
    >
      <MutationError failed="The option was not deleted." error={remove.error} />
      <p>Everybody in the scheme loses it. The audit trail keeps its line and values.</p>
    </ConfirmDialog>
  );
}

/** What may be done with an option. */
export function OptionActions({ option, onEdit, onChoose }: OptionActionsProps) {
  const [asking, ask] = useState<Asking>(null);
  const dialog = {
    ...{ option, onChoose },
    onClose: () => {
      ask(null);
    },
  };
  return (
    <div className="mt-3 flex flex-wrap gap-2">
      <Button onClick={onEdit}>
        Edit the line{' '}
        <span className="max-sm:hidden">
          <KeyCap>A</KeyCap>
        </span>
      </Button>
      {(['copy', 'rename', 'remove'] as const).map((what) => (
        <Button
          key={what}
          onClick={() => {
            ask(what);
          }}
        >
          {{ copy: 'Copy', rename: 'Rename', remove: 'Delete' }[what]}
        </Button>
      ))}
      {asking === 'copy' && <CopyDialog {...dialog} />}
      {asking === 'rename' && <RenameDialog {...dialog} />}
      {asking === 'remove' && <RemoveOption {...dialog} />}
    </div>
  );
}
