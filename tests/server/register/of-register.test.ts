import { expect, test } from 'vitest';
import { ofRegister, oneGroup } from '../../../server/register/of-register.ts';
import { packIds, unpackIds } from '../../../server/register/packed-ids.ts';

function packed(...ids: number[]): Buffer {
  return packIds(Int32Array.from(ids));
}

function plain({ ids, sizes, unknown }: ReturnType<typeof ofRegister>) {
  return { ids: [...unpackIds(ids)], sizes: [...unpackIds(sizes)], unknown };
}

test('what has left the register is left out, what was never found is not known', () => {
  const groups = { ids: packed(7, 9, 3, 4, 5), sizes: packed(2, 1, 2), unknown: 2 };
  expect(plain(ofRegister(groups, packed(9, 7, 4, 8, 6)))).toEqual({
    ids: [7, 9, 4, 8, 6],
    sizes: [2, 3],
    unknown: 3,
  });
});

test('where all is found and all is there, nothing changes', () => {
  const groups = { ids: packed(7, 9, 3), sizes: packed(2, 1), unknown: 0 };
  expect(plain(ofRegister(groups, packed(3, 7, 9)))).toEqual(plain(groups));
});

test('without a run nothing is known of anything', () => {
  const none = { ids: packed(), sizes: packed(), unknown: 0 };
  expect(plain(ofRegister(none, packed(2, 1)))).toEqual({ ids: [2, 1], sizes: [2], unknown: 2 });
});

test('one group holds all', () => {
  expect(plain(oneGroup(packed(5, 2)))).toEqual({ ids: [5, 2], sizes: [2], unknown: 0 });
});
