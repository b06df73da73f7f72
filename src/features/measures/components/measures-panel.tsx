import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { Measure } from '../../../../shared/schemas/measures.ts';
import type { RunBuilding, RunDetail } from '../../../../shared/schemas/runs.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { StateMark } from '../../../components/ui/state-mark.tsx';
import { formatDay } from '../../../lib/format-date.ts';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { measuresQuery } from '../api/list-measures.ts';
import { limitWords, MEASURE_SHAPES } from '../measure-words.ts';
import { capital } from '../../../../shared/presentation/capital.ts';
import { LimitEffect } from './limit-effect.tsx';
import { MeasureDialog } from './measure-dialog.tsx';

type MeasuresPanelProps = { readonly run: RunDetail; readonly building: RunBuilding };

type OneMeasureProps = MeasuresPanelProps & {
  readonly measure: Measure;
  readonly onChange?: (() => void) | undefined;
};

function OneMeasure({ measure, run, building, onChange }: OneMeasureProps) {
  const { kind, title, detail, state, responsible, due, limit, buildings } = measure;
  const others = buildings.length - 1;
  const about = [
    capital(kind),
    ...(responsible === '' ? [] : [responsible]),
    ...(due === null ? [] : [`due ${formatDay(due)}`]),
    ...(others > 0 ? [`for ${others} more ${others === 1 ? 'building' : 'buildings'}`] : []),
  ];
  return (
    <li className="border-b border-hairline py-2 text-small last:border-0 print:break-inside-avoid">
      <div className="flex items-baseline justify-between gap-2">
        <span className="min-w-0 font-semibold break-words">{title}</span>
        <StateMark state={MEASURE_SHAPES[state]}>{capital(state)}</StateMark>
      </div>
      <p className="text-ink-2">{about.join(' · ')}</p>
      {detail !== '' && <p className="mt-1 break-words whitespace-pre-line">{detail}</p>}
      {limit !== null && (
        <>
          <p className="mt-1">Volume loss {limitWords(limit)}.</p>
          <LimitEffect {...{ run, building, limit }} />
        </>
      )}
      {onChange !== undefined && (
        <Button kind="quiet" className="mt-1 print:hidden" onClick={onChange}>
          Change…
        </Button>
      )}
    </li>
  );
}

/** What protects a building, how far it is, and what it does to the figures. */
export function MeasuresPanel({ run, building }: MeasuresPanelProps) {
  const scheme = useScheme();
  const id = Number(building.facts.id);
  const [asks, setAsks] = useState<Measure | 'new' | null>(null);
  const mayRead = can(scheme, 'readDecisions');
  const mayChange = can(scheme, 'updateMeasures');
  const { data, error } = useQuery({ ...measuresQuery(scheme.id, id), enabled: mayRead });
  if (!mayRead) return null;
  return (
    <Panel
      title="Protective measures"
      action={
        mayChange ? (
          <Button
            className="print:hidden"
            onClick={() => {
              setAsks('new');
            }}
          >
            Add…
          </Button>
        ) : undefined
      }
    >
      <MutationError failed="Measures could not be fetched." error={error} />
      {data?.length === 0 && <p className="mt-2 text-small text-ink-2">None yet.</p>}
      <ul>
        {data?.map((measure) => (
          <OneMeasure
            key={measure.id}
            {...{ measure, run, building }}
            onChange={
              mayChange
                ? () => {
                    setAsks(measure);
                  }
                : undefined
            }
          />
        ))}
      </ul>
      {asks !== null && (
        <MeasureDialog
          schemeId={scheme.id}
          measure={asks === 'new' ? null : asks}
          buildingIds={asks === 'new' ? [id] : asks.buildings.map((one) => one.id)}
          chainage={building.result.chainage}
          onClose={() => {
            setAsks(null);
          }}
        />
      )}
    </Panel>
  );
}
