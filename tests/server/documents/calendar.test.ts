import { describe, expect, test } from 'vitest';
import { calendarText, type CalendarEvent } from '../../../server/documents/calendar.ts';

function text(overrides: Partial<CalendarEvent> = {}): string {
  return calendarText({
    uid: 'a1@example.org',
    sequence: 3,
    status: 'CONFIRMED',
    stamp: new Date('2026-12-02T07:08:09.123Z'),
    start: new Date('2027-06-09T10:00:00Z'),
    minutes: 90,
    summary: 'A visit',
    description: 'One line',
    location: '12 Fishgate',
    organizer: 'team@example.org',
    attendee: 'owner@example.org',
    ...overrides,
  });
}

/** What a calendar reads: lines unfolded, names apart from values. */
function properties(calendar: string): Map<string, string> {
  const lines = calendar.replaceAll('\r\n ', '').split('\r\n');
  return new Map(lines.map((line) => [line.slice(0, line.indexOf(':')), line.slice(line.indexOf(':') + 1)])); // prettier-ignore
}

/** The text that a value stands for, by 3.3.11. */
function unescaped(value: string): string {
  return value.replaceAll(/\\([\\;,nN])/g, (_, mark: string) =>
    mark.toLowerCase() === 'n' ? '\n' : mark,
  );
}

test('has what RFC 5545 asks of a calendar and an event, in order', () => {
  expect(text()).toBe(
    [
      'BEGIN:VCALENDAR',
      'VERSION:2.0',
      'PRODID:-//Groundsill//Appointments//EN',
      'CALSCALE:GREGORIAN',
      'METHOD:REQUEST',
      'BEGIN:VEVENT',
      'UID:a1@example.org',
      'SEQUENCE:3',
      'DTSTAMP:20261202T070809Z',
      'DTSTART:20270609T100000Z',
      'DTEND:20270609T113000Z',
      'SUMMARY:A visit',
      'DESCRIPTION:One line',
      'LOCATION:12 Fishgate',
      'STATUS:CONFIRMED',
      'ORGANIZER:mailto:team@example.org',
      'ATTENDEE:mailto:owner@example.org',
      'END:VEVENT',
      'END:VCALENDAR',
      '',
    ].join('\r\n'),
  );
});

test('a cancellation is a method and a state (RFC 5546, 3.2.5)', () => {
  const calendar = text({ status: 'CANCELLED' });
  expect(calendar).toContain('METHOD:CANCEL\r\n');
  expect(calendar).toContain('STATUS:CANCELLED\r\n');
});

describe('text', () => {
  test.each([
    ['commas, semicolons and backslashes', 'a, b; c\\n d'],
    ['line breaks', 'one\ntwo\n\nthree'],
    ['colons and quotes', 'at 10:00, "sharp"'],
    ['other letters', 'Größe 👩‍👩‍👧 \u202eevil'],
  ])('with %s comes back as it was', (_, words) => {
    const read = properties(text({ summary: words }));
    expect(unescaped(read.get('SUMMARY') ?? '')).toBe(words);
  });

  test('makes no property of its own', () => {
    const words = 'x\r\nATTENDEE:mailto:evil@example.org\rSTATUS:CANCELLED\u0000\u0007';
    const calendar = text({ summary: words, location: words, attendee: `o@example.org\r\nX:1` });
    const names = [...properties(calendar).keys()];
    expect(names.filter((name) => name === 'ATTENDEE')).toHaveLength(1);
    expect(names).not.toContain('X');
    expect(calendar).not.toMatch(/[^\r]\n|\r[^\n]|\u0000|\u0007/);
    expect(names).toEqual([...properties(text()).keys()]);
  });
});

test('lines have 75 octets at most and are folded between characters', () => {
  const description = '👩‍👩‍👧ö'.repeat(300);
  const calendar = text({ description, summary: 'x'.repeat(200) });
  for (const line of calendar.split('\r\n')) {
    expect(Buffer.byteLength(line)).toBeLessThanOrEqual(75);
    expect(line).not.toContain('\ufffd');
    expect(Buffer.from(line).toString()).toBe(line);
  }
  const read = properties(calendar);
  expect(read.get('DESCRIPTION')).toBe(description);
  expect(read.get('SUMMARY')).toBe('x'.repeat(200));
});
