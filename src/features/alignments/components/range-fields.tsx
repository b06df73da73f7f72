import { useFormState, type Control, type UseFormRegister } from 'react-hook-form';
import { Field } from '../../../components/ui/field.tsx';
import type { OptionDraft } from '../drafts/option-draft.ts';

export type OptionControl = Control<OptionDraft, unknown, unknown>;

export type FieldsProps = {
  readonly control: OptionControl;
  readonly register: UseFormRegister<OptionDraft>;
};

type RangeFieldsProps = FieldsProps & {
  readonly of: 'volumeLoss' | 'troughWidth';
  /** Of which interval; without it, of the whole line. */
  readonly interval?: number;
};

const ENDS = ['low', 'central', 'high'] as const;
const NAMES = { volumeLoss: 'Volume loss', troughWidth: 'Trough width K' } as const;

/** Low, central and high of one value, side by side. */
export function RangeFields({ control, register, of, interval }: RangeFieldsProps) {
  const { errors } = useFormState({ control });
  const path =
    interval === undefined
      ? (`design.${of}` as const)
      : (`design.intervals.${interval}.${of}` as const);
  const faults =
    interval === undefined ? errors.design?.[of] : errors.design?.intervals?.[interval]?.[of];
  const suffix = interval === undefined ? '' : ` of interval ${interval + 1}`;
  return (
    <fieldset className="mt-2.5">
      <legend className="text-small font-semibold">
        {NAMES[of]}
        {of === 'volumeLoss' && <span className="font-normal text-ink-2"> %</span>}
        <span className="sr-only">{suffix}</span>
      </legend>
      <div className="grid grid-cols-3 gap-2">
        {ENDS.map((end) => (
          <Field
            key={end}
            label={end.charAt(0).toUpperCase() + end.slice(1)}
            inputMode="decimal"
            autoComplete="off"
            className="text-right"
            error={faults?.[end]?.message}
            {...register(`${path}.${end}`)}
          />
        ))}
      </div>
      <FaultLine>{faults?.message ?? faults?.root?.message}</FaultLine>
    </fieldset>
  );
}

/** A fault that belongs to no one field. */
export function FaultLine({ children }: { readonly children: string | undefined }) {
  if (children === undefined) return null;
  return (
    <p role="alert" className="mt-1 text-small font-medium text-clay-deep">
      {children}
    </p>
  );
}
