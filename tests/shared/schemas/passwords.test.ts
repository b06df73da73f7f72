import { describe, expect, test } from 'vitest';
import { emailSchema, isOwnEmail, newPasswordSchema } from '../../../shared/schemas/passwords.ts';

describe('emailSchema', () => {
  test.each([
    ['ada@example.org', 'ada@example.org'],
    [' Ada@Example.ORG ', 'ada@example.org'],
    ['ada+quay@mail.example.org', 'ada+quay@mail.example.org'],
  ])('takes %j as %s', (given, wanted) => {
    expect(emailSchema.parse(given)).toBe(wanted);
  });

  test.each([
    '',
    'ada',
    'ada@',
    'ada@example.org, eve@example.org',
    'ada@example.org\r\nBcc: eve@example.org',
    'Ada <ada@example.org>',
    `${'a'.repeat(250)}@example.org`,
    7,
    undefined,
  ])('does not take %j', (given) => {
    expect(emailSchema.safeParse(given).success).toBe(false);
  });
});

describe('newPasswordSchema', () => {
  test.each([
    [11, false],
    [12, true],
    [200, true],
    [201, false],
  ])('of %i characters: %s', (length, isTaken) => {
    expect(newPasswordSchema.safeParse('x'.repeat(length)).success).toBe(isTaken);
  });

  test('keeps spaces: they are part of it', () => {
    expect(newPasswordSchema.parse('  harbour wall  ')).toBe('  harbour wall  ');
  });
});

describe('isOwnEmail', () => {
  test.each([
    ['ada@example.org', true],
    [' ADA@example.org ', true],
    ['ada@example.org!', false],
    ['harbour wall at low tide', false],
  ])('%j: %s', (password, isOwn) => {
    expect(isOwnEmail(password, 'ada@example.org')).toBe(isOwn);
  });
});
