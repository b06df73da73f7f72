import { Link } from 'react-router-dom';
import type { Matter } from '../../../../shared/schemas/matter-answers.ts';
import { MATTER_STATES, type MatterState } from '../../../../shared/schemas/matters.ts';
import { capital } from '../../../../shared/presentation/capital.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Facts } from '../../../components/ui/facts.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { StateMark } from '../../../components/ui/state-mark.tsx';
import { sheetPath } from '../../../config/paths.ts';
import { formatDay } from '../../../lib/format-date.ts';
import { useMatterStep } from '../api/change-matter.ts';
import { PartyName } from '../../parties/components/party-name.tsx';
import { MATTER_SHAPES, placeName } from '../matter-words.ts';
import { DueDay } from './due-day.tsx';

type MatterStandingProps = {
  readonly schemeId: string;
  readonly matter: Matter;
  readonly mayChange: boolean;
  readonly onReload: () => void;
};

const STATES = MATTER_STATES.map((value) => ({ value, label: capital(value) }));

function stateNamed(name: string): MatterState | undefined {
  return MATTER_STATES.find((one) => one === name);
}

function Standing({ schemeId, matter, onReload }: MatterStandingProps) {
  const step = useMatterStep(schemeId, matter.id);
  const { version, assignedTo } = matter;
  function change(some: { state?: MatterState; due?: string; assignedTo?: string | null }) {
    step.mutate({ kind: 'change', body: { version, ...some } });
  }
  return (
    <div className="mt-3 grid gap-3">
      <MutationError
        failed="It was not changed."
        error={step.error}
        action={<Button onClick={onReload}>See what is new</Button>}
      />
      <Select
        label="State"
        options={STATES}
        value={matter.state}
        onChange={({ target }) => {
          const state = stateNamed(target.value);
          if (state !== undefined) change({ state });
        }}
      />
      <Select
        label="Given to"
        options={matter.assessors.map(({ id, name }) => ({ value: id, label: name }))}
        unchosen="Nobody"
        value={assignedTo?.id ?? ''}
        onChange={({ target }) => {
          change({ assignedTo: target.value === '' ? null : target.value });
        }}
      />
      <Field
        // begun anew when somebody else sets it
        key={matter.due}
        label="Answer by"
        error={matter.isOverdue ? 'This day has passed.' : undefined}
        type="date"
        defaultValue={matter.due}
        onBlur={({ target }) => {
          if (target.value !== '' && target.value !== matter.due) change({ due: target.value });
        }}
      />
    </div>
  );
}

/** What a matter is about, where it stands, by when it is answered and by whom. */
export function MatterStanding(props: MatterStandingProps) {
  const { schemeId, matter, mayChange } = props;
  const { number, kind, party, building, state, openedAt, due, isOverdue, assignedTo } = matter;
  const place = placeName(building);
  return (
    <Panel title={`Matter ${number}`}>
      <Facts
        facts={[
          ['Kind', capital(kind)],
          ['From', <PartyName key="from" name={party.name} />],
          [
            'Building',
            building.isInRegister ? (
              <Link to={sheetPath(schemeId, building.id)}>{place}</Link>
            ) : (
              `${place}, taken out of the register`
            ),
          ],
          ['Brought up', formatDay(openedAt)],
          ...(mayChange
            ? []
            : [
                [
                  'State',
                  <StateMark key="state" state={MATTER_SHAPES[state]}>
                    {capital(state)}
                  </StateMark>,
                ] as const,
                [
                  'Answer by',
                  state === 'open' ? <DueDay {...{ due, isOverdue }} /> : formatDay(due),
                ] as const,
                ['Given to', assignedTo?.name ?? 'Nobody'] as const,
              ]),
        ]}
      />
      {mayChange && <Standing {...props} />}
    </Panel>
  );
}
