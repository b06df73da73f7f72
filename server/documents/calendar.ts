/** An appointment as a calendar takes it in. */
export type CalendarEvent = {
  /** Stays the same through all changes: a calendar finds its own entry by it. */
  readonly uid: string;
  /** Grows with every change. */
  readonly sequence: number;
  readonly status: 'TENTATIVE' | 'CONFIRMED' | 'CANCELLED';
  /** When this text was made. */
  readonly stamp: Date;
  readonly start: Date;
  readonly minutes: number;
  readonly summary: string;
  readonly description: string;
  readonly location: string;
  readonly organizer: string;
  readonly attendee: string;
};

const LINE_OCTETS = 75;
const MINUTE_MS = 60_000;

function moment(time: Date): string {
  return `${time.toISOString().slice(0, 19).replaceAll(/[-:]/g, '')}Z`;
}

/** Text of a property: RFC 5545, 3.3.11. Other control characters than line breaks are not allowed in it. */
function escaped(text: string): string {
  return text
    .replaceAll(/\r\n?/g, '\n')
    .replaceAll(/[\\;,]/g, '\\$&')
    .replaceAll('\n', '\\n')
    .replaceAll(/\p{Cc}/gu, ' ');
}

/** A mail address behind mailto:, with nothing in it that could end the line. */
function mailto(address: string): string {
  return `mailto:${address.replaceAll(/[\p{Cc}\s]/gu, '')}`;
}

/** Folds a line so that none is longer than 75 octets, never within a character: RFC 5545, 3.1. */
function folded(line: string): string {
  const lines: string[] = [];
  let current = '';
  let octets = 0;
  for (const character of line) {
    const size = Buffer.byteLength(character);
    if (octets + size > LINE_OCTETS) {
      lines.push(current);
      current = ' ';
      octets = 1;
    }
    current += character;
    octets += size;
  }
  return [...lines, current].join('\r\n');
}

/** The text of an appointment for calendars (RFC 5545), as a request or, where it is called off, a cancellation. */
export function calendarText(event: CalendarEvent): string {
  const { uid, sequence, status, stamp, start, minutes } = event;
  const end = new Date(start.getTime() + minutes * MINUTE_MS);
  const lines = [
    'BEGIN:VCALENDAR',
    'VERSION:2.0',
    'PRODID:-//Groundsill//Appointments//EN',
    'CALSCALE:GREGORIAN',
    `METHOD:${status === 'CANCELLED' ? 'CANCEL' : 'REQUEST'}`,
    'BEGIN:VEVENT',
    `UID:${escaped(uid)}`,
    `SEQUENCE:${sequence}`,
    `DTSTAMP:${moment(stamp)}`,
    `DTSTART:${moment(start)}`,
    `DTEND:${moment(end)}`,
    `SUMMARY:${escaped(event.summary)}`,
    `DESCRIPTION:${escaped(event.description)}`,
    `LOCATION:${escaped(event.location)}`,
    `STATUS:${status}`,
    `ORGANIZER:${mailto(event.organizer)}`,
    `ATTENDEE:${mailto(event.attendee)}`,
    'END:VEVENT',
    'END:VCALENDAR',
  ];
  return `${lines.map(folded).join('\r\n')}\r\n`;
}
