import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { Appointment } from '../../../shared/schemas/appointments.ts';
import { capital } from '../../../shared/presentation/capital.ts';
import { PageTitle } from '../../components/layout/page-title.tsx';
import { Button } from '../../components/ui/button.tsx';
import { EmptyState } from '../../components/ui/empty-state.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { StateMark } from '../../components/ui/state-mark.tsx';
import type { Column } from '../../components/ui/table/column.ts';
import { Table } from '../../components/ui/table/table.tsx';
import { formatMoment } from '../../lib/format-date.ts';
import { PartyName } from '../parties/components/party-name.tsx';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { appointmentsQuery } from './api/list-appointments.ts';
import { APPOINTMENT_SHAPES } from './appointment-words.ts';
import { AppointmentDialog } from './components/appointment-dialog.tsx';
import { OfferDialog } from './components/offer-dialog.tsx';
import { BuildingLink } from '../buildings/components/building-link.tsx';

function columnsOf(schemeId: string): readonly Column<Appointment>[] {
  return [
    {
      id: 'when',
      heading: 'When',
      sortBy: ({ startsAt }) => startsAt,
      cell: ({ startsAt }) => <b className="font-semibold">{formatMoment(startsAt)}</b>,
    },
    {
      id: 'minutes',
      heading: 'Length',
      unit: 'min',
      holds: 'figure',
      spare: true,
      cell: ({ minutes }) => minutes,
    },
    {
      id: 'building',
      heading: 'Building',
      cell: ({ building }) => <BuildingLink {...{ schemeId, building }} />,
    },
    {
      id: 'party',
      heading: 'With',
      wide: true,
      cell: ({ party }) => <PartyName name={party.name} />,
    },
    { id: 'purpose', heading: 'What for', spare: true, cell: ({ purpose }) => capital(purpose) },
    {
      id: 'state',
      heading: 'State',
      spare: true,
      sortBy: ({ state }) => state,
      cell: ({ state }) => (
        <StateMark state={APPOINTMENT_SHAPES[state]}>{capital(state)}</StateMark>
      ),
    },
  ];
}

function AppointmentList({ schemeId, mayChange }: { schemeId: string; mayChange: boolean }) {
  const { data, error, refetch } = useQuery(appointmentsQuery(schemeId));
  const [openId, setOpenId] = useState<string>();
  const opened = data?.find(({ id }) => id === openId);
  if (error !== null) {
    return <QueryError what="Appointments" error={error} onRetry={() => void refetch()} />;
  }
  if (data === undefined) return <LoadingRows what="the appointments" />;
  if (data.length === 0) {
    return (
      <EmptyState>
        No appointments yet. Visits that are offered to owners stand here with their answers.
      </EmptyState>
    );
  }
  return (
    <>
      <Table
        label="Appointments"
        wide
        columns={columnsOf(schemeId)}
        rows={data}
        idOf={({ id }) => id}
        onOpen={({ id }) => {
          setOpenId(id);
        }}
      />
      {opened !== undefined && (
        <AppointmentDialog
          key={`${opened.id} ${opened.version}`}
          {...{ schemeId, mayChange, appointment: opened }}
          onClose={() => {
            setOpenId(undefined);
          }}
        />
      )}
    </>
  );
}

/** Visits that are offered to owners and agreed with them; those that wait for the team stand first. */
export function AppointmentsPage() {
  const scheme = useScheme();
  const [asks, setAsks] = useState(false);
  const mayRead = can(scheme, 'readMatters');
  const mayChange = can(scheme, 'answerMatters');
  return (
    <div className="p-8 max-sm:p-4">
      <PageTitle>{`Appointments of ${scheme.name}`}</PageTitle>
      <div className="mb-3 flex flex-wrap items-center justify-between gap-3">
        <h1 className="text-h3">Appointments</h1>
        {mayChange && (
          <Button
            onClick={() => {
              setAsks(true);
            }}
          >
            Offer one…
          </Button>
        )}
      </div>
      {mayRead ? (
        <AppointmentList schemeId={scheme.id} mayChange={mayChange} />
      ) : (
        <EmptyState>Appointments are for assessors and the administrator.</EmptyState>
      )}
      {asks && (
        <OfferDialog
          schemeId={scheme.id}
          onClose={() => {
            setAsks(false);
          }}
        />
      )}
    </div>
  );
}
