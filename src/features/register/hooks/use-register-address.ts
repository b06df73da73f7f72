import { useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { RegisterFilter, RegisterSort } from '../../../../shared/schemas/register.ts';
import type { Which } from '../api/which-buildings.ts';
import { readOpened, readWhich, withFilter, withOpened, withSort } from '../register-address.ts';

export type RegisterAddress = {
  readonly which: Which;
  readonly opened: number | null;
  /** `replace` makes no further step to go back to. */
  readonly setFilter: (filter: RegisterFilter, replace?: boolean) => void;
  readonly setSort: (sort: RegisterSort) => void;
  readonly setWhich: (which: Which) => void;
  readonly open: (buildingId: number | null) => void;
};

/** What of the register is shown stands in the address, to go back to and to send to somebody. */
export function useRegisterAddress(): RegisterAddress {
  const [search, setSearch] = useSearchParams();
  const words = search.toString();
  const which = useMemo(() => readWhich(new URLSearchParams(words)), [words]);
  return {
    which,
    opened: readOpened(search),
    setFilter: (filter, replace = false) => {
      setSearch((now) => withFilter(now, filter), { replace });
    },
    setSort: (sort) => {
      setSearch((now) => withSort(now, sort));
    },
    setWhich: ({ filter, sort }) => {
      setSearch((now) => withSort(withFilter(now, filter), sort));
    },
    open: (buildingId) => {
      setSearch((now) => withOpened(now, buildingId), { replace: true });
    },
  };
}
