import { useQuery } from '@tanstack/react-query';
import { useRef } from 'react';
import { PlanBasis } from '../../plan/components/plan-basis.tsx';
import { runQuery } from '../../runs/api/get-run.ts';
import { RunProgressLine } from '../../runs/components/run-progress-line.tsx';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { usePerson } from '../../session/person-context.ts';
import { useColumns } from '../hooks/use-columns.ts';
import { useRegisterDesk } from '../hooks/use-register-desk.ts';
import { useRegisterKeys } from '../hooks/use-register-keys.ts';
import { useRegisterPlan } from '../hooks/use-register-plan.ts';
import { EmptyRegister } from './empty-register.tsx';
import { RegisterAside } from './register-aside.tsx';
import { RegisterFoot } from './register-foot.tsx';
import { RegisterHead } from './register-head.tsx';
import { RegisterTable } from './register-table.tsx';

/** The run whose results stand in the register. */
function useResults(schemeId: string, runId: string | null) {
  return useQuery({ ...runQuery(schemeId, runId ?? ''), enabled: runId !== null }).data;
}

/** The register's table with the map at its side. */
export function RegisterWork() {
  const scheme = useScheme();
  const person = usePerson();
  const mayEdit = can(scheme, 'updateRegister');
  const desk = useRegisterDesk(scheme.id, person.id);
  const { address, active, marks, mapPane, handle, rows } = desk;
  const shownRun = rows.page?.run ?? null;
  const [columns, chooseColumns] = useColumns(person.id, shownRun !== null);
  const results = useResults(scheme.id, shownRun);
  const plan = useRegisterPlan(scheme.id, address.which.filter, mapPane.isShown);
  const searchField = useRef<HTMLInputElement>(null);

  function markActive() {
    if (active.id !== null) marks.toggle(active.id);
  }
  useRegisterKeys({
    mark: mayEdit ? markActive : undefined,
    open: () => {
      desk.open(active.id);
    },
    showOnPlan: () => {
      desk.showOnPlan(active.id);
    },
    search: () => searchField.current?.focus(),
    leave: () => {
      if (address.opened !== null) desk.close();
      else active.reachBuilding(null);
    },
  });
  if (rows.page?.all === 0) return <EmptyRegister schemeId={scheme.id} mayEdit={mayEdit} />;
  return (
    <>
      <PlanBasis scheme={scheme} crs={plan.ready?.crs} results={results} />
      <RunProgressLine />
      <RegisterHead
        {...{ mayEdit, address, columns, mapPane, searchField, results }}
        schemeId={scheme.id}
        page={rows.page}
        onColumns={chooseColumns}
        view={mapPane.isShown && handle !== null ? handle.view : null}
      />
      <div className="relative flex min-h-0 flex-1 print:block">
        <RegisterTable {...{ desk, columns, mayEdit }} />
        <RegisterAside {...{ desk, plan, mayEdit }} />
      </div>
      <RegisterFoot
        {...{ marks, mayEdit }}
        schemeId={scheme.id}
        runId={shownRun}
        done={desk.done.inFoot}
        onDone={desk.setDone}
      />
    </>
  );
}
