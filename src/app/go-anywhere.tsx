import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { BuildingRow } from '../../shared/schemas/buildings.ts';
import type { SchemeAnswer } from '../../shared/schemas/schemes.ts';
import { GoTo, type Destination } from '../components/layout/go-to.tsx';
import { buildingPath } from '../config/paths.ts';
import { buildingSearchQuery } from '../features/buildings/api/search-buildings.ts';
import { can } from '../features/schemes/can.ts';
import { usePerson } from '../features/session/person-context.ts';
import { useDelayedValue } from '../hooks/use-delayed-value.ts';
import { useHotkeys } from '../hooks/use-hotkeys.ts';
import { useKeysAtHand } from '../hooks/use-keys-at-hand.ts';
import { destinationsOf, meantBy } from './destinations.ts';

const WHILE_TYPING = 200;

type GoAnywhereProps = {
  readonly scheme: SchemeAnswer | undefined;
  readonly schemes: readonly SchemeAnswer[];
};

function asDestination(
  schemeId: string,
  { id, reference, name, address }: BuildingRow,
): Destination {
  const words = [name, address].filter((part) => part !== null).join(', ');
  return { to: buildingPath(schemeId, id), title: reference, note: words };
}

/** Buildings of the scheme at hand that a query finds, for who may read its register. */
function useBuildingsFound(scheme: SchemeAnswer | undefined, query: string): Destination[] {
  const settled = useDelayedValue(query.trim(), WHILE_TYPING);
  const mayRead = scheme !== undefined && can(scheme, 'readRegister');
  const id = scheme?.id ?? '';
  const search = buildingSearchQuery(id, settled);
  const { data = [] } = useQuery({ ...search, enabled: mayRead && settled !== '' });
  return query.trim() === '' ? [] : data.map((row) => asDestination(id, row));
}

/** Go to…, with the screens and schemes of the person and the buildings of the scheme; `/` opens it. */
export function GoAnywhere({ scheme, schemes }: GoAnywhereProps) {
  const person = usePerson();
  const navigate = useNavigate();
  const [isOpen, setOpen] = useState(false);
  const [query, setQuery] = useState('');
  const buildings = useBuildingsFound(scheme, query);
  const screens = meantBy(query, destinationsOf(person, schemes, scheme?.id));

  function open() {
    setOpen(true);
  }
  function close() {
    setOpen(false);
    setQuery('');
  }
  useHotkeys({ '/': open });
  // some screens take it for a search of their own
  const isTaken = useKeysAtHand().some(({ keys }) => keys.includes('/'));
  return (
    <GoTo
      hasKey={!isTaken}
      isOpen={isOpen}
      onOpen={open}
      onClose={close}
      query={query}
      onQuery={setQuery}
      found={[...screens, ...buildings]}
      onGo={(to) => {
        close();
        void navigate(to);
      }}
    />
  );
}
