import { describe, expect, test } from 'vitest';
import { parseNumber } from '../../../server/imports/parse-number.ts';
import { parseValue } from '../../../server/imports/parse-value.ts';

describe('parseNumber', () => {
  test.each([
    ['12', 12],
    [' 12.50 ', 12.5],
    ['12,5', 12.5],
    ['1.234,5', 1234.5],
    ['1,234.5', 1234.5],
    ['1,234,567', 1_234_567],
    ['1.234.567', 1_234_567],
    ['1 234,5', 1234.5],
    ['1\u00A0234', 1234],
    ['1\u202F234', 1234],
    ['1’234.5', 1234.5],
    ["12'345", 12_345],
    ['−3,2', -3.2],
    ['-0.5', -0.5],
    ['+4', 4],
    ['1e2', 100],
    ['.5', 0.5],
    ['12 m', 12],
    ['12,4m', 12.4],
    ['350 cm', 3.5],
    ['10 ft', 3.048],
    ['7 metres', 7],
  ])('reads %j', (text, value) => {
    expect(parseNumber(text, 'm')).toEqual({ value });
  });

  test.each(['', '  ', '-', '–', '?', 'n/a', 'N.A.', 'null', '<Null>', 'unknown', 'unbekannt', '#N/A'])(
    'takes %j for unknown',
    (text) => {
      expect(parseNumber(text, 'm')).toEqual({ value: null });
    },
  ); // prettier-ignore

  test.each(['many', '1 2', '12 34', '1,23,4', '1.2,3.4', '3 kg', '2+1', '1/2', '0x10', 'Infinity', '1e999', '12 storeys'])(
    'does not read %j',
    (text) => {
      expect(parseNumber(text, 'm')).toHaveProperty('fault');
    },
  ); // prettier-ignore

  test('says where a comma may have meant thousands', () => {
    expect(parseNumber('1,234', undefined)).toEqual({ value: 1.234, isCommaGuessed: true });
    expect(parseNumber('0,234', undefined)).toEqual({ value: 0.234 });
  });
});

describe('parseValue', () => {
  test.each([
    ['storeys', '3', 3],
    ['storeys', '3 floors', 3],
    ['storeys', 4, 4],
    ['eavesHeight', '7,5 m', 7.5],
    ['name', ' Old\nMill ', 'Old Mill'],
    ['name', '   ', null],
    ['name', 12, '12'],
    ['name', null, null],
    ['listedGrade', 'Ja', 'listed'],
    ['listedGrade', false, 'not listed'],
    ['listedGrade', 'II*', 'II*'],
    ['listedGrade', 1, '1'],
    ['inspected', 'yes', 'inside'],
    ['inspected', '0', 'not inspected'],
    ['use', true, 'yes'],
  ] as const)('reads %s %j', (field, raw, value) => {
    expect(parseValue(field, 'c', raw)).toEqual({ value });
  });

  test.each([
    ['storeys', 'ground', 'Storeys (column “c”): “ground” is no number. It is left as unknown, or as it was.'],
    ['storeys', '2.5', 'Storeys (column “c”): “2.5” is no whole number. It is left as unknown, or as it was.'],
    ['storeys', 0, 'Storeys (column “c”): “0” is not from 1 to 200. It is left as unknown, or as it was.'],
    ['eavesHeight', '7200', 'Eaves above ground (column “c”): “7200” is not from 0.5 to 500 m. It is left as unknown, or as it was.'],
    ['groundLevel', Number.NaN, 'Ground level (column “c”): “NaN” is no number. It is left as unknown, or as it was.'],
  ] as const)('says why %s %j was not read', (field, raw, remark) => {
    expect(parseValue(field, 'c', raw)).toEqual({ value: undefined, remark });
  }); // prettier-ignore

  test('cuts a text that is too long, and says so', () => {
    const { value, remark } = parseValue('address', 'c', 'x'.repeat(400));
    expect(value).toHaveLength(300);
    expect(remark).toContain('was cut');
  });
});
