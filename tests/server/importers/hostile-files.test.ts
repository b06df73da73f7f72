import { expect, test } from 'vitest';
import { HOSTILE_FILES } from '../../../scripts/bench/hostile/hostile-files.ts';
import { refusalOf } from '../../support/upload-of.ts';

const MAKING_TAKES = 60_000;

test.each(HOSTILE_FILES)(
  'is refused with words: $name',
  async ({ make, says }) => {
    expect(await refusalOf(await make())).toMatch(says);
  },
  MAKING_TAKES,
);
