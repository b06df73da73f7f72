import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import type { PartProps } from '../settings-draft.ts';

const FIELDS = [
  ['when', 'When', 'As November 2027'],
  ['title', 'What', 'As: The first tunnel passes'],
  ['words', 'In a sentence', 'As: We measure levels on the pavement twice a day.'],
] as const;

/** What happens when, as letters and the pages of owners have it. */
export function MilestoneFields({ draft: { milestones }, faults, onChange }: PartProps) {
  return (
    <Panel title="What happens when" note="in letters and on the pages of owners">
      <ul>
        {milestones.map((milestone, k) => (
          <li
            key={k}
            className="grid grid-cols-[150px_1fr_1.6fr_auto] items-end gap-3 border-b border-hairline py-3 max-sm:grid-cols-1"
          >
            {FIELDS.map(([name, label, hint]) => (
              <Field
                key={name}
                label={label}
                placeholder={hint}
                value={milestone[name]}
                error={faults[`milestones.${k}.${name}`]}
                onChange={(event) => {
                  const next = { ...milestone, [name]: event.target.value };
                  onChange({ milestones: milestones.with(k, next) });
                }}
              />
            ))}
            <Button
              kind="quiet"
              onClick={() => {
                onChange({ milestones: milestones.toSpliced(k, 1) });
              }}
            >
              Take out
            </Button>
          </li>
        ))}
      </ul>
      <Button
        className="mt-3"
        onClick={() => {
          onChange({ milestones: [...milestones, { when: '', title: '', words: '' }] });
        }}
      >
        Add a date
      </Button>
    </Panel>
  );
}
