import { useState, type SubmitEvent } from 'react';
import {
  APPOINTMENT_PURPOSES,
  newAppointmentSchema,
} from '../../../../shared/schemas/appointments.ts';
import { capital } from '../../../../shared/presentation/capital.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { faultsOfError, faultsOfIssues, type Faults } from '../../../lib/faults-by-path.ts';
import { useOfferAppointment } from '../api/change-appointment.ts';
import { NO_TIME, whenOf } from '../appointment-draft.ts';
import { BuildingChoice, type ChosenBuilding } from './building-choice.tsx';
import { PartyChoice } from './party-choice.tsx';
import { WhenFields } from './when-fields.tsx';

type OfferDialogProps = {
  readonly schemeId: string;
  /** Where it begins at a building. */
  readonly building?: ChosenBuilding;
  readonly onClose: () => void;
};

const PURPOSES = APPOINTMENT_PURPOSES.map((value) => ({ value, label: capital(value) }));
const FIELDS = ['buildingId', 'partyId', 'startsAt', 'minutes', 'place'];

const MISSING: Faults = { buildingId: 'Choose a building.', partyId: 'Choose to whom.' };

function useOffer({ schemeId, building, onClose }: OfferDialogProps) {
  const [id] = useState(() => crypto.randomUUID());
  const [place, setPlace] = useState<ChosenBuilding | null>(building ?? null);
  const [partyId, setPartyId] = useState('');
  const [purpose, setPurpose] = useState<string>(APPOINTMENT_PURPOSES[0]);
  const [when, setWhen] = useState(NO_TIME);
  const [own, setOwn] = useState<Faults>({});
  const offer = useOfferAppointment(schemeId, onClose);
  function send(event: SubmitEvent) {
    event.preventDefault();
    const asked = { id, buildingId: place?.id, partyId, purpose, ...whenOf(when) };
    const read = newAppointmentSchema.safeParse(asked);
    const found = read.success ? {} : faultsOfIssues(read.error.issues);
    const named = Object.keys(found).map((name) => [name, MISSING[name] ?? found[name] ?? '']);
    setOwn(Object.fromEntries(named) as Faults);
    if (read.success) offer.mutate(read.data);
  }
  const faults = { ...faultsOfError(offer.error), ...own };
  return { place, setPlace, partyId, setPartyId, purpose, setPurpose, when, setWhen, offer, send, faults }; // prettier-ignore
}

/** Offers an appointment to somebody who has a part in a building. */
export function OfferDialog(props: OfferDialogProps) {
  const { schemeId, onClose } = props;
  const draft = useOffer(props);
  const { place, partyId, purpose, when, faults, offer } = draft;
  return (
    <Dialog open title="Offer an appointment" onClose={onClose}>
      <form onSubmit={draft.send} noValidate className="grid gap-3">
        <MutationError failed="Nothing was offered." error={offer.error} shown={FIELDS} />
        <BuildingChoice
          {...{ schemeId, value: place }}
          error={faults.buildingId}
          onChoose={(building) => {
            draft.setPlace(building);
            draft.setPartyId('');
          }}
        />
        {place !== null && (
          <PartyChoice
            label="To whom"
            unchosen="Choose"
            buildingId={place.id}
            {...{ schemeId, value: partyId }}
            error={faults.partyId}
            onChoose={(party) => {
              draft.setPartyId(party?.id ?? '');
            }}
          />
        )}
        <Select
          label="What for"
          options={PURPOSES}
          value={purpose}
          onChange={({ target }) => {
            draft.setPurpose(target.value);
          }}
        />
        <WhenFields
          {...{ draft: when, faults }}
          onChange={(change) => {
            draft.setWhen({ ...when, ...change });
          }}
        />
        <p className="text-cap text-ink-3">
          Goes by e-mail, with an entry for a calendar, to the party or whoever acts for them.
        </p>
        <div className="flex gap-2">
          <Button kind="main" type="submit" busy={offer.isPending}>
            Offer it
          </Button>
          <Button onClick={onClose}>Leave it</Button>
        </div>
      </form>
    </Dialog>
  );
}
