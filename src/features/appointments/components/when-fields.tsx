import { APPOINTMENT_LIMITS } from '../../../../shared/schemas/appointments.ts';
import { Field } from '../../../components/ui/field.tsx';
import type { Faults } from '../../../lib/faults-by-path.ts';
import type { WhenDraft } from '../appointment-draft.ts';

type WhenFieldsProps = {
  readonly draft: WhenDraft;
  readonly faults: Faults;
  readonly onChange: (change: Partial<WhenDraft>) => void;
};

/** When and where an appointment is. */
export function WhenFields({ draft, faults, onChange: set }: WhenFieldsProps) {
  return (
    <>
      <div className="grid grid-cols-3 gap-3 max-sm:grid-cols-1">
        <Field
          label="Day"
          type="date"
          value={draft.day}
          error={faults.startsAt}
          onChange={({ target }) => {
            set({ day: target.value });
          }}
        />
        <Field
          label="Time"
          type="time"
          value={draft.time}
          onChange={({ target }) => {
            set({ time: target.value });
          }}
        />
        <Field
          label="Length"
          unit="min"
          value={draft.minutes}
          error={faults.minutes}
          onChange={({ target }) => {
            set({ minutes: target.value });
          }}
        />
      </div>
      <Field
        label="Where"
        maxLength={APPOINTMENT_LIMITS.place}
        value={draft.place}
        error={faults.place}
        onChange={({ target }) => {
          set({ place: target.value });
        }}
      />
    </>
  );
}
