import { useForm } from 'react-hook-form';
import type { RuleSet, RulesVersion } from '../../../../shared/schemas/rules.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ErrorNote } from '../../../components/ui/error-note.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { useSaveRules } from '../api/save-rules.ts';
import { checkDraft } from '../check-draft.ts';
import { RULES } from '../rule-words.ts';
import { draftOf, type RulesDraft } from '../rules-draft.ts';
import { HoldFields } from './hold-fields.tsx';
import { RuleRow } from './rule-row.tsx';

type RulesFormProps = {
  readonly schemeId: string;
  readonly newest: RulesVersion;
  readonly onDone: () => void;
};

/** Writes the next version of a scheme's rules. The one before stays, for what was worked out by it. */
export function RulesForm({ schemeId, newest, onDone }: RulesFormProps) {
  const save = useSaveRules(schemeId);
  const form = useForm<RulesDraft, unknown, RuleSet>({
    resolver: checkDraft,
    defaultValues: draftOf(newest.rules),
  });
  const faults = Object.keys(form.formState.errors).length;
  const submit = form.handleSubmit((rules) => {
    save.mutate({ basedOn: newest.version, rules }, { onSuccess: onDone });
  });
  return (
    <form noValidate onSubmit={(event) => void submit(event)}>
      <MutationError failed="The rules were not saved." error={save.error} />
      {faults > 0 && form.formState.isSubmitted && (
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
      <div className="mt-4 flex gap-2">
        <Button kind="main" type="submit" busy={save.isPending}>
          Save as version {newest.version + 1}
        </Button>
        <Button onClick={onDone}>Leave version {newest.version}</Button>
      </div>
    </form>
  );
}
