import { KeyList } from '../../../components/ui/key-list.tsx';
import { BUILDING_KEYS, MAP_KEYS } from '../plan-keys.ts';

const KEYS = [...MAP_KEYS, ...BUILDING_KEYS.slice(0, 1)];

/** What to do while no building is selected. */
export function NothingSelected() {
  return (
    <>
      <h2 className="text-h3">Nothing selected</h2>
      <p className="mt-1 text-small text-ink-2">Press a building on the map, or find one above.</p>
      <KeyList help={KEYS} className="mt-4 text-ink-2 max-md:hidden" />
    </>
  );
}
