import { useQuery } from '@tanstack/react-query';
import type { RegisterFilter } from '../../../../shared/schemas/register.ts';
import { Button } from '../../../components/ui/button.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { Segments } from '../../../components/ui/segments.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { formatShortDay } from '../../../lib/format-date.ts';
import { importsQuery } from '../../imports/api/list-imports.ts';
import { withBeside } from '../filter-parts.ts';

export type BesideProps = {
  readonly schemeId: string;
  readonly filter: RegisterFilter;
  readonly onFilter: (filter: RegisterFilter) => void;
};

const ASSUMED = [
  { value: 'any', label: 'Any' },
  { value: 'some', label: 'Some' },
  { value: 'none', label: 'None' },
] as const;

/** Whether the method has to assume something of a building. */
export function AssumedChoice({ filter, onFilter }: BesideProps) {
  const { assumed } = filter;
  return (
    <>
      <Segments
        label="Assumed values"
        segments={ASSUMED}
        value={assumed === undefined ? 'any' : assumed ? 'some' : 'none'}
        onChange={(value) => {
          onFilter(withBeside(filter, { assumed: value === 'any' ? undefined : value === 'some' }));
        }}
      />
      <p className="mt-2 text-cap text-ink-3">
        Where storeys, eaves, founding depth or stiffness are not known, the method assumes them.
      </p>
    </>
  );
}

/** The import that brought a building in or last changed it. */
export function ImportChoice({ schemeId, filter, onFilter }: BesideProps) {
  const { data, error, refetch } = useQuery(importsQuery(schemeId));
  if (error !== null) {
    return <QueryError what="The imports" error={error} onRetry={() => void refetch()} />;
  }
  if (data === undefined) return <LoadingRows what="the imports" rows={2} />;
  const done = data.filter(({ state }) => state === 'done');
  if (done.length === 0)
    return <p className="text-small text-ink-2">Nothing was brought in yet.</p>;
  return (
    <Select
      label="Brought in or changed by"
      unchosen="Any import"
      value={filter.importId ?? ''}
      options={done.map(({ id, fileName, at }) => ({
        value: id,
        label: `${fileName}, ${formatShortDay(at)}`,
      }))}
      onChange={({ target }) => {
        onFilter(withBeside(filter, { importId: target.value === '' ? undefined : target.value }));
      }}
    />
  );
}

type WithinProps = BesideProps & {
  /** The piece of ground that the map shows; null while there is no map. */
  readonly view: (() => readonly [number, number, number, number]) | null;
};

/** What the map showed when it was asked. */
export function WithinChoice({ filter, onFilter, view }: WithinProps) {
  if (view === null) {
    return (
      <p className="text-small text-ink-2">Show the map at the side to take what is in its view.</p>
    );
  }
  return (
    <>
      <Button
        onClick={() => {
          const [west, south, east, north] = view();
          onFilter(withBeside(filter, { within: [west, south, east, north] }));
        }}
      >
        {filter.within === undefined ? 'Take what is in view' : 'Take what is in view now'}
      </Button>
      <p className="mt-2 text-cap text-ink-3">Stays as it is while the map is moved on.</p>
    </>
  );
}
