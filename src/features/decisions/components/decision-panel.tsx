import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { BuildingDecisions, Decision } from '../../../../shared/schemas/decision-answers.ts';
import type { RunDetail } from '../../../../shared/schemas/runs.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { buildingDecisionsQuery } from '../api/get-decisions.ts';
import { useWithdrawDecisions } from '../api/withdraw-decisions.ts';
import { CheckActions } from './check-actions.tsx';
import { DecideOneDialog } from './decide-one-dialog.tsx';
import { DecisionBlock } from './decision-block.tsx';

type DecisionPanelProps = {
  readonly run: RunDetail;
  readonly building: { readonly id: number; readonly reference: string };
};

function Withdraw({
  schemeId,
  decision,
}: {
  readonly schemeId: string;
  readonly decision: Decision;
}) {
  const withdraw = useWithdrawDecisions(schemeId);
  return (
    <>
      <MutationError failed="Nothing was changed." error={withdraw.error} />
      <Button
        kind="quiet"
        busy={withdraw.isPending}
        onClick={() => {
          withdraw.mutate({ filter: { ids: [decision.buildingId] }, expected: 1 });
        }}
      >
        Withdraw it
      </Button>
    </>
  );
}

/** What can be done with a decision, and why not. */
function Actions({
  schemeId,
  decision,
}: {
  readonly schemeId: string;
  readonly decision: Decision;
}) {
  const { abilities, mayNotCheck } = decision;
  return (
    <>
      {mayNotCheck !== null && <p className="text-ink-2">{mayNotCheck}</p>}
      {abilities.withdraw && <Withdraw {...{ schemeId, decision }} />}
      {abilities.check && <CheckActions key={decision.id} {...{ schemeId, decision }} />}
    </>
  );
}

const LIVE: readonly Decision['state'][] = ['waiting for check', 'checked'];

function Decisions({
  schemeId,
  decisions,
}: {
  readonly schemeId: string;
  readonly decisions: BuildingDecisions['decisions'];
}) {
  const [newest] = decisions;
  const shown = decisions.filter((one) => one === newest || LIVE.includes(one.state));
  const earlier = decisions.filter((one) => !shown.includes(one));
  return (
    <>
      {shown.map((decision) => (
        <DecisionBlock key={decision.id} decision={decision}>
          {decision.state === 'waiting for check' ? (
            <Actions {...{ schemeId, decision }} />
          ) : undefined}
        </DecisionBlock>
      ))}
      {earlier.length > 0 && (
        <details className="mt-2 text-small">
          <summary className="cursor-pointer">
            {earlier.length === 1 ? 'One earlier' : `${earlier.length} earlier`}
          </summary>
          {earlier.map((decision) => (
            <DecisionBlock key={decision.id} decision={decision} />
          ))}
        </details>
      )}
    </>
  );
}

/** What is decided of a building, by whom, checked by whom; and deciding it. */
export function DecisionPanel({ run, building }: DecisionPanelProps) {
  const scheme = useScheme();
  const [isDeciding, setDeciding] = useState(false);
  const mayRead = can(scheme, 'readDecisions');
  const { data, error } = useQuery({
    ...buildingDecisionsQuery(scheme.id, run.id, building.id),
    enabled: mayRead,
  });
  if (!mayRead) return null;
  const isWaiting = data?.decisions.some(({ state }) => state === 'waiting for check');
  const mayDecide = can(scheme, 'prepareDecisions') && run.isShown && isWaiting === false;
  return (
    <Panel
      title="Decision"
      {...(data?.assignedTo && { note: `in the hands of ${data.assignedTo.name}` })}
      action={
        mayDecide ? (
          <Button
            className="print:hidden"
            onClick={() => {
              setDeciding(true);
            }}
          >
            Decide…
          </Button>
        ) : undefined
      }
    >
      <MutationError failed="Decisions could not be fetched." error={error} />
      {data?.decisions.length === 0 && (
        <p className="mt-2 text-small text-ink-2">Nothing is decided yet.</p>
      )}
      {data !== undefined && <Decisions schemeId={scheme.id} decisions={data.decisions} />}
      {!run.isShown && (
        <p className="mt-2 text-small text-ink-2">
          A newer run is shown; decisions are made on it.
        </p>
      )}
      {isDeciding && data !== undefined && (
        <DecideOneDialog
          {...{ schemeId: scheme.id, runId: run.id, building }}
          answer={data}
          onClose={() => {
            setDeciding(false);
          }}
        />
      )}
    </Panel>
  );
}
