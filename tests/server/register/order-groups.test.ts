import { expect, test } from 'vitest';
import { orderGroups } from '../../../server/register/order-groups.ts';
import { packIds, unpackIds } from '../../../server/register/packed-ids.ts';

function packed(...ids: number[]): Buffer {
  return packIds(Int32Array.from(ids));
}

const REFERENCES = packed(9, 4, 7, 3, 5);
const GROUPS = { ids: packed(7, 9, 3, 4, 5), sizes: packed(2, 1, 2), unknown: 2 };

test('what is alike stands by reference, group by group', () => {
  expect([...unpackIds(orderGroups(GROUPS, REFERENCES, false))]).toEqual([9, 7, 3, 4, 5]);
});

test('the other way round the unknown ones stay last, and what is alike as it was', () => {
  expect([...unpackIds(orderGroups(GROUPS, REFERENCES, true))]).toEqual([3, 9, 7, 4, 5]);
  const known = { ...GROUPS, unknown: 0 };
  expect([...unpackIds(orderGroups(known, REFERENCES, true))]).toEqual([4, 5, 3, 9, 7]);
});

test('one that came in since follows those it is like', () => {
  const groups = { ids: packed(8, 9, 2, 7), sizes: packed(3, 1), unknown: 0 };
  expect([...unpackIds(orderGroups(groups, REFERENCES, false))]).toEqual([9, 8, 2, 7]);
});

test('none are none', () => {
  const none = { ids: packed(), sizes: packed(), unknown: 0 };
  expect(orderGroups(none, packed(), true)).toHaveLength(0);
});
