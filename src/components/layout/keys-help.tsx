import { setSingleKeys } from '../../config/single-keys.ts';
import { useSingleKeys } from '../../hooks/use-single-keys.ts';
import { Checkbox } from '../ui/checkbox.tsx';
import { Dialog } from '../ui/dialog.tsx';
import { KeyCap } from '../ui/key-cap.tsx';

export type KeyHelp = { readonly keys: readonly string[]; readonly does: string };

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
      <dl className="mb-4 grid grid-cols-[auto_1fr] items-center gap-x-5 text-small">
        {help.map(({ keys, does }) => (
          <div
            key={does}
            className="col-span-2 grid grid-cols-subgrid border-b border-hairline py-1.5"
          >
            <dt className="flex gap-1">
              {keys.map((key) => (
                <KeyCap key={key}>{key}</KeyCap>
              ))}
            </dt>
            <dd>{does}</dd>
          </div>
        ))}
      </dl>
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
