import { useSearchParams } from 'react-router-dom';

const NAME = 'building';

function idOf(text: string | null): number | null {
  const id = Number(text ?? '');
  return Number.isSafeInteger(id) && id > 0 ? id : null;
}

/** The building that the address names, and the way to name another. */
export function useSelectedBuilding(): readonly [
  selected: number | null,
  select: (buildingId: number | null) => void,
] {
  const [search, setSearch] = useSearchParams();
  function select(buildingId: number | null): void {
    setSearch(
      (now) => {
        const next = new URLSearchParams(now);
        if (buildingId === null) next.delete(NAME);
        else next.set(NAME, String(buildingId));
        return next;
      },
      // what is about to be gone is let go of at once: later, it would be asked for again
      { replace: true, flushSync: buildingId === null },
    );
  }
  return [idOf(search.get(NAME)), select];
}
