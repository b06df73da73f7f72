import type { RefObject } from 'react';
import type { RegisterColumn, RegisterPage } from '../../../../shared/schemas/register.ts';
import type { RunDetail } from '../../../../shared/schemas/runs.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { importsPath, planPath } from '../../../config/paths.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { Funnel } from '../../decisions/components/funnel.tsx';
import { withBeside } from '../filter-parts.ts';
import type { MapPane } from '../hooks/use-map-pane.ts';
import type { RegisterAddress } from '../hooks/use-register-address.ts';
import { ColumnChooser } from './column-chooser.tsx';
import { ExportMenu } from './export-menu.tsx';
import { FilterBar } from './filter-bar.tsx';
import { RegisterSearch } from './register-search.tsx';
import { ResultCounts } from './result-counts.tsx';
import { ViewsMenu } from './views-menu.tsx';

type RegisterHeadProps = {
  readonly schemeId: string;
  readonly mayEdit: boolean;
  /** Undefined until anything is known. */
  readonly page: RegisterPage | undefined;
  /** The run whose results stand in the register. */
  readonly results: RunDetail | undefined;
  readonly address: RegisterAddress;
  readonly columns: readonly RegisterColumn[];
  readonly onColumns: (columns: readonly RegisterColumn[]) => void;
  readonly mapPane: MapPane;
  readonly view: (() => readonly [number, number, number, number]) | null;
  readonly searchField: RefObject<HTMLInputElement | null>;
};

function countWords({ found, all }: RegisterPage): string {
  const buildings = all === 1 ? 'building' : 'buildings';
  return found === all
    ? `${formatCount(all)} ${buildings}`
    : `${formatCount(found)} of ${formatCount(all)} ${buildings}`;
}

function MapButton({ schemeId, mapPane }: Pick<RegisterHeadProps, 'schemeId' | 'mapPane'>) {
  if (!mapPane.hasRoom) {
    // on a phone the tab says the same
    return (
      <ButtonLink to={planPath(schemeId)} className="max-sm:hidden">
        Show on plan
      </ButtonLink>
    );
  }
  return (
    <Button
      aria-pressed={mapPane.isShown}
      onClick={() => {
        mapPane.show(!mapPane.isShown);
      }}
    >
      {mapPane.isShown ? 'Hide the map' : 'Show the map'}
    </Button>
  );
}

/** Over the table: how many, what is searched and filtered, and what can be done with all of it. */
export function RegisterHead(props: RegisterHeadProps) {
  const { schemeId, mayEdit, page, address, columns, onColumns, mapPane, view, results } = props;
  const { which, setFilter, setWhich } = address;
  const { filter, sort } = which;
  return (
    <div className="grid flex-none gap-y-2 border-b border-ink px-4 py-2.5 print:hidden">
      <div className="flex flex-wrap items-center gap-x-3 gap-y-2">
        <h1 className="text-h3">Register</h1>
        <p role="status" className="text-small text-ink-2">
          {page === undefined ? (
            <span className="appear-late">Fetching the register.</span>
          ) : (
            countWords(page)
          )}
        </p>
        <RegisterSearch
          field={props.searchField}
          words={filter.search ?? ''}
          onSearch={(words) => {
            const search = words === '' ? undefined : words;
            // letter by letter is one step to go back
            setFilter(withBeside(filter, { search }), filter.search !== undefined);
          }}
        />
        <div className="ml-auto flex flex-wrap items-center gap-2 max-sm:ml-0 max-sm:gap-1.5 max-sm:[&_a]:px-2.5 max-sm:[&_button]:px-2.5">
          <ViewsMenu
            schemeId={schemeId}
            shown={{ filter, sort, columns: ['reference', ...columns] }}
            onChoose={(chosen) => {
              onColumns(chosen.columns);
              setWhich(chosen);
            }}
          />
          <ColumnChooser columns={columns} onChoose={onColumns} />
          <MapButton schemeId={schemeId} mapPane={mapPane} />
          <ExportMenu {...{ schemeId, which, columns }} found={page?.found ?? 0} />
          {mayEdit && <ButtonLink to={importsPath(schemeId)}>Bring in…</ButtonLink>}
        </div>
      </div>
      {results !== undefined && (
        <>
          <Funnel {...{ schemeId, filter }} runId={results.id} />
          <ResultCounts {...{ schemeId, filter }} run={results} />
        </>
      )}
      <FilterBar
        {...{ schemeId, filter, view }}
        onFilter={(next) => {
          setFilter(next);
        }}
      />
    </div>
  );
}
