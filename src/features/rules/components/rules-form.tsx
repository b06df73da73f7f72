import { useState } from 'react';
import { useForm } from 'react-hook-form';
import type { RuleSet, RulesVersion } from '../../../../shared/schemas/rules.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ConflictChoice } from '../../../components/ui/conflict-choice.tsx';
import { ErrorNote } from '../../../components/ui/error-note.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { UnsavedEdits } from '../../../components/ui/unsaved-edits.tsx';
import { isRefusal } from '../../../lib/api-error.ts';
import { useSaveRules } from '../api/save-rules.ts';
import { checkDraft } from '../check-draft.ts';
import { rebasedDraft } from '../rebased-draft.ts';
import { ruleChanges } from '../rule-lines.ts';
import { RULES } from '../rule-words.ts';
import { draftOf, type RulesDraft } from '../rules-draft.ts';
import { HoldFields } from './hold-fields.tsx';
import { RuleRow } from './rule-row.tsx';
import { SensitivityFields } from './sensitivity-fields.tsx';

const FASTER = 'Somebody else saved a version meanwhile. What you wrote is still here.';

type RulesFormProps = {
  readonly schemeId: string;
  readonly newest: RulesVersion;
  readonly onDone: () => void;
};

/** Writes the next version of a scheme's rules. The one before stays, for what was worked out by it. */
export function RulesForm({ schemeId, newest, onDone }: RulesFormProps) {
  const save = useSaveRules(schemeId);
  /** The version that this one is made from; the newest may have moved on since. */
  const [base, setBase] = useState(newest);
  const form = useForm<RulesDraft, unknown, RuleSet>({
    resolver: checkDraft,
    defaultValues: draftOf(base.rules),
  });
  const { errors, isDirty, isSubmitted } = form.formState;
  const faults = Object.keys(errors).length;
  const isLate = isRefusal(save.error, 'conflict');
  const submit = form.handleSubmit((rules) => {
    save.mutate({ basedOn: base.version, rules }, { onSuccess: onDone });
  });
  function keepMine() {
    const [from, onto] = [draftOf(base.rules), draftOf(newest.rules)];
    const mine = rebasedDraft(form.getValues(), from, onto);
    form.reset(onto);
    form.reset(mine, { keepDefaultValues: true });
    setBase(newest);
    save.reset();
  }
  return (
    <form noValidate onSubmit={(event) => void submit(event)}>
      <UnsavedEdits hasEdits={isDirty && !save.isSuccess} />
      <MutationError
        failed="The rules were not saved."
        error={save.error}
        stands={isLate ? FASTER : undefined}
        action={
          isLate && newest.version > base.version ? (
            <ConflictChoice changes={ruleChanges(base.rules, newest.rules)} onKeepMine={keepMine} />
          ) : undefined
        }
      />
      {faults > 0 && isSubmitted && (
        <ErrorNote
          failed="Not saved yet."
          stands="Mend what is marked. The version before stands until then."
        />
      )}
      {RULES.map(({ rule, name, what }) => (
        <RuleRow key={rule} form={form} rule={rule} name={name} what={what} />
      ))}
      <Panel title="Holds" note="keep a building from being let go, whatever its figures">
        <HoldFields form={form} />
      </Panel>
      <Panel title="Sensitivity scores" note="offered to who scores a building">
        <SensitivityFields form={form} />
      </Panel>
      <div className="mt-4 flex gap-2">
        <Button kind="main" type="submit" busy={save.isPending}>
          Save as version {base.version + 1}
        </Button>
        <Button onClick={onDone}>Leave version {newest.version}</Button>
      </div>
    </form>
  );
}
