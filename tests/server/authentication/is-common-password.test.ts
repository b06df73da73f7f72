import { expect, test } from 'vitest';
import { isCommonPassword } from '../../../server/authentication/is-common-password.ts';

test.each([
  'password1234',
  'P@ssw0rd2026!',
  'passwordpassword',
  '123456789012',
  'qwertyuiop[]'.replace('[]', 'as'),
  'aaaaaaaaaaaa',
  'abcabcabcabc',
  '1q2w3e4r5t6y',
  'Welcome-2026-12',
])('"%s" is among the first that anybody tries', (password) => {
  expect(isCommonPassword(password)).toBe(true);
});

test.each([
  'harbour wall at low tide',
  'groundsill-demo',
  'the password of the gate keeper',
  'mole-otter-nine-barges',
])('"%s" is not', (password) => {
  expect(isCommonPassword(password)).toBe(false);
});
