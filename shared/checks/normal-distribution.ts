import { errorFunction } from '../numerics/error-function.ts';
import { normalDistribution } from '../numerics/normal-distribution.ts';
import { checkRow, type Check } from './check.ts';
import data from './data/normal-distribution.json' with { type: 'json' };

const TOLERANCE = 1e-14;

/**
 * The error function and the normal distribution against a general-purpose library.
 *
 * Units: none. Valid: 1e-14. Source: abramowitz-stegun-1964.
 */
export const normalDistributionCheck: Check = {
  id: 'normal-distribution',
  name: 'Error function and normal distribution',
  source: 'abramowitz-stegun-1964',
  provenance: `${data.where}: ${data.provenance}`,
  run: () =>
    data.rows.flatMap((row) => [
      checkRow(`erf(${row.x})`, '', row.erf, errorFunction(row.x), TOLERANCE),
      checkRow(`Φ(${row.x})`, '', row.distribution, normalDistribution(row.x), TOLERANCE),
    ]),
};
