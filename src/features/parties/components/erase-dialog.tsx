import { useState, type SubmitEvent } from 'react';
import { PARTY_LIMITS, type Party } from '../../../../shared/schemas/parties.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import { useEraseParty } from '../api/erase-party.ts';
import { PartyName } from './party-name.tsx';

type EraseDialogProps = {
  readonly schemeId: string;
  readonly party: Party;
  readonly onClose: () => void;
};

/** Asks on which ground personal data are erased, and says what goes and what stays. */
export function EraseDialog({ schemeId, party, onClose }: EraseDialogProps) {
  const [ground, setGround] = useState('');
  const [askedOn, setAskedOn] = useState('');
  const [isTried, setTried] = useState(false);
  const erase = useEraseParty(schemeId, party, onClose);
  const isWhole = ground.trim() !== '' && askedOn !== '';
  function submit(event: SubmitEvent) {
    event.preventDefault();
    setTried(true);
    if (isWhole) erase.mutate({ ground: ground.trim(), askedOn });
  }
  return (
    <Dialog open title="Erase personal data" onClose={onClose}>
      <form onSubmit={submit} noValidate className="grid grid-cols-1 gap-3">
        <MutationError failed="Nothing was erased." error={erase.error} />
        <p className="min-w-0 text-small break-words">
          Name, address, e-mail and interests of <PartyName name={party.name} /> go for good, with
          what they were before and the sign-in as an owner. Mails that wait do not go out, and an
          import that is still open is given up. Letters that were sent and what they wrote stay for
          the time that the letter settings state, for the administrator alone. The trail stays.
        </p>
        <TextArea
          label="On which ground"
          hint="It is kept, so it should not name them."
          rows={2}
          maxLength={PARTY_LIMITS.ground}
          data-first-in-focus
          value={ground}
          error={isTried && ground.trim() === '' ? 'Say on which ground.' : undefined}
          onChange={({ target }) => {
            setGround(target.value);
          }}
        />
        <Field
          label="Asked for on"
          type="date"
          frameClassName="max-w-[180px]"
          value={askedOn}
          error={isTried && askedOn === '' ? 'Write the day.' : undefined}
          onChange={({ target }) => {
            setAskedOn(target.value);
          }}
        />
        <div className="flex gap-2">
          <Button kind="main" type="submit" busy={erase.isPending}>
            Erase for good
          </Button>
          <Button onClick={onClose}>Leave it as it is</Button>
        </div>
      </form>
    </Dialog>
  );
}
