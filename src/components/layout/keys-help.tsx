import type { KeyHelp } from '../../config/keys-at-hand.ts';
import { setSingleKeys } from '../../config/single-keys.ts';
import { useSingleKeys } from '../../hooks/use-single-keys.ts';
import { Checkbox } from '../ui/checkbox.tsx';
import { Dialog } from '../ui/dialog.tsx';
import { KeyList } from '../ui/key-list.tsx';

type KeysHelpProps = {
  readonly open: boolean;
  readonly onClose: () => void;
  readonly help: readonly KeyHelp[];
};

/** Which keys do what here, and whether keys alone do anything. */
export function KeysHelp({ open, onClose, help }: KeysHelpProps) {
  const on = useSingleKeys();
  return (
    <Dialog open={open} title="Keys here" onClose={onClose}>
      <KeyList ruled help={help} className="mb-4" />
      <Checkbox
        label="Keys pressed alone do something"
        hint="Turn this off if you speak to the computer or press keys by accident. Enter, Esc and the arrows go on working."
        checked={on}
        onChange={({ target }) => {
          setSingleKeys(target.checked);
        }}
      />
    </Dialog>
  );
}
