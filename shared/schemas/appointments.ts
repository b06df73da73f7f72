import { z } from 'zod';
import { writtenLine } from './written.ts';

/**
 * What an appointment at a building is for.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const APPOINTMENT_PURPOSES = ['condition survey', 'access'] as const;

/**
 * Where an appointment stands.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const APPOINTMENT_STATES = [
  'offered',
  'agreed',
  'another day asked for',
  'cancelled',
  'done',
] as const;

/**
 * Where an appointment stands.
 *
 * Units: none. Valid: of APPOINTMENT_STATES. Source: [own].
 */
export type AppointmentState = (typeof APPOINTMENT_STATES)[number];

/**
 * How long an appointment and its words may be.
 *
 * Units: minutes for least and most, letters for texts, pieces for days. Valid: read only. Source: [own].
 */
export const APPOINTMENT_LIMITS = {
  least: 5,
  most: 1440,
  place: 300,
  note: 1000,
  days: 3,
} as const;

const when = {
  startsAt: z.iso.datetime({ offset: true, error: 'Give a day and a time.' }),
  minutes: z
    .number('Write a number.')
    .int('Write a whole number.')
    .min(APPOINTMENT_LIMITS.least, `At least ${APPOINTMENT_LIMITS.least} minutes.`)
    .max(APPOINTMENT_LIMITS.most, `At most ${APPOINTMENT_LIMITS.most} minutes.`),
  place: writtenLine(APPOINTMENT_LIMITS.place).min(1, 'Say where it is.'),
  isFreeDayMeant: z.boolean(),
};

/**
 * An appointment as the team offers it to a party at a building, numbered by the browser so that sending it
 * twice offers it once.
 *
 * Units: minutes; startsAt with an offset. Valid: the party has an interest in the building; the time is to
 * come, on a working day of the scheme unless `isFreeDayMeant`. Source: [own].
 */
export const newAppointmentSchema = z.strictObject({
  id: z.uuid(),
  buildingId: z.number().int().min(1).max(2_147_483_647),
  partyId: z.uuid(),
  purpose: z.enum(APPOINTMENT_PURPOSES),
  ...when,
});

/**
 * An appointment as the team offers it.
 *
 * Units: as newAppointmentSchema. Valid: parsed by it. Source: [own].
 */
export type NewAppointment = z.infer<typeof newAppointmentSchema>;

/**
 * A change of an appointment by the team, on top of the version that was seen: another time or place, which
 * offers it anew, or its end.
 *
 * Units: as newAppointmentSchema. Valid: an older version is refused; one that is over stays so.
 * Source: [own].
 */
export const changeAppointmentSchema = z.discriminatedUnion('change', [
  z.strictObject({ change: z.literal('offer anew'), version: z.number().int().min(1), ...when }),
  z.strictObject({ change: z.literal('cancel'), version: z.number().int().min(1) }),
  z.strictObject({ change: z.literal('done'), version: z.number().int().min(1) }),
]);

/**
 * A change of an appointment by the team.
 *
 * Units: as changeAppointmentSchema. Valid: parsed by it. Source: [own].
 */
export type ChangeAppointment = z.infer<typeof changeAppointmentSchema>;

const askedDay = z.strictObject({ day: z.iso.date(), part: z.enum(['morning', 'afternoon']) });

const version = z.number().int().min(1);

/**
 * What an owner answers to an appointment that is offered: agreed, or other days that would do.
 *
 * Units: days. Valid: one to three days to come, none twice; an older version is refused. Source: [own].
 */
export const answerAppointmentSchema = z.discriminatedUnion('answer', [
  z.strictObject({ version, answer: z.literal('agree') }),
  z.strictObject({
    version,
    answer: z.literal('another day'),
    days: z
      .array(askedDay)
      .min(1, 'Choose at least one day.')
      .max(APPOINTMENT_LIMITS.days, `At most ${APPOINTMENT_LIMITS.days} days.`)
      .refine(
        (days) => new Set(days.map(({ day, part }) => `${day} ${part}`)).size === days.length,
        'One is there twice.',
      ),
    note: writtenLine(APPOINTMENT_LIMITS.note),
  }),
]);

/**
 * What an owner answers to an appointment.
 *
 * Units: as answerAppointmentSchema. Valid: parsed by it. Source: [own].
 */
export type AnswerAppointment = z.infer<typeof answerAppointmentSchema>;

/**
 * The address of an appointment.
 *
 * Units: none. Valid: an appointment of the scheme. Source: [own].
 */
export const appointmentParamsSchema = z.object({
  schemeId: z.string(),
  appointmentId: z.uuid(),
});

const askedForSchema = z.strictObject({ days: z.array(askedDay), note: z.string() });

/**
 * The days that an owner asked for.
 *
 * Units: days. Valid: parsed by answerAppointmentSchema. Source: [own].
 */
export type AskedFor = z.infer<typeof askedForSchema>;

const shape = {
  id: z.uuid(),
  building: z.strictObject({
    id: z.number(),
    reference: z.string(),
    name: z.string().nullable(),
    address: z.string().nullable(),
  }),
  purpose: z.enum(APPOINTMENT_PURPOSES),
  startsAt: z.iso.datetime(),
  minutes: z.number(),
  place: z.string(),
  state: z.enum(APPOINTMENT_STATES),
  askedFor: askedForSchema.nullable(),
  version: z.number(),
  changedAt: z.iso.datetime(),
};

/**
 * An appointment as the owner reads it.
 *
 * Units: minutes. Valid: askedFor only while another day is asked for. Source: [own].
 */
export const ownAppointmentSchema = z.strictObject(shape);

/**
 * An appointment as the owner reads it.
 *
 * Units: as ownAppointmentSchema. Valid: parsed by it. Source: [own].
 */
export type OwnAppointment = z.infer<typeof ownAppointmentSchema>;

/**
 * An owner's appointments, in order of time.
 *
 * Units: as ownAppointmentSchema. Valid: at most 500. Source: [own].
 */
export const ownAppointmentsSchema = z.array(ownAppointmentSchema);

/**
 * An appointment as the team reads it.
 *
 * Units: as ownAppointmentSchema. Valid: isMailed tells whether changes reach the party by e-mail.
 * Source: [own].
 */
export const appointmentSchema = z.strictObject({
  ...shape,
  party: z.strictObject({ id: z.uuid(), name: z.string() }),
  isMailed: z.boolean(),
  createdBy: z.string(),
});

/**
 * An appointment as the team reads it.
 *
 * Units: as appointmentSchema. Valid: parsed by it. Source: [own].
 */
export type Appointment = z.infer<typeof appointmentSchema>;

/**
 * The appointments of a scheme or of a building: those that wait for the team first, then by time.
 *
 * Units: as appointmentSchema. Valid: at most 1,000. Source: [own].
 */
export const appointmentsSchema = z.array(appointmentSchema);

/**
 * Which appointments are asked for: all of a scheme, or those of one building.
 *
 * Units: none. Valid: any building's number. Source: [own].
 */
export const appointmentsQuerySchema = z.object({
  building: z.coerce.number().int().min(1).max(2_147_483_647).optional(),
});
