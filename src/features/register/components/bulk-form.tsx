import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import {
  BUILDING_FIELD_NAMES,
  buildingAttributesSchema,
  type BuildingAttributes,
} from '../../../../shared/schemas/building-fields.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { draftSchema } from '../../../lib/draft-schema.ts';
import { AttributeField } from '../../buildings/components/attribute-field.tsx';
import { valueOfText, type DraftValues } from '../../buildings/building-draft.ts';
import { factsOf } from '../../../../shared/presentation/field-words.ts';

/** Which fields are set, and what is written in them. */
export type BulkDraft = {
  readonly set: Readonly<Partial<Record<keyof DraftValues, boolean>>>;
  readonly attributes: Readonly<Partial<DraftValues>>;
};

export const NO_VALUES: BulkDraft = { set: {}, attributes: {} };

const bulkDraftSchema = draftSchema(buildingAttributesSchema, ({ set, attributes }: BulkDraft) =>
  Object.fromEntries(
    BUILDING_FIELD_NAMES.filter((field) => set[field] === true).map((field) => [
      field,
      valueOfText(field, attributes[field] ?? ''),
    ]),
  ),
);

type BulkFormProps = {
  /** What was written before, when one comes back to it. */
  readonly draft: BulkDraft;
  readonly onReview: (attributes: BuildingAttributes, draft: BulkDraft) => void;
  readonly onClose: () => void;
};

/** The values to set: only the fields that are ticked, and an empty one makes it not known. */
export function BulkForm({ draft, onReview, onClose }: BulkFormProps) {
  const form = useForm<BulkDraft, unknown, BuildingAttributes>({
    resolver: zodResolver(bulkDraftSchema),
    defaultValues: draft,
  });
  const set = form.watch('set');
  const { errors } = form.formState;
  const isAny = BUILDING_FIELD_NAMES.some((field) => set[field] === true);
  const submit = form.handleSubmit((attributes) => {
    if (isAny) onReview(attributes, form.getValues());
  });
  const faults: Readonly<Record<string, { message?: string } | undefined>> = errors;
  return (
    <form noValidate onSubmit={(event) => void submit(event)}>
      <div className="max-h-[56vh] scroll-pb-12 overflow-auto">
        {BUILDING_FIELD_NAMES.map((field) => (
          <div key={field} className="border-b border-hairline py-1">
            <Checkbox label={factsOf(field).label} {...form.register(`set.${field}`)} />
            {set[field] === true && (
              <div className="pb-1.5 pl-6">
                <AttributeField
                  field={field}
                  isNamed
                  autoFocus
                  error={faults[field]?.message}
                  hint="Left empty: not known."
                  {...form.register(`attributes.${field}`)}
                />
              </div>
            )}
          </div>
        ))}
      </div>
      <div className="mt-3 flex items-center gap-2">
        {isAny && (
          <Button kind="main" type="submit">
            Next
          </Button>
        )}
        <Button onClick={onClose}>Leave them as they are</Button>
        {!isAny && <span className="text-small text-ink-2">Tick what to set.</span>}
      </div>
    </form>
  );
}
