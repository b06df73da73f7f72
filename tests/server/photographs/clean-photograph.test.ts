import { describe, expect, test } from 'vitest';
import { cleanPhotograph } from '../../../server/photographs/clean-photograph.ts';
import { aJpeg, aPng, aWebp, SECRET_PLACE } from '../../support/photographs.ts';

const KINDS = [
  ['JPEG', 'image/jpeg', aJpeg],
  ['PNG', 'image/png', aPng],
  ['WebP', 'image/webp', aWebp],
] as const;

describe.each(KINDS)('a %s', (_, type, make) => {
  test('is told by what it holds', () => {
    expect(cleanPhotograph(make(), false).type).toBe(type);
  });

  test('loses what tells where it was taken, and words', () => {
    const { bytes } = cleanPhotograph(make(), false);
    expect(bytes.includes(SECRET_PLACE)).toBe(false);
    expect(cleanPhotograph(bytes, false).bytes.equals(bytes)).toBe(true);
  });

  test('keeps it with consent, in one place only', () => {
    const { bytes } = cleanPhotograph(make(), true);
    const first = bytes.indexOf(SECRET_PLACE);
    expect(first).toBeGreaterThan(0);
    expect(bytes.indexOf(SECRET_PLACE, first + 1)).toBe(-1);
  });

  test('ends where the picture ends', () => {
    const { bytes } = cleanPhotograph(make({ after: '<script>alert(1)</script>' }), true);
    expect(bytes.includes('script')).toBe(false);
    expect(bytes.equals(cleanPhotograph(make(), true).bytes)).toBe(true);
  });

  test('that breaks off anywhere is refused, and never read beyond its end', () => {
    const whole = make();
    for (let length = 12; length < whole.length; length += 1) {
      const cut = whole.subarray(0, length);
      expect(() => cleanPhotograph(cut, false)).toThrow(/^The photograph is damaged/);
    }
  });
});

test('colours and drawing of a JPEG stay to the last byte', () => {
  const { bytes } = cleanPhotograph(aJpeg(), false);
  expect(bytes.includes('ICC_PROFILE\0colours')).toBe(true);
  expect(bytes.includes('seen')).toBe(false);
  const scan = Buffer.from([0x12, 0xff, 0x00, 0x34, 0xff, 0xd0, 0x56, 0xff, 0xd9]);
  expect(bytes.subarray(-scan.length).equals(scan)).toBe(true);
});

test('a WebP says in its flags what is left', () => {
  const flagsOf = (keepsPlace: boolean) => cleanPhotograph(aWebp(), keepsPlace).bytes[20];
  expect([flagsOf(false), flagsOf(true)]).toEqual([0x20, 0x28]);
});

test('what claims to be longer than it is, is refused', () => {
  const png = aPng();
  png.writeUInt32BE(0xffffffff, 8);
  const webp = aWebp();
  webp.writeUInt32LE(0xffffffff, 16);
  const jpeg = aJpeg();
  jpeg.writeUInt16BE(0xffff, 4);
  for (const bytes of [png, webp, jpeg]) {
    expect(() => cleanPhotograph(bytes, false)).toThrow(/^The photograph is damaged/);
  }
});

test.each([
  ['nothing', ''],
  ['a page', '<!doctype html><title>x</title>'],
  ['a drawing', '<svg xmlns="http://www.w3.org/2000/svg"><script>1</script></svg>'],
  ['a GIF', 'GIF89a\x01\0\x01\0'],
  ['another RIFF', 'RIFF\x04\0\0\0WAVE'],
])('%s is no photograph', (_, text) => {
  expect(() => cleanPhotograph(Buffer.from(text, 'latin1'), false)).toThrow(
    'This is no photograph: only JPEG, PNG and WebP pictures are taken.',
  );
});
