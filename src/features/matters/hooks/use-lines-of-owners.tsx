import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import type { Appointment } from '../../../../shared/schemas/appointments.ts';
import type { ListedLetter } from '../../../../shared/schemas/letters.ts';
import type { MatterLine } from '../../../../shared/schemas/matter-answers.ts';
import type { Undertaking } from '../../../../shared/schemas/undertakings.ts';
import { capital } from '../../../../shared/presentation/capital.ts';
import { StateMark } from '../../../components/ui/state-mark.tsx';
import { letterPagePath, matterPath, ownersPath } from '../../../config/paths.ts';
import { formatMoment } from '../../../lib/format-date.ts';
import { appointmentsQuery } from '../../appointments/api/list-appointments.ts';
import { APPOINTMENT_SHAPES } from '../../appointments/appointment-words.ts';
import { lettersOfBuildingQuery } from '../../letters/api/letters.ts';
import { DELIVERY_SHAPES, KIND_LABELS } from '../../letters/letter-words.ts';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { undertakingsQuery } from '../../undertakings/api/list-undertakings.ts';
import { undertakingState } from '../../undertakings/undertaking-words.ts';
import { mattersQuery } from '../api/list-matters.ts';
import { MATTER_SHAPES } from '../matter-words.ts';

type Line = {
  readonly id: string;
  readonly to: string;
  readonly words: string;
  readonly mark: ReactNode;
};

function lineOfMatter(schemeId: string, { id, kind, title, state }: MatterLine): Line {
  return {
    id,
    to: matterPath(schemeId, id),
    words: `${capital(kind)}: ${title}`,
    mark: <StateMark state={MATTER_SHAPES[state]}>{capital(state)}</StateMark>,
  };
}

function lineOfAppointment(schemeId: string, appointment: Appointment): Line {
  const { id, purpose, startsAt, state } = appointment;
  return {
    id,
    to: ownersPath(schemeId, 'appointments'),
    words: `${capital(purpose)}, ${formatMoment(startsAt)}`,
    mark: <StateMark state={APPOINTMENT_SHAPES[state]}>{capital(state)}</StateMark>,
  };
}

function lineOfUndertaking(schemeId: string, undertaking: Undertaking): Line {
  const { shape, words } = undertakingState(undertaking);
  return {
    id: undertaking.id,
    to: ownersPath(schemeId, 'undertakings'),
    words: `Undertaking: ${undertaking.promise}`,
    mark: <StateMark state={shape}>{words}</StateMark>,
  };
}

function lineOfLetter(schemeId: string, letter: ListedLetter): Line {
  const { id, kind, name, batchId, delivery, acknowledgedAt } = letter;
  const words = acknowledgedAt === null ? capital(delivery) : 'Acknowledged';
  return {
    id,
    to: letterPagePath(schemeId, batchId),
    words: `Letter: ${KIND_LABELS[kind]}, ${name}`,
    mark: <StateMark state={DELIVERY_SHAPES[delivery]}>{words}</StateMark>,
  };
}

/** What there is between the team and the owners of a building, each line with where it leads. */
export function useLinesOfOwners(buildingId: number) {
  const scheme = useScheme();
  const { id } = scheme;
  const enabled = can(scheme, 'readMatters');
  const mayRead = can(scheme, 'readUndertakings');
  const building = String(buildingId);
  const matters = useQuery({ ...mattersQuery(id, { building }), enabled });
  const appointments = useQuery({ ...appointmentsQuery(id, buildingId), enabled });
  const mayReadLetters = can(scheme, 'readLetters');
  const letters = useQuery({ ...lettersOfBuildingQuery(id, buildingId), enabled: mayReadLetters });
  const undertakings = useQuery({ ...undertakingsQuery(id, buildingId), enabled: mayRead });
  const lines = [
    ...(letters.data ?? []).map((letter) => lineOfLetter(id, letter)),
    ...(matters.data?.matters ?? []).map((matter) => lineOfMatter(id, matter)),
    ...(appointments.data ?? []).map((appointment) => lineOfAppointment(id, appointment)),
    ...(undertakings.data ?? []).map((undertaking) => lineOfUndertaking(id, undertaking)),
  ];
  const error = letters.error ?? matters.error ?? appointments.error ?? undertakings.error;
  const hasLetters = !mayReadLetters || letters.isSuccess;
  const hasMatters = !enabled || (matters.isSuccess && appointments.isSuccess);
  return { lines, error, isThere: hasLetters && hasMatters && undertakings.isSuccess };
}
