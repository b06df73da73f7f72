import { useEffect, useRef } from 'react';
import { useScheme } from '../../schemes/scheme-context.ts';
import { MapPane } from '../../plan/components/map-pane.tsx';
import { classNames } from '../../../lib/class-names.ts';
import { useLassoFilter } from '../hooks/use-lasso-filter.ts';
import type { RegisterDesk } from '../hooks/use-register-desk.ts';
import type { useRegisterPlan } from '../hooks/use-register-plan.ts';
import { BuildingSide } from './building-side.tsx';
import { DoneLine } from './done-line.tsx';

type RegisterAsideProps = {
  readonly desk: RegisterDesk;
  readonly plan: ReturnType<typeof useRegisterPlan>;
  readonly mayEdit: boolean;
};

/** What was done last, where the opened building covers the foot of the page. */
function DoneInSide({ desk }: Pick<RegisterAsideProps, 'desk'>) {
  const { id } = useScheme();
  const { inSide } = desk.done;
  if (inSide === null) return null;
  return (
    <div className="flex-none border-t border-ink bg-paper-raised px-4 py-1">
      <DoneLine key={inSide.words} schemeId={id} done={inSide} onDone={desk.setDone} />
    </div>
  );
}

/** Beside the table: the map, and under it the opened building; where there is no room, that lies over the table. */
export function RegisterAside({ desk, plan, mayEdit }: RegisterAsideProps) {
  const scheme = useScheme();
  const { mapPane, active, address } = desk;
  const { opened } = address;
  const lasso = useLassoFilter(address);
  const frame = useRef<HTMLElement>(null);
  const liesOver = !mapPane.hasRoom;
  const isOpen = opened !== null;
  useEffect(() => {
    if (isOpen && liesOver) frame.current?.focus();
  }, [isOpen, liesOver]);
  if (!mapPane.isShown && !isOpen) return null;
  return (
    <aside
      aria-label="Map and building"
      className={classNames(
        'flex min-h-0 flex-col bg-paper print:hidden',
        liesOver
          ? 'absolute inset-y-0 right-0 z-30 w-[440px] max-w-full border-l border-ink shadow-lift max-sm:fixed max-sm:inset-0 max-sm:z-50 max-sm:w-full max-sm:border-0'
          : 'w-[404px] flex-none border-l border-ink',
      )}
    >
      {mapPane.isShown && (
        <div className={isOpen ? 'h-[34%] min-h-[180px] flex-none' : 'min-h-0 flex-1'}>
          <MapPane
            {...{ ...plan, lasso }}
            selected={active.id}
            onSelect={desk.pressOnMap}
            onHandle={desk.setHandle}
          />
        </div>
      )}
      {opened !== null && (
        <div
          className={classNames(
            'min-h-0 flex-1 overflow-auto',
            mapPane.isShown && 'border-t border-ink',
          )}
        >
          <BuildingSide
            schemeId={scheme.id}
            buildingId={opened}
            mayEdit={mayEdit}
            view={desk.sideView}
            onView={desk.setSideView}
            onShowOnPlan={() => {
              desk.showOnPlan(opened);
            }}
            onDone={desk.setDone}
            onClose={desk.close}
            frame={frame}
          />
        </div>
      )}
      <DoneInSide desk={desk} />
    </aside>
  );
}
