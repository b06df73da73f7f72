import { beamStrains } from '../building/deep-beam.ts';
import { categoryOfStrain } from '../damage/category-of-strain.ts';
import { checkRow, type Check } from './check.ts';
import data from './data/bitetti-categories.json' with { type: 'json' };

const HEIGHT = 10;
const POISSON = 0.3;
/** A category is a whole number: any other is wrong. */
const SAME = 0.5;

/**
 * Twelve published walls from their shape and strains to their category.
 *
 * Units: categories. Valid: hogging; Poisson's ratio 0.3. Source: bitetti-2010.
 */
export const bitettiCategories: Check = {
  id: 'bitetti-categories',
  name: 'Category of twelve walls from deflection ratio and horizontal strain',
  source: 'bitetti-2010',
  provenance: `${data.where}: ${data.provenance}`,
  run: () =>
    data.rows.map((row, index) => {
      const { eOverG, lengthByHeight, horizontalStrain, deflectionRatio, category } = row;
      const beam = { length: lengthByHeight * HEIGHT, height: HEIGHT, eOverG, poisson: POISSON };
      const { strain } = beamStrains(
        'hogging',
        beam,
        deflectionRatio / 100,
        horizontalStrain / 100,
      );
      const name = `wall ${index + 1}: L/H ${lengthByHeight}, E/G ${eOverG}`;
      return checkRow(name, 'category', category, categoryOfStrain(strain), SAME);
    }),
};
