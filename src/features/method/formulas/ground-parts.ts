import { widthFormula, type TakeFormula } from './example-lines.ts';
import { formula } from './formula.ts';
import type { MethodFormula, MethodPart } from './formula-parts.ts';

function movementFormulas(take: TakeFormula): readonly MethodFormula[] {
  const own = 'attewell-woodman-1982';
  return [
    take('V_s', undefined, 'V_L * pi'),
    take('s'),
    take('y'),
    take('A'),
    take('B', 'distance from the end of the part in trough widths'),
    take('S_part', 'settlement from one part of the drive'),
    formula(
      'S_s',
      'V_s / (2 * pi * i^2) * exp(-y^2 / (2 * i^2)) * (exp(-A^2 / 2) - exp(-B^2 / 2))',
      'slope along the drive from one part',
      'm/m',
      own,
    ),
    formula('S_y', '-y / i^2 * S_part', 'slope across the drive from one part', 'm/m', own),
    take('m_part'),
    take('u_part'),
    formula(
      'S_ss',
      'V_s / (2 * pi * i^3) * exp(-y^2 / (2 * i^2)) * (B * exp(-B^2 / 2) - A * exp(-A^2 / 2))',
      'curvature along the drive from one part',
      '1/m',
      own,
    ),
    formula(
      'S_yy',
      '(y^2 / i^2 - 1) * S_part / i^2',
      'curvature across the drive from one part',
      '1/m',
      own,
    ),
    formula('S_sy', '-y / i^2 * S_s', 'twist from one part', '1/m', own),
    formula(
      'κ',
      't_s^2 * S_ss + 2 * t_s * t_y * S_sy + t_y^2 * S_yy',
      'curvature along a wall',
      '1/m',
      'own',
    ),
    formula(
      'ε_t',
      'i^2 / f * κ',
      'horizontal strain along a wall from one part, tension positive',
      'm/m',
      'own',
    ),
  ];
}

function movement(take: TakeFormula): MethodPart {
  return {
    id: 'movement',
    title: 'Ground movement of a drive',
    words:
      'The drive is cut into short straight parts. Each part makes a trough: across it the settlement follows a bell curve, along it grows where the part begins and ends with it. All parts are added. One sum so serves curves in plan, gradients, ends and a moving face.',
    formulas: movementFormulas(take),
    limits: [
      'The volume loss V_L is a fraction here and per cent on screens. D is the excavated diameter. Cover is not axis depth.',
      'Parts are so short that halving them moves the settlement by under 0.1 % and 0.01 mm.',
      'A wall founded below the crown of a drive beside it is refused. Within one diameter of the crown, or with less than one diameter of cover, the answer carries a warning.',
      'Joining parts into one chain is worked out here; on a straight drive it is the closed form of the source.',
    ],
  };
}

function depth(take: TakeFormula): MethodPart {
  return {
    id: 'depth',
    title: 'Depth and trough width',
    words:
      'How wide the trough is where the wall is founded. The rule is chosen for each scheme and kept with its results.',
    formulas: [
      take('z0'),
      take('z'),
      take('h'),
      { ...widthFormula('clay'), meaning: 'trough width in clay, K growing with depth' },
      { ...widthFormula('constant'), meaning: 'trough width with K the same at every depth' },
      {
        ...widthFormula('oreilly-new-clay'),
        meaning: 'trough width straight from the depth, clay',
      },
      {
        ...widthFormula('oreilly-new-sand'),
        meaning: 'trough width straight from the depth, sand and gravel',
      },
      { ...widthFormula('layered'), meaning: 'trough width through layers' },
    ],
    limits: [
      'Clay: published for K = 0.5; for any other K it is common practice. It holds for K of 0.4 and more.',
      'Straight from the depth: clay for axes 3 to 34 m deep, sand and gravel for 6 to 10 m. They are no K, so that the bracket has volume loss only. Below ground level they go on by common practice.',
      'A trough width of nothing or less is refused beside a drive and left out farther off.',
    ],
  };
}

function focus(take: TakeFormula): MethodPart {
  return {
    id: 'focus',
    title: 'Where the ground moves to',
    words:
      'The ground moves towards a point: the axis of the drive, or a point below it. That turns settlement into horizontal movement.',
    formulas: [
      take('f', 'height of the founding level above the axis', 'founding - axis'),
      take(
        'f',
        'height of the founding level above a point below the axis; c is 0.175/0.325',
        '1 + c',
      ),
    ],
    limits: [
      'The point below the axis takes 35 % off the strain at the surface. It is meant for the clay rule with K between 0.4 and 0.6, and warns elsewhere.',
    ],
  };
}

function face(): MethodPart {
  return {
    id: 'face',
    title: 'The moving face',
    words:
      'Up to its face a drive acts, beyond it not yet. Where less than half of the settlement has happened above the face, the end that acts lies behind it.',
    formulas: [
      formula(
        'x_end',
        'x_face + i * Φinv(p)',
        'chainage up to which the drive acts, i at the face',
        'm',
        'own',
      ),
    ],
    limits: [
      'Half at an open face; 25 to 30 % at a closed one (Mair and Taylor 1997). The shift is worked out here.',
      'A drive without a face, or with its face at its end, is complete.',
      'A wall along a drive is strained by the moving face only.',
    ],
  };
}

function several(take: TakeFormula): MethodPart {
  return {
    id: 'several',
    title: 'Several drives',
    words: 'Movements are added, never strains and never categories.',
    formulas: [
      formula('S', 'S_1 + S_2', 'settlement from all drives', 'm', 'new-oreilly-1991'),
      formula('u', 'u_1 + u_2', 'horizontal movement from all drives', 'm', 'new-oreilly-1991'),
      take('V_s', 'volume of the trough of a later drive', 'F * V_L'),
    ],
    limits: [
      'The factor F of a later drive, 1 to 1.6, is common practice. It is said wherever its results are.',
    ],
  };
}

/** What the ground does, in the order of the work. */
export function groundParts(take: TakeFormula): readonly MethodPart[] {
  return [movement(take), depth(take), focus(take), face(), several(take)];
}
