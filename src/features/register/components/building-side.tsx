import { useQuery } from '@tanstack/react-query';
import type { RefObject } from 'react';
import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import { Button } from '../../../components/ui/button.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { isRefusal } from '../../../lib/api-error.ts';
import { buildingQuery } from '../../buildings/api/get-building.ts';
import { BuildingFacts } from '../../buildings/components/building-facts.tsx';
import { BuildingForm } from '../../buildings/components/building-form.tsx';
import { BuildingHistory } from '../../buildings/components/building-history.tsx';
import type { Done } from './done-line.tsx';

/** What of an opened building is shown. */
export type SideView = 'facts' | 'edit' | 'history';

type BuildingSideProps = {
  readonly schemeId: string;
  readonly buildingId: number;
  readonly mayEdit: boolean;
  readonly view: SideView;
  readonly onView: (view: SideView) => void;
  readonly onShowOnPlan: () => void;
  readonly onDone: (done: Done) => void;
  readonly onClose: () => void;
  /** Gets the focus when a building is opened. */
  readonly frame: RefObject<HTMLElement | null>;
};

function Heading({ building }: { readonly building: BuildingAnswer }) {
  const { reference, name, address } = building;
  return (
    <>
      <p className="text-small text-ink-3">{reference}</p>
      <h2 className="mt-0.5 mb-1 text-h2 break-words">{name ?? address ?? reference}</h2>
      {name !== null && <p className="text-small text-ink-2">{address ?? 'Address not known.'}</p>}
    </>
  );
}

type OpenedProps = BuildingSideProps & { readonly building: BuildingAnswer };

function Opened(props: OpenedProps) {
  const { building, schemeId, mayEdit, view, onView, onShowOnPlan, onDone } = props;
  const show = (next: SideView) => () => {
    onView(next);
  };
  return (
    <>
      <Heading building={building} />
      {view !== 'edit' && (
        <div className="mt-2.5 flex flex-wrap gap-2">
          {mayEdit && <Button onClick={show('edit')}>Edit</Button>}
          {view === 'history' ? (
            <Button onClick={show('facts')}>Facts</Button>
          ) : (
            <Button onClick={show('history')}>History</Button>
          )}
          <Button onClick={onShowOnPlan}>Show on plan</Button>
        </div>
      )}
      {view === 'facts' && <BuildingFacts building={building} />}
      {view === 'history' && <BuildingHistory schemeId={schemeId} buildingId={building.id} />}
      {view === 'edit' && (
        <BuildingForm
          key={building.id}
          {...{ schemeId, building }}
          onCancel={show('facts')}
          onSaved={(change) => {
            onView('facts');
            if (change !== null) {
              onDone({ words: `${building.reference} changed.`, changeIds: [change.changeId] });
            }
          }}
        />
      )}
    </>
  );
}

/** The opened building beside the table: what is known, changed by hand, and its history. */
export function BuildingSide(props: BuildingSideProps) {
  const { schemeId, buildingId, onClose, frame } = props;
  const { data, error, refetch } = useQuery(buildingQuery(schemeId, buildingId));
  return (
    <section
      ref={frame}
      tabIndex={-1}
      aria-label="Opened building"
      className="relative px-4 pt-3 pb-6 outline-none"
    >
      <Button
        kind="quiet"
        className="float-right -mt-1 -mr-1.5 max-sm:-mt-2"
        aria-label="Close the building"
        onClick={onClose}
      >
        Close{' '}
        <span className="max-sm:hidden">
          <KeyCap>Esc</KeyCap>
        </span>
      </Button>
      {data !== undefined && <Opened {...props} building={data} />}
      {data === undefined && error === null && <LoadingRows what="the building" rows={8} />}
      {data === undefined && isRefusal(error, 'not-found') && (
        <p className="text-body text-ink-2">There is no such building in this scheme.</p>
      )}
      {data === undefined && error !== null && !isRefusal(error, 'not-found') && (
        <QueryError what="The building" error={error} onRetry={() => void refetch()} />
      )}
    </section>
  );
}
