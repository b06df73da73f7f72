import { useMemo } from 'react';
import type { RegisterColumn } from '../../../../shared/schemas/register.ts';
import { Button } from '../../../components/ui/button.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { RowTable } from '../../../components/ui/table/row-table.tsx';
import { NARROW, useMedia } from '../../../hooks/use-media.ts';
import { classNames } from '../../../lib/class-names.ts';
import type { RegisterDesk } from '../hooks/use-register-desk.ts';
import { referenceWidth } from '../register-columns.ts';
import { registerOrdering } from '../register-ordering.ts';
import { registerColumns } from './register-columns.tsx';

type RegisterTableProps = {
  readonly desk: RegisterDesk;
  readonly columns: readonly RegisterColumn[];
  readonly mayEdit: boolean;
};

/** So many hairlines stand where rows will be. */
const WAITING_ROWS = 20;

/** A building was pressed on the map that the filter leaves out. */
function LeftOut({ desk }: Pick<RegisterTableProps, 'desk'>) {
  return (
    <div
      role="status"
      className="flex flex-none flex-wrap items-center gap-x-3 border-b border-hairline bg-clay-wash px-4 py-1 text-small"
    >
      The building pressed on the map is left out by the filter.
      <Button
        kind="quiet"
        className="h-6"
        onClick={() => {
          desk.address.setFilter({});
        }}
      >
        Clear the filter
      </Button>
      <Button
        kind="quiet"
        className="h-6"
        onClick={() => {
          desk.open(desk.active.id);
        }}
      >
        Open it
      </Button>
    </div>
  );
}

/** The rows of the register, or why there are none. */
export function RegisterTable({ desk, columns, mayEdit }: RegisterTableProps) {
  const { rows, address, active, marks } = desk;
  const { page, error } = rows;
  const { filter, sort } = address.which;
  const found = page?.found ?? WAITING_ROWS;
  const isNarrow = useMedia(NARROW);
  const references = page?.rows.map(({ reference }) => reference) ?? [];
  const widest = referenceWidth(references, isNarrow ? 'phone' : 'desk');
  const shown = useMemo(
    () => registerColumns(columns, mayEdit ? marks : null, found, sort, widest),
    [columns, mayEdit, marks, found, sort, widest],
  );
  return (
    <div className="flex min-h-0 min-w-0 flex-1 flex-col print:block">
      {active.isLeftOut && <LeftOut desk={desk} />}
      {error !== null && (
        <QueryError what="Some of the register" error={error} onRetry={rows.retry} />
      )}
      {page?.found === 0 ? (
        <div className="px-4">
          <EmptyState
            action={
              <Button
                onClick={() => {
                  address.setFilter({});
                }}
              >
                Clear the filter
              </Button>
            }
          >
            No building is as the filter asks.
          </EmptyState>
        </div>
      ) : (
        <RowTable
          label="Buildings"
          columns={shown}
          count={found}
          rowAt={rows.rowAt}
          idOf={({ id }) => String(id)}
          ordering={registerOrdering(sort, address.setSort)}
          active={active.index}
          onActivate={desk.reachRow}
          onOpen={({ id }) => {
            desk.open(id);
          }}
          onView={rows.onView}
          startsAnewWith={JSON.stringify([filter, sort])}
          className={classNames(
            'min-h-0 flex-1 [--edge:16px] max-sm:[--edge:12px]',
            rows.isStale && 'opacity-60',
          )}
        />
      )}
    </div>
  );
}
