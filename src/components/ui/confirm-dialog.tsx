import type { ReactNode } from 'react';
import { Button } from './button.tsx';
import { Dialog } from './dialog.tsx';

type ConfirmDialogProps = {
  readonly open: boolean;
  readonly title: string;
  /** The verb of what will be done, never "OK". */
  readonly doIt: string;
  readonly busy?: boolean;
  readonly onConfirm: () => void;
  readonly onClose: () => void;
  /** What will happen and what stays. */
  readonly children: ReactNode;
};

/** Asks once before something that others will notice. */
export function ConfirmDialog(props: ConfirmDialogProps) {
  const { open, title, doIt, busy = false, onConfirm, onClose, children } = props;
  return (
    <Dialog open={open} title={title} onClose={onClose}>
      <div className="text-body">{children}</div>
      <div className="mt-4 flex gap-2">
        <Button kind="main" busy={busy} onClick={onConfirm}>
          {doIt}
        </Button>
        <Button data-first-in-focus onClick={onClose}>
          Leave it as it is
        </Button>
      </div>
    </Dialog>
  );
}
