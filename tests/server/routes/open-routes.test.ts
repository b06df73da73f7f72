import { expect, test } from 'vitest';
import { ROUTES } from '../../../server/routes/index.ts';

/** What anybody may call. A route comes onto this list only with a reason. */
const OPEN = [
  'get /api/session',
  'post /api/session',
  'post /api/password-resets',
  'get /api/links/:token',
  'post /api/links/:token',
];

test('no other route is open to who is not signed in', () => {
  const open = ROUTES.filter(({ access }) => access === 'anyone');
  expect(open.map(({ method, path }) => `${method} ${path}`)).toEqual(OPEN);
});

test('whoever guesses at an open route is counted, except for reading the session', () => {
  const uncounted = ROUTES.filter(({ access, limit }) => access === 'anyone' && !limit);
  expect(uncounted.map(({ method, path }) => `${method} ${path}`)).toEqual(['get /api/session']);
});

test('no route is declared twice', () => {
  const titles = ROUTES.map(({ method, path }) => `${method} ${path.replaceAll(/:\w+/g, ':')}`);
  expect(titles).toEqual([...new Set(titles)]);
});
