import { capital } from '../../../../shared/presentation/capital.ts';
import { DEFECT_KINDS, VISIT_LIMITS } from '../../../../shared/schemas/visits.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { Select } from '../../../components/ui/select.tsx';
import type { WrittenDefect } from '../draft/kept-visit.ts';

type DefectFieldsProps = {
  readonly defect: WrittenDefect;
  readonly number: number;
  readonly onChange: (part: Partial<WrittenDefect>) => void;
  readonly onRemove: () => void;
};

const KINDS = DEFECT_KINDS.map((kind) => ({
  value: kind,
  label: capital(kind),
}));

/** One defect: where, of what kind, how wide. */
export function DefectFields({ defect, number, onChange, onRemove }: DefectFieldsProps) {
  const { place, kind, width, note } = defect;
  return (
    <fieldset className="border-b border-hairline py-3">
      <legend className="sr-only">Defect {number}</legend>
      <div className="grid grid-cols-[minmax(0,1fr)_minmax(0,1fr)_120px] gap-x-4 gap-y-2.5 max-sm:grid-cols-[minmax(0,1fr)_120px]">
        <Field
          label="Where"
          autoFocus={place === ''}
          autoComplete="off"
          placeholder="Gable, first floor"
          maxLength={VISIT_LIMITS.place}
          value={place}
          frameClassName="max-sm:col-span-2"
          onChange={({ target }) => {
            onChange({ place: target.value });
          }}
        />
        <Select
          label="Kind"
          options={KINDS}
          value={kind}
          onChange={({ target }) => {
            onChange({ kind: DEFECT_KINDS.find((one) => one === target.value) ?? 'other' });
          }}
        />
        <Field
          label="Width"
          unit="mm"
          value={width}
          onChange={({ target }) => {
            onChange({ width: target.value });
          }}
        />
      </div>
      <div className="mt-2.5 flex items-end gap-3">
        <Field
          label="Note"
          autoComplete="off"
          maxLength={VISIT_LIMITS.note}
          value={note}
          frameClassName="flex-1"
          onChange={({ target }) => {
            onChange({ note: target.value });
          }}
        />
        <Button aria-label={`Remove defect ${number}`} onClick={onRemove}>
          Remove
        </Button>
      </div>
    </fieldset>
  );
}
