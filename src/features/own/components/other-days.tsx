import { useState, type SubmitEvent } from 'react';
import { APPOINTMENT_LIMITS, type AnswerAppointment } from '../../../../shared/schemas/appointments.ts'; // prettier-ignore
import { Button } from '../../../components/ui/button.tsx';
import { ErrorNote } from '../../../components/ui/error-note.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { givenDays, tomorrow, NO_DAYS, type DayDraft } from '../survey-days.ts';

const PARTS = [
  { value: 'morning', label: 'Morning' },
  { value: 'afternoon', label: 'Afternoon' },
];
const ORDER = ['First', 'Second', 'Third'];

type Days = Extract<AnswerAppointment, { answer: 'another day' }>['days'];

type OtherDaysProps = {
  readonly busy: boolean;
  readonly onSend: (days: Days, note: string) => void;
  readonly onBack: () => void;
};

type DayFieldsProps = {
  readonly order: string;
  readonly draft: DayDraft;
  readonly min: string;
  readonly onChange: (draft: DayDraft) => void;
};

function DayFields({ order, draft, min, onChange }: DayFieldsProps) {
  return (
    <fieldset className="mb-3 flex flex-wrap gap-x-4 gap-y-1">
      <legend className="sr-only">{order} day</legend>
      <Field
        label={`${order} day`}
        type="date"
        min={min}
        value={draft.day}
        onChange={({ target }) => {
          onChange({ ...draft, day: target.value });
        }}
      />
      <Select
        label="Time of day"
        options={PARTS}
        value={draft.part}
        onChange={({ target }) => {
          onChange({ ...draft, part: target.value === 'afternoon' ? 'afternoon' : 'morning' });
        }}
      />
    </fieldset>
  );
}

/** Up to three days that would suit better. */
export function OtherDays({ busy, onSend, onBack }: OtherDaysProps) {
  const [min] = useState(() => tomorrow(new Date()));
  const [drafts, setDrafts] = useState(NO_DAYS);
  const [note, setNote] = useState('');
  const [fault, setFault] = useState<string | null>(null);
  function send(event: SubmitEvent) {
    event.preventDefault();
    const given = givenDays(drafts, new Date());
    setFault(given.fault);
    if (given.fault === null && !busy) onSend(given.days, note);
  }
  return (
    <form noValidate onSubmit={send}>
      <p className="mb-3">Tell us up to three days that suit you. We take one and write to you.</p>
      {drafts.map((draft, k) => (
        <DayFields
          key={ORDER[k]}
          order={ORDER[k] ?? ''}
          draft={draft}
          min={min}
          onChange={(changed) => {
            setFault(null);
            setDrafts(drafts.map((one, at) => (at === k ? changed : one)));
          }}
        />
      ))}
      <Field
        label="Anything else, if you like"
        autoComplete="off"
        maxLength={APPOINTMENT_LIMITS.note}
        value={note}
        onChange={({ target }) => {
          setNote(target.value);
        }}
      />
      {fault !== null && (
        <div className="mt-3">
          <ErrorNote failed={fault} />
        </div>
      )}
      <div className="mt-4 flex flex-wrap gap-2.5">
        <Button type="submit" kind="main" busy={busy}>
          Send the days
        </Button>
        <Button onClick={onBack}>Back</Button>
      </div>
    </form>
  );
}
