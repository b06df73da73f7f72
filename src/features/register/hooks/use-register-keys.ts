import { useHotkeys } from '../../../hooks/use-hotkeys.ts';
import { useKeyHelp } from '../../../hooks/use-key-help.ts';
import { MARK_KEYS, REGISTER_KEYS } from '../register-keys.ts';

type RegisterKeys = {
  /** Undefined for who only reads. */
  readonly mark: (() => void) | undefined;
  readonly open: () => void;
  readonly showOnPlan: () => void;
  readonly search: () => void;
  readonly leave: () => void;
};

/** The keys of the register, beside those of its table. */
export function useRegisterKeys({ mark, open, showOnPlan, search, leave }: RegisterKeys): void {
  useKeyHelp(REGISTER_KEYS);
  useKeyHelp(MARK_KEYS, mark !== undefined);
  useHotkeys({
    ...(mark !== undefined && { x: mark }),
    o: open,
    p: showOnPlan,
    Escape: leave,
  });
  // here it searches the register, not everything
  useHotkeys({ '/': search }, true, true);
}
