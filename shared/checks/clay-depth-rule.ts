import { troughWidth } from '../ground/trough-width.ts';
import { checkRow, type Check } from './check.ts';
import data from './data/clay-depth-rule.json' with { type: 'json' };

const AXIS_DEPTH = 20;
const LAST_DIGIT = 0.0005;

/**
 * The trough width parameter below the surface in clay, K(z) = i/h.
 *
 * Units: none. Valid: K = 0.5 at the surface. Source: mair-taylor-bracegirdle-1993.
 */
export const clayDepthRule: Check = {
  id: 'clay-depth-rule',
  name: 'Trough width parameter with depth in clay',
  source: 'mair-taylor-bracegirdle-1993',
  provenance: `${data.where}: ${data.provenance}`,
  run: () =>
    data.rows.map((row) => {
      const depth = row.depthShare * AXIS_DEPTH;
      const levels = { ground: 0, founding: -depth, axis: -AXIS_DEPTH };
      const width = troughWidth({ kind: 'clay' }, data.troughWidth, levels);
      const name = `K at z/z0 = ${row.depthShare}`;
      return checkRow(name, '', row.troughWidth, width / (AXIS_DEPTH - depth), LAST_DIGIT);
    }),
};
