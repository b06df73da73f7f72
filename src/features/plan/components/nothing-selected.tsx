import { KeyCap } from '../../../components/ui/key-cap.tsx';

const KEYS = [
  { keys: ['+', '−'], does: 'zoom' },
  { keys: ['F'], does: 'fit the scheme' },
  { keys: ['J', 'K'], does: 'next, previous building' },
  { keys: ['←', '↑', '↓', '→'], does: 'move the map, when it has the focus' },
] as const;

/** What to do while no building is selected. */
export function NothingSelected() {
  return (
    <>
      <h2 className="text-h3">Nothing selected</h2>
      <p className="mt-1 text-small text-ink-2">Press a building on the map, or find one above.</p>
      <dl className="mt-4 grid grid-cols-[auto_1fr] items-center gap-x-3 gap-y-1.5 text-small text-ink-2 max-md:hidden">
        {KEYS.map(({ keys, does }) => (
          <div key={does} className="col-span-2 grid grid-cols-subgrid items-center">
            <dt className="flex gap-1">
              {keys.map((key) => (
                <KeyCap key={key}>{key}</KeyCap>
              ))}
            </dt>
            <dd>{does}</dd>
          </div>
        ))}
      </dl>
    </>
  );
}
