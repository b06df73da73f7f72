import { useState } from 'react';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useArchiveScheme } from '../api/archive-scheme.ts';

const TO_ARCHIVE = {
  why: 'When the line is built or given up. Everything stays and can be read; nothing can be changed.',
  button: 'Archive the scheme',
  failed: 'The scheme was not archived.',
} as const;

const TO_BRING_BACK = {
  why: 'Everything here can be read. Bring it back to go on with it.',
  button: 'Bring it back',
  failed: 'The scheme was not brought back.',
} as const;

/** Archives a scheme once that is confirmed, or brings it back. */
export function ArchiveScheme({ scheme }: { readonly scheme: SchemeAnswer }) {
  const [asks, setAsks] = useState(false);
  const archive = useArchiveScheme(scheme.id);
  const isOpen = scheme.archivedAt === null;
  const { why, button, failed } = isOpen ? TO_ARCHIVE : TO_BRING_BACK;

  function close() {
    setAsks(false);
  }
  function change() {
    archive.mutate({ archived: isOpen, version: scheme.version }, { onSettled: close });
  }
  return (
    <div className="mt-3 grid justify-items-start gap-3">
      <p className="max-w-[60ch] text-small text-ink-2">{why}</p>
      <MutationError failed={failed} error={archive.error} />
      <Button
        busy={archive.isPending}
        onClick={() => {
          if (isOpen) setAsks(true);
          else change();
        }}
      >
        {button}
      </Button>
      <ConfirmDialog
        open={asks}
        title={`Archive ${scheme.name}?`}
        doIt="Archive it"
        busy={archive.isPending}
        onConfirm={change}
        onClose={close}
      >
        It leaves the list of schemes for everybody in it. They can still read it, and you can bring
        it back.
      </ConfirmDialog>
    </div>
  );
}
