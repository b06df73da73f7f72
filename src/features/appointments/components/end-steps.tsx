import { useState } from 'react';
import type { Appointment } from '../../../../shared/schemas/appointments.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';

type EndStepsProps = {
  readonly appointment: Appointment;
  readonly isBusy: boolean;
  readonly onEnd: (how: 'cancel' | 'done') => void;
};

/** Calls an appointment off, or says that it took place once it was agreed. */
export function EndSteps({ appointment, isBusy, onEnd }: EndStepsProps) {
  const [isAsking, setAsking] = useState(false);
  return (
    <>
      {appointment.state === 'agreed' && (
        <Button
          busy={isBusy}
          onClick={() => {
            onEnd('done');
          }}
        >
          It took place
        </Button>
      )}
      <Button
        onClick={() => {
          setAsking(true);
        }}
      >
        Call it off…
      </Button>
      <ConfirmDialog
        open={isAsking}
        title="Call this appointment off?"
        doIt="Call it off"
        busy={isBusy}
        onClose={() => {
          setAsking(false);
        }}
        onConfirm={() => {
          setAsking(false);
          onEnd('cancel');
        }}
      >
        They are told by e-mail, and it goes from their calendar. It cannot be offered again; offer
        another one.
      </ConfirmDialog>
    </>
  );
}
