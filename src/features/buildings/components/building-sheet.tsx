import type { ReactNode } from 'react';
import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import type { RegisterChange } from '../../../../shared/schemas/register-changes.ts';
import { Button } from '../../../components/ui/button.tsx';
import { BuildingFacts } from './building-facts.tsx';
import { BuildingForm } from './building-form.tsx';
import { BuildingHistory } from './building-history.tsx';
import { BuildingWalls } from './building-walls.tsx';

/** What of a building is shown. */
export type SheetView = 'facts' | 'edit' | 'history';

type BuildingSheetProps = {
  readonly schemeId: string;
  readonly building: BuildingAnswer;
  readonly mayEdit: boolean;
  readonly view: SheetView;
  readonly onView: (view: SheetView) => void;
  /** Told of a change by hand. */
  readonly onChanged: (change: RegisterChange) => void;
  /** What else can be done with it here. */
  readonly action?: ReactNode;
  /** What was found of it, before its facts. */
  readonly found?: ReactNode;
};

function Heading({ building }: { readonly building: BuildingAnswer }) {
  const { reference, name, address } = building;
  const isNowhere = name === null && address === null;
  return (
    <>
      <p className="text-small text-ink-3">{reference}</p>
      <h2 className="mt-0.5 mb-1 text-h2 break-words">{name ?? address ?? reference}</h2>
      {name !== null && <p className="text-small text-ink-2">{address ?? 'Address not known.'}</p>}
      {isNowhere && <p className="text-small text-ink-2">Name and address not known.</p>}
    </>
  );
}

/** A building of the register: what is known of it, changed by hand, and its history. */
export function BuildingSheet(props: BuildingSheetProps) {
  const { schemeId, building, mayEdit, view, onView, onChanged, action, found } = props;
  const show = (next: SheetView) => () => {
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
          {action}
        </div>
      )}
      {view === 'facts' && (
        <>
          {found}
          <BuildingFacts building={building} />
          <BuildingWalls walls={building.walls} />
        </>
      )}
      {view === 'history' && <BuildingHistory schemeId={schemeId} buildingId={building.id} />}
      {view === 'edit' && (
        <BuildingForm
          key={building.id}
          {...{ schemeId, building }}
          onCancel={show('facts')}
          onSaved={(change) => {
            onView('facts');
            if (change !== null) onChanged(change);
          }}
        />
      )}
    </>
  );
}
