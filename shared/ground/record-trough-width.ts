import type { ReferenceKey } from '../references.ts';
import type { Recorder } from '../working.ts';
import type { Levels } from './levels.ts';
import type { TroughWidthRule } from './trough-width-rule.ts';
import { troughWidth } from './trough-width.ts';

const EXPRESSIONS = {
  constant: 'K * h',
  clay: 'K * z0 - 0.325 * z',
  'oreilly-new-clay': '0.43 * z0 + 1.1 - 0.325 * z',
  'oreilly-new-sand': '(0.28 * z0 - 0.1) * h / z0',
  layered: 'K_mean * h',
} as const satisfies Record<TroughWidthRule['kind'], string>;

const REFERENCES = {
  constant: 'oreilly-new-1982',
  clay: 'mair-taylor-bracegirdle-1993',
  'oreilly-new-clay': 'oreilly-new-1982',
  'oreilly-new-sand': 'oreilly-new-1982',
  layered: 'new-oreilly-1991',
} as const satisfies Record<TroughWidthRule['kind'], ReferenceKey>;

/**
 * The working of a trough width: depths, rule, numbers and result.
 *
 * Units: m. Valid: as `troughWidth`; the K of layers is shown as their mean. Source: as `troughWidth`.
 */
export function recordTroughWidth(
  rule: TroughWidthRule<number>,
  troughWidthParameter: number,
  levels: Levels,
  record: Recorder,
): void {
  const { ground, founding, axis } = levels;
  const depths = { z0: ground - axis, z: ground - founding, h: founding - axis };
  const width = troughWidth(rule, troughWidthParameter, levels);
  record({
    symbol: 'z0',
    meaning: 'depth of the axis below ground level',
    expression: 'ground - axis',
    inputs: { ground, axis },
    value: depths.z0,
    unit: 'm',
    reference: 'own',
  });
  record({
    symbol: 'z',
    meaning: 'depth of the founding level below ground level',
    expression: 'ground - founding',
    inputs: { ground, founding },
    value: depths.z,
    unit: 'm',
    reference: 'own',
  });
  record({
    symbol: 'h',
    meaning: 'height of the founding level above the axis',
    expression: 'z0 - z',
    inputs: { z0: depths.z0, z: depths.z },
    value: depths.h,
    unit: 'm',
    reference: 'own',
  });
  record({
    symbol: 'i',
    meaning: `trough width at the founding level, rule "${rule.kind}"`,
    expression: EXPRESSIONS[rule.kind],
    inputs:
      rule.kind === 'layered'
        ? { ...depths, K_mean: width / depths.h }
        : { ...depths, K: troughWidthParameter },
    value: width,
    unit: 'm',
    reference: REFERENCES[rule.kind],
  });
}
