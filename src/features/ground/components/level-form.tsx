import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { groundLevelSchema } from '../../../../shared/schemas/ground.ts';
import { Button } from '../../../components/ui/button.tsx';
import { DoneNote } from '../../../components/ui/done-note.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { draftSchema } from '../../../lib/draft-schema.ts';
import { showFieldFaults } from '../../../lib/form-errors.ts';
import { useSetLevel } from '../api/set-level.ts';
import { levelOf } from '../level-of.ts';

type LevelDraft = { readonly level: string; readonly source: string };

const SCHEMA = draftSchema(groundLevelSchema, ({ level, source }: LevelDraft) => ({
  level: levelOf(level),
  source,
}));

/** One level for the whole scheme. */
export function LevelForm({ schemeId }: { readonly schemeId: string }) {
  const set = useSetLevel(schemeId);
  const form = useForm({
    resolver: zodResolver(SCHEMA),
    defaultValues: { level: '', source: '' },
  });
  const { errors } = form.formState;
  const submit = form.handleSubmit((level) => {
    set.mutate(level, {
      onSuccess: () => {
        form.reset();
      },
      onError: (error) => {
        showFieldFaults(error, form, ['level', 'source']);
      },
    });
  });
  return (
    <form noValidate className="grid gap-3 pt-3" onSubmit={(event) => void submit(event)}>
      <MutationError
        failed="The level was not set."
        error={set.error}
        shown={['level', 'source']}
      />
      <Field
        label="Level above datum"
        unit="m"
        frameClassName="max-w-[180px]"
        error={errors.level?.message}
        {...form.register('level')}
      />
      <Field
        label="Where it comes from"
        placeholder="Levelling of May 2026"
        error={errors.source?.message}
        {...form.register('source')}
      />
      <div className="flex flex-wrap items-center gap-3">
        <Button type="submit" busy={set.isPending}>
          Set the level
        </Button>
        {set.isSuccess && <DoneNote>Set.</DoneNote>}
      </div>
    </form>
  );
}
