import { describe, expect, it } from 'vitest';
import { assessCaseSchema } from '../../../../shared/schemas/assess-case.ts';
import {
  readDraft,
  readLeftOut,
  whatIfPath,
} from '../../../../src/features/method/what-if/what-if-address.ts';
import { caseOfInputs } from '../../../../src/features/method/what-if/case-of-inputs.ts';
import { readInputs } from '../../../../src/features/method/what-if/read-inputs.ts';
import type { WhatIfDraft } from '../../../../src/features/method/what-if/what-if-fields.ts';
import { workWhatIf } from '../../../../src/features/method/what-if/work-what-if.ts';

const START = readDraft(new URLSearchParams());

function worked(changes: Partial<WhatIfDraft> = {}) {
  const answer = workWhatIf({ ...START, ...changes });
  if (answer.kind !== 'worked') throw new Error(JSON.stringify(answer.faults));
  return answer;
}

function faults(changes: Partial<WhatIfDraft>) {
  const answer = workWhatIf({ ...START, ...changes });
  return answer.kind === 'faults' ? answer.faults : {};
}

describe('the start', () => {
  it('gives the published figures of the wall square to a drive', () => {
    const { zones, strain } = worked().opened.result;
    const [sagging, hogging] = zones;
    expect(sagging?.end.toFixed(0)).toBe('8');
    expect(hogging?.end.toFixed(3)).toBe('21.784');
    expect(((hogging?.deflectionRatio ?? 0) * 100).toFixed(5)).toBe('0.01139');
    expect(((hogging?.horizontalStrain ?? 0) * 100).toFixed(4)).toBe('0.0286');
    expect((strain * 100).toFixed(5)).toBe('0.03788');
  });

  it('is a case that the command takes', () => {
    const { asked } = worked({ lossLow: '0,7', angle: '0' });
    expect(assessCaseSchema.parse(asked)).toEqual(asked);
    expect(asked.drives[0]?.volumeLoss).toEqual([0.007, 0.015, 0.02]);
    expect(asked.walls[0]?.to).toEqual([26, 2]);
  });
});

describe('the address', () => {
  it('keeps what was changed and nothing else', () => {
    expect(whatIfPath(START)).toBe('/method/what-if');
    const path = whatIfPath({ ...START, lossHigh: '3', founding: 'x' });
    expect(path).toBe('/method/what-if?vh=3&z=x');
    const search = new URLSearchParams(path.split('?')[1]);
    expect(readDraft(search)).toEqual({ ...START, lossHigh: '3', founding: 'x' });
    expect(readLeftOut(search)).toBeNull();
  });

  it('says of a wall of a sheet what is left out of it, if anything', () => {
    const search = (path: string) => new URLSearchParams(path.split('?')[1]);
    expect(readLeftOut(search(whatIfPath(START, [])))).toEqual([]);
    const path = whatIfPath({ ...START, angle: '-30' }, ['drives', 'rules']);
    expect(readLeftOut(search(path))).toEqual(['drives', 'rules']);
    expect(readDraft(search(path))).toEqual({ ...START, angle: '-30' });
    expect(readLeftOut(search('?sheet=rules.toString.drives.rules'))).toEqual(['drives', 'rules']);
  });
});

describe('a wall', () => {
  it('leads away from the drive on the side on which it begins', () => {
    const read = readInputs({ ...START, distance: '-4', angle: '30', length: '10' });
    if (read.kind === 'faults') throw new Error('The figures do not fit.');
    expect(caseOfInputs(read.inputs).walls[0]?.to).toEqual([8.660254, -9]);
    // towards it, and across
    const turned = { ...read.inputs, angle: -30 };
    expect(caseOfInputs(turned).walls[0]?.to).toEqual([8.660254, 1]);
  });

  it('along the drive is not strained once it is complete, and warns', () => {
    const { result } = worked({ angle: '0' }).opened;
    expect(result.zones).toEqual([]);
    expect(result.warnings).toContain('flat along the wall');
  });
});

describe('what is wrong', () => {
  it.each([
    [{ diameter: '' }, 'diameter', 'A figure is missing.'],
    [{ diameter: 'six' }, 'diameter', 'This is no number.'],
    [{ diameter: '0' }, 'diameter', 'More than 0\u00a0m.'],
    [{ lossHigh: '21' }, 'lossHigh', 'At most 20\u00a0%.'],
    [{ angle: '-91' }, 'angle', 'At least \u221290\u00a0°.'],
    [{ lossLow: '1.6' }, 'lossLow', 'Not over the central value.'],
    [{ widthHigh: '0.45' }, 'widthHigh', 'Not under the central value.'],
    [
      { founding: '18' },
      'founding',
      'The crown of the drive is 17\u00a0m below ground. The wall has to be founded above it.',
    ],
    [{ diameter: '10', axisDepth: '4' }, 'axisDepth', 'The crown of the drive is above ground.'],
    [
      { founding: '16', widthLow: '0.2', diameter: '2' },
      'widthLow',
      'This K gives no trough width at the depth where the wall is founded.',
    ],
  ] as const)('is said beside the field: %o', (changes, field, words) => {
    expect(faults(changes)).toEqual({ [field]: words });
  });
});
