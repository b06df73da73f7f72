import { describe, expect, it } from 'vitest';
import { filesIn } from '../support/source-files.ts';
import { nameFaults } from './file-names.ts';

describe('names of files and folders', () => {
  it.each([
    'shared/Ground/x.ts',
    'shared/ground/levelField.ts',
    'shared/ground/level_field.ts',
    'shared/ground/level-field.old.ts',
    'shared/utils/x.ts',
    'server/date-helpers.ts',
    'src/misc.ts',
  ])('not %s', (file) => {
    expect(nameFaults([file])).toHaveLength(1);
  });

  it('are words in kebab case', () => {
    expect(nameFaults(['shared/ground/level-field.ts', 'tests/x/y.test.ts'])).toEqual([]);
    expect(nameFaults(filesIn('shared', 'server', 'src', 'scripts', 'tests'))).toEqual([]);
  });
});
