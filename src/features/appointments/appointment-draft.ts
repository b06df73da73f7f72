import type { Appointment, AskedFor } from '../../../shared/schemas/appointments.ts';

/** When and where, as it is written: until it is read a day and a time of the clock here. */
export type WhenDraft = {
  readonly day: string;
  readonly time: string;
  readonly minutes: string;
  readonly place: string;
  /** That it is on a weekend or a holiday on purpose. */
  readonly isFreeDayMeant: boolean;
};

/** Times that a part of a day is begun with. */
const BEGINS = { morning: '09:30', afternoon: '14:00' } as const;

export const NO_TIME: WhenDraft = {
  day: '',
  time: '10:00',
  minutes: '60',
  place: 'At the building',
  isFreeDayMeant: false,
};

function twoDigits(value: number): string {
  return String(value).padStart(2, '0');
}

/** When and where an appointment is, as it would be written again. */
export function draftOfAppointment({ startsAt, minutes, place }: Appointment): WhenDraft {
  const at = new Date(startsAt);
  return {
    day: `${at.getFullYear()}-${twoDigits(at.getMonth() + 1)}-${twoDigits(at.getDate())}`,
    time: `${twoDigits(at.getHours())}:${twoDigits(at.getMinutes())}`,
    minutes: String(minutes),
    place,
    isFreeDayMeant: false,
  };
}

/** A draft with a day that an owner asked for. */
export function onAskedDay(draft: WhenDraft, asked: AskedFor['days'][number]): WhenDraft {
  return { ...draft, day: asked.day, time: BEGINS[asked.part], isFreeDayMeant: false };
}

/** What a draft comes to, as it is sent; what is missing is left for the schema to find. */
export function whenOf({ day, time, minutes, place, isFreeDayMeant }: WhenDraft) {
  const at = new Date(`${day}T${time}`);
  return {
    startsAt: Number.isNaN(at.getTime()) ? '' : at.toISOString(),
    minutes: minutes.trim() === '' ? NaN : Number(minutes),
    place,
    isFreeDayMeant,
  };
}
