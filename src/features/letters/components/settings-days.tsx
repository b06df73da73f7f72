import { Field } from '../../../components/ui/field.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import type { PartProps } from '../settings-draft.ts';

const DAYS = [
  ['answerWithin', 'Answer within', 'days'],
  ['remindAfter', 'Remind after', 'days'],
  ['escalateAfter', 'Escalate after', 'days'],
  ['keepYears', 'Keep letters for', 'years'],
] as const;

/** How long owners have, and how long letters are kept. */
export function SettingsDays({ draft, faults, onChange }: PartProps) {
  return (
    <Panel title="Days">
      <div className="grid grid-cols-4 gap-3 pt-3 max-sm:grid-cols-2">
        {DAYS.map(([name, label, unit]) => (
          <Field
            key={name}
            label={label}
            unit={unit}
            value={draft[name]}
            error={faults[name]}
            onChange={(event) => {
              onChange({ [name]: event.target.value });
            }}
          />
        ))}
      </div>
      <Field
        frameClassName="mt-3"
        label="On what ground letters are kept once personal data are erased"
        value={draft.keepGround}
        error={faults.keepGround}
        onChange={(event) => {
          onChange({ keepGround: event.target.value });
        }}
      />
    </Panel>
  );
}
