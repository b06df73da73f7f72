import { useState } from 'react';
import type { OwnAppointment } from '../../../../shared/schemas/appointments.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { formatWeekdayMoment } from '../../../lib/format-date.ts';
import { useOwnZone } from '../hooks/use-own-zone.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useAnswerAppointment } from '../api/answer-appointment.ts';
import { AskedBox } from './asked-box.tsx';
import { OtherDays } from './other-days.tsx';

const FOR: Readonly<Record<OwnAppointment['purpose'], string>> = {
  'condition survey': 'Please choose a day for the survey',
  access: 'Please choose a day for our visit',
};

type ChooseDayProps = {
  readonly appointment: OwnAppointment;
  readonly onDone: (thanks: string) => void;
};

/** A day for a visit: the one that is offered, or another. */
export function ChooseDay({ appointment, onDone }: ChooseDayProps) {
  const scheme = useScheme();
  const [isOther, setOther] = useState(false);
  const { id, version, purpose, startsAt, place } = appointment;
  const when = formatWeekdayMoment(startsAt, useOwnZone());
  const answer = useAnswerAppointment(scheme.id, id, ({ state }) => {
    onDone(
      state === 'agreed'
        ? `Thank you. We come on ${when}. A mail confirms it, with an entry for your calendar.`
        : 'Thank you. We look for a time that suits you, and write to you.',
    );
  });
  return (
    <AskedBox title={FOR[purpose]}>
      <p className="mb-3">
        We would like to come on <b className="font-semibold">{when}</b>
        {`. Where: ${place}. If that does not suit, pick another.`}
      </p>
      <MutationError failed="That did not reach us. Please try again." error={answer.error} />
      {isOther ? (
        <OtherDays
          busy={answer.isPending}
          onSend={(days, note) => {
            answer.mutate({ version, answer: 'another day', days, note });
          }}
          onBack={() => {
            setOther(false);
          }}
        />
      ) : (
        <div className="flex flex-wrap gap-2.5 max-sm:[&>*]:flex-1">
          <Button
            kind="main"
            busy={answer.isPending}
            onClick={() => {
              answer.mutate({ version, answer: 'agree' });
            }}
          >
            That suits me
          </Button>
          <Button
            onClick={() => {
              setOther(true);
            }}
          >
            Pick another day
          </Button>
        </div>
      )}
    </AskedBox>
  );
}
