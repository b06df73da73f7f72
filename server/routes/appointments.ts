import {
  answerAppointmentSchema,
  appointmentParamsSchema,
  appointmentsQuerySchema,
  changeAppointmentSchema,
  newAppointmentSchema,
} from '../../shared/schemas/appointments.ts';
import { answerAppointment } from '../commands/answer-appointment.ts';
import { changeAppointment } from '../commands/change-appointment.ts';
import { readAppointment } from '../commands/kept-appointment.ts';
import { offerAppointment } from '../commands/offer-appointment.ts';
import { appointmentCalendar } from '../mail/letters/appointment-mails.ts';
import { findAppointments } from '../models/appointments.ts';
import { findOwn } from '../models/find-own.ts';
import { presentAppointment, presentOwnAppointment } from '../presenters/appointment.ts';
import { defineRoute } from './define-route.ts';

const teamRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/appointments',
    access: { scheme: 'readMatters' },
    query: appointmentsQuerySchema,
    handle: async ({ services, scheme, query }) =>
      (await findAppointments(services.database, scheme.id, query)).map(presentAppointment),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/appointments',
    access: { scheme: 'answerMatters' },
    body: newAppointmentSchema,
    handle: async ({ services, actor, scheme, body, res }) => {
      const { appointment, isNew } = await offerAppointment(services, actor, scheme, body);
      res.status(isNew ? 201 : 200).json(presentAppointment(appointment));
    },
  }),
  defineRoute({
    method: 'patch',
    path: '/api/schemes/:schemeId/appointments/:appointmentId',
    access: { scheme: 'answerMatters' },
    params: appointmentParamsSchema,
    body: changeAppointmentSchema,
    handle: async ({ services, actor, scheme, params, body }) => {
      const asked = { ...body, id: params.appointmentId };
      return presentAppointment(await changeAppointment(services, actor, scheme, asked));
    },
  }),
];

const ownRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/own/appointments',
    access: { scheme: 'readOwnBuildings' },
    handle: async ({ services: { database }, actor, scheme }) => {
      const { parties } = await findOwn(database, scheme.id, actor.id);
      return (await findAppointments(database, scheme.id, { parties })).map(presentOwnAppointment);
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/own/appointments/:appointmentId/answer',
    access: { scheme: 'answerAsOwner' },
    params: appointmentParamsSchema,
    body: answerAppointmentSchema,
    handle: async ({ services, actor, scheme, params, body }) => {
      const answer = { ...body, id: params.appointmentId };
      return presentOwnAppointment(await answerAppointment(services, actor, scheme, answer));
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/own/appointments/:appointmentId/calendar',
    access: { scheme: 'readOwnBuildings' },
    params: appointmentParamsSchema,
    handle: async ({ services: { database, env }, actor, scheme, params, res }) => {
      const { parties } = await findOwn(database, scheme.id, actor.id);
      const which = { id: params.appointmentId, parties };
      const appointment = await readAppointment(database, scheme.id, which);
      const { PUBLIC_URL: publicUrl, MAIL_FROM: mailFrom } = env;
      const sender = { schemeId: scheme.id, publicUrl, mailFrom, now: new Date() };
      res.set('Content-Disposition', 'attachment; filename="appointment.ics"');
      res.type('text/calendar; charset=utf-8').send(appointmentCalendar(appointment, sender));
    },
  }),
];

export const appointmentRoutes = [...teamRoutes, ...ownRoutes];
