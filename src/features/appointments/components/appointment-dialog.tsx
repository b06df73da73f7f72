import { useState, type SubmitEvent } from 'react';
import { Link } from 'react-router-dom';
import {
  changeAppointmentSchema,
  type Appointment,
} from '../../../../shared/schemas/appointments.ts';
import { capital } from '../../../../shared/presentation/capital.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { Facts } from '../../../components/ui/facts.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { sheetPath } from '../../../config/paths.ts';
import { faultsOfError, faultsOfIssues, type Faults } from '../../../lib/faults-by-path.ts';
import { formatMoment } from '../../../lib/format-date.ts';
import { PartyName } from '../../parties/components/party-name.tsx';
import { placeName } from '../../matters/matter-words.ts';
import { useChangeAppointment } from '../api/change-appointment.ts';
import { draftOfAppointment, onAskedDay, whenOf } from '../appointment-draft.ts';
import { isOver } from '../appointment-words.ts';
import { AskedDays } from './asked-days.tsx';
import { EndSteps } from './end-steps.tsx';
import { WhenFields } from './when-fields.tsx';

type AppointmentDialogProps = {
  readonly schemeId: string;
  readonly appointment: Appointment;
  readonly mayChange: boolean;
  readonly onClose: () => void;
};

const FIELDS = ['startsAt', 'minutes', 'place'];

function AppointmentFacts({
  schemeId,
  appointment,
}: Pick<AppointmentDialogProps, 'schemeId' | 'appointment'>) {
  const { building, party, purpose, startsAt, minutes, place, state, isMailed } = appointment;
  return (
    <Facts
      facts={[
        ['Building', <Link key="at" to={sheetPath(schemeId, building.id)}>{placeName(building)}</Link>], // prettier-ignore
        ['With', <PartyName key="with" name={party.name} />],
        ['What for', capital(purpose)],
        ['When', `${formatMoment(startsAt)}, ${minutes} min`],
        ['Where', place],
        ['State', capital(state)],
        ...(isMailed ? [] : [['Mail', 'No e-mail address: tell them another way.'] as const]),
      ]}
    />
  );
}

function ChangeForm({ schemeId, appointment, onClose }: AppointmentDialogProps) {
  const { id, version, askedFor } = appointment;
  const [when, setWhen] = useState(() => draftOfAppointment(appointment));
  const [own, setOwn] = useState<Faults>({});
  const change = useChangeAppointment(schemeId, id, onClose);
  function offer(event: SubmitEvent) {
    event.preventDefault();
    const asked = { change: 'offer anew', version, ...whenOf(when) };
    const read = changeAppointmentSchema.safeParse(asked);
    setOwn(read.success ? {} : faultsOfIssues(read.error.issues));
    if (read.success) change.mutate(read.data);
  }
  const faults = { ...faultsOfError(change.error), ...own };
  return (
    <form onSubmit={offer} noValidate className="mt-3 grid gap-3">
      <MutationError failed="Nothing was changed." error={change.error} shown={FIELDS} />
      {askedFor !== null && (
        <AskedDays
          askedFor={askedFor}
          onTake={(day) => {
            setWhen(onAskedDay(when, day));
          }}
        />
      )}
      <WhenFields
        {...{ draft: when, faults }}
        onChange={(some) => {
          setWhen({ ...when, ...some });
        }}
      />
      <div className="flex flex-wrap gap-2">
        <Button kind="main" type="submit" busy={change.isPending}>
          Offer this time
        </Button>
        <EndSteps
          appointment={appointment}
          isBusy={change.isPending}
          onEnd={(how) => {
            change.mutate({ change: how, version });
          }}
        />
      </div>
      <p className="text-cap text-ink-3">
        A new time and calling it off are told by e-mail, and change the entry in their calendar.
      </p>
    </form>
  );
}

/** One appointment: what it is, and for whoever may, another time or its end. */
export function AppointmentDialog(props: AppointmentDialogProps) {
  const { appointment, mayChange, onClose } = props;
  const { askedFor } = appointment;
  const canChange = mayChange && !isOver(appointment);
  return (
    <Dialog open title="Appointment" onClose={onClose}>
      <AppointmentFacts {...props} />
      {canChange && <ChangeForm {...props} />}
      {!canChange && askedFor !== null && <AskedDays askedFor={askedFor} onTake={null} />}
    </Dialog>
  );
}
