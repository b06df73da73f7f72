import { useNavigate } from 'react-router-dom';
import { useHotkeys } from '../../../hooks/use-hotkeys.ts';
import { useKeyHelp } from '../../../hooks/use-key-help.ts';
import { SHEET_KEYS } from '../sheet-keys.ts';

type Beside = {
  /** The addresses of the sheets beside this one; null at either end. */
  readonly previous: string | null;
  readonly next: string | null;
};

/** The keys that go to the sheets before and after this one. */
export function useSheetKeys({ previous, next }: Beside): void {
  const navigate = useNavigate();
  function go(path: string | null): void {
    if (path !== null) void navigate(path);
  }
  useKeyHelp(SHEET_KEYS);
  useHotkeys({
    '[': () => {
      go(previous);
    },
    ']': () => {
      go(next);
    },
  });
}
