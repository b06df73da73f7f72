import { useState, type SubmitEvent } from 'react';
import type { HeldLetterSettings } from '../../../../shared/schemas/letter-settings.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { UnsavedEdits } from '../../../components/ui/unsaved-edits.tsx';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useKeepLetterSettings } from '../api/letter-templates.ts';
import {
  draftOfSettings,
  newRule,
  readSettings,
  type PartProps,
  type SettingsFaults,
} from '../settings-draft.ts';
import { ContactFields } from './contact-fields.tsx';
import { MilestoneFields } from './milestone-fields.tsx';
import { RuleFields } from './rule-fields.tsx';
import { SettingsDays } from './settings-days.tsx';
import { TermsFields } from './terms-fields.tsx';

function RulesPart({ draft, faults, onChange }: PartProps) {
  const { rules } = draft;
  return (
    <Panel title="Rules">
      <ul>
        {rules.map((rule, k) => (
          <RuleFields
            key={k}
            rule={rule}
            place={`rules.${k}`}
            faults={faults}
            onChange={(next) => {
              onChange({ rules: rules.with(k, next) });
            }}
            onRemove={() => {
              onChange({ rules: rules.toSpliced(k, 1) });
            }}
          />
        ))}
      </ul>
      <Button
        className="mt-3"
        onClick={() => {
          onChange({ rules: [...rules, newRule(new Date().toISOString().slice(0, 10))] });
        }}
      >
        Add a rule
      </Button>
    </Panel>
  );
}

/** Writes the next version of what letters go by. */
export function SettingsForm({
  held,
  onDone,
}: {
  readonly held: HeldLetterSettings;
  readonly onDone: () => void;
}) {
  const [draft, setDraft] = useState(() => draftOfSettings(held.settings));
  const [faults, setFaults] = useState<SettingsFaults>({});
  const keep = useKeepLetterSettings(useScheme().id, onDone);
  const hasEdits = JSON.stringify(draft) !== JSON.stringify(draftOfSettings(held.settings));
  const part: PartProps = {
    draft,
    faults,
    onChange: (some) => {
      setDraft({ ...draft, ...some });
    },
  };
  function save(event: SubmitEvent) {
    event.preventDefault();
    const read = readSettings(draft);
    setFaults('faults' in read ? read.faults : {});
    if ('settings' in read) keep.mutate({ basedOn: held.version, settings: read.settings });
  }
  return (
    <form onSubmit={save} noValidate className="max-w-[820px]">
      <ContactFields {...part} />
      <TermsFields {...part} />
      <SettingsDays {...part} />
      <MilestoneFields {...part} />
      <RulesPart {...part} />
      {Object.keys(faults).length > 0 && (
        <p role="alert" className="mt-4 text-small text-clay-deep">
          Something above is not right yet; it says what beside it.
        </p>
      )}
      <MutationError failed="Nothing was kept." error={keep.error} />
      <div className="mt-4 flex gap-2">
        <Button kind="main" type="submit" busy={keep.isPending}>
          {`Keep as version ${held.version + 1}`}
        </Button>
        <Button onClick={onDone}>Leave it as it was</Button>
      </div>
      <UnsavedEdits hasEdits={hasEdits && !keep.isPending} what="What you wrote of the rules" />
    </form>
  );
}
