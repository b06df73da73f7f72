import { Field } from '../../../components/ui/field.tsx';
import type { MeasureDraft } from '../measure-draft.ts';

type LimitFieldsProps = {
  readonly draft: MeasureDraft;
  readonly faults: Readonly<Record<string, string>>;
  readonly chainage: number | null;
  readonly onChange: (change: Partial<MeasureDraft>) => void;
};

const FIELDS = [
  { name: 'volumeLoss', label: 'Volume loss at most, %' },
  { name: 'from', label: 'From chainage, m' },
  { name: 'to', label: 'To chainage, m' },
] as const;

/** The volume loss that is promised along a stretch of the line; its effect is worked out on the sheet. */
export function LimitFields({ draft, faults, chainage, onChange }: LimitFieldsProps) {
  return (
    <fieldset className="grid gap-1">
      <div className="grid grid-cols-3 gap-3 max-sm:grid-cols-1">
        {FIELDS.map(({ name, label }) => (
          <Field
            key={name}
            label={label}
            inputMode="decimal"
            value={draft[name]}
            error={faults[`limit.${name}`]}
            onChange={({ target }) => {
              onChange({ [name]: target.value });
            }}
          />
        ))}
      </div>
      {chainage !== null && (
        <p className="text-cap text-ink-3">
          The building stands at chainage {chainage.toFixed(0)} m.
        </p>
      )}
    </fieldset>
  );
}
