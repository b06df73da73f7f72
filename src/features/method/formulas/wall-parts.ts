import type { TakeFormula } from './example-lines.ts';
import type { MethodPart } from './formula-parts.ts';
import { formula } from './formula.ts';

function zones(take: TakeFormula): MethodPart {
  return {
    id: 'zones',
    title: 'A wall and its zones',
    words:
      'A wall follows the ground. It is split where its curvature changes sign: sagging where κ is under 0, hogging where it is over 0. What settles by less than the rules say is ignored at the ends of a zone.',
    formulas: [
      take('Δ'),
      take('DL'),
      take('ε_avg'),
      take('ε_peak'),
      take('ε_h', 'horizontal strain that counts, compression counted', 'ε_c'),
      take('ε_h', 'horizontal strain that counts, compression taken as zero', 'max'),
      take('tilt'),
      take('angular distortion', 'largest departure of the slope from the tilt'),
    ],
    limits: [
      'Settlement ignored below 1 mm is common practice; what lies beyond 2.5 trough widths of every drive is the other rule (Mair, Taylor and Burland 1996).',
      'A zone is at least 0.5 m long. The chord is that of the zone, not of the wall.',
      'Compression is not tension: a horizontal strain keeps its sign.',
      'Houses of a row that share a wall are also taken together, each with its own height and stiffness; the worse counts.',
    ],
  };
}

function deepBeam(take: TakeFormula): MethodPart {
  return {
    id: 'deep-beam',
    title: 'Deep beam',
    words:
      'Each zone is a deep beam bent to its deflection ratio and stretched by its horizontal strain. Sagging bends about mid-height, hogging about the base.',
    formulas: [
      take('I', 'second moment of area per unit width, sagging', '12'),
      take('I', 'second moment of area per unit width, hogging', '/ 3'),
      take('t', 'distance from the neutral axis to the tension fibre, sagging', '2'),
      {
        ...take('t'),
        expression: 'H',
        meaning: 'distance from the neutral axis to the tension fibre, hogging',
      },
      take('r_b'),
      take('r_d'),
      take('ε_bt'),
      take('ε_dt'),
      take('ε', 'largest tensile strain of the zone'),
      formula(
        'DL',
        'min(r_b * (ε_lim - ε_h), r_d * sqrt((ε_lim - ε_h) * (ε_lim + ν * ε_h)))',
        'deflection ratio at which a zone reaches a limiting strain: the curves of the chart',
        'm/m',
        'own',
      ),
    ],
    limits: [
      'E/G is 2.6 for masonry with ν = 0.3, 12.5 for frames, 0.5 for brickwork with little strength in tension.',
      'The wall is taken as whole: no openings, joints or earlier cracks.',
    ],
  };
}

function category(take: TakeFormula): MethodPart {
  return {
    id: 'category',
    title: 'Category',
    words:
      'The largest tensile strain of any zone gives the damage category; the table below has the limits.',
    formulas: [take('category')],
    limits: ['A strain on a limit belongs to the higher category. Strain cannot tell 4 from 5.'],
  };
}

function rankin(take: TakeFormula): MethodPart {
  return {
    id: 'rankin',
    title: 'Rankin’s class',
    words:
      'Beside the category, by slope and settlement, the worse of the two: Rankin negligible, slight, moderate, high.',
    formulas: [take('Rankin', 'steps above Rankin negligible')],
    limits: ['Always by name, never by number: it is no damage category.'],
  };
}

/** What the movement does to a wall, in the order of the work. */
export function wallParts(take: TakeFormula): readonly MethodPart[] {
  return [zones(take), deepBeam(take), category(take), rankin(take)];
}
