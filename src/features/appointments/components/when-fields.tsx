import { useQuery } from '@tanstack/react-query';
import { APPOINTMENT_LIMITS } from '../../../../shared/schemas/appointments.ts';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { Field } from '../../../components/ui/field.tsx';
import type { Faults } from '../../../lib/faults-by-path.ts';
import { formatWeekdayMoment } from '../../../lib/format-date.ts';
import { letterSettingsQuery } from '../../letters/api/letter-templates.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { whenOf, type WhenDraft } from '../appointment-draft.ts';

type WhenFieldsProps = {
  readonly draft: WhenDraft;
  readonly faults: Faults;
  readonly onChange: (change: Partial<WhenDraft>) => void;
};

/** What owners read, where the clocks that they go by differ from those here. */
function OwnersTime({ draft }: Pick<WhenFieldsProps, 'draft'>) {
  const { data } = useQuery(letterSettingsQuery(useScheme().id));
  const { startsAt } = whenOf(draft);
  if (data === undefined || startsAt === '') return null;
  const { timeZone } = data.settings;
  const told = formatWeekdayMoment(startsAt, timeZone);
  if (told === formatWeekdayMoment(startsAt)) return null;
  return (
    <p className="text-small text-ink-2">
      {`This is the time of your own clock. The owner reads ${told}, as it is in ${timeZone}.`}
    </p>
  );
}

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
            set({ day: target.value, isFreeDayMeant: false });
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
      <OwnersTime draft={draft} />
      <Checkbox
        label="On a weekend or a holiday on purpose"
        hint="As when the owner asked for that day"
        checked={draft.isFreeDayMeant}
        onChange={({ target }) => {
          set({ isFreeDayMeant: target.checked });
        }}
      />
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
