import data from '../../../../shared/checks/data/wall-square-to-drive.json' with { type: 'json' };
import { LIMITS } from '../../../../shared/schemas/limits.ts';

/** A figure that the reader may change, in the unit that people write it in. */
export type WhatIfField = {
  readonly name: string;
  readonly label: string;
  readonly unit: string;
  /** What it is at the start: the wall of the check. */
  readonly start: string;
  readonly least: number;
  readonly most: number;
  /** Whether the least itself is too little. */
  readonly isOver?: boolean;
};

const SQUARE = 90;
/** In metres: farther than any trough of a drive of this depth reaches. */
const FARTHEST = 500;
const LONGEST_WALL = 500;
const DEEPEST_AXIS = 100;

function field(
  name: string,
  label: string,
  unit: string,
  start: number,
  limits: readonly [least: number, most: number],
  isOver = false,
) {
  const [least, most] = limits;
  return { name, label, unit, start: String(start), least, most, isOver };
}

const { wall, diameter, axisDepth, troughWidth } = data;
const volumeLoss = Number((data.volumeLoss * 100).toPrecision(12));
const LOSS = [0, LIMITS.volumeLoss * 100] as const;
const WIDTH = [0, LIMITS.troughWidth] as const;

/** The volume loss and K of the start are those of the check with as much below as above. */
const [LOSS_BESIDE, WIDTH_BESIDE] = [0.5, 0.1];

/** All figures, by the short name that they have in the address. */
export const WHAT_IF_FIELDS = {
  lossLow: field('vl', 'Low', '%', volumeLoss - LOSS_BESIDE, LOSS),
  lossCentral: field('v', 'Central', '%', volumeLoss, LOSS),
  lossHigh: field('vh', 'High', '%', volumeLoss + LOSS_BESIDE, LOSS),
  widthLow: field('kl', 'Low', '', troughWidth - WIDTH_BESIDE, WIDTH, true),
  widthCentral: field('k', 'Central', '', troughWidth, WIDTH, true),
  widthHigh: field('kh', 'High', '', troughWidth + WIDTH_BESIDE, WIDTH, true),
  diameter: field('d', 'Diameter', 'm', diameter, [0, LIMITS.diameter], true),
  axisDepth: field('z0', 'Axis depth', 'm', axisDepth, [0, DEEPEST_AXIS], true),
  distance: field('y', 'From the axis', 'm', wall.from, [-FARTHEST, FARTHEST]),
  length: field('l', 'Length', 'm', wall.to - wall.from, [LIMITS.wallLength, LONGEST_WALL]),
  angle: field('a', 'Angle to drive', '°', SQUARE, [-SQUARE, SQUARE]),
  height: field('h', 'Height', 'm', wall.height, [0, LIMITS.height], true),
  founding: field('z', 'Founding depth', 'm', 0, [0, DEEPEST_AXIS]),
  eOverG: field('eg', 'E/G', '', wall.eOverG, [0, LIMITS.eOverG], true),
  poisson: field('nu', 'Poisson’s ratio', '', wall.poisson, [0, LIMITS.poisson]),
} as const satisfies Record<string, WhatIfField>;

/** The name of a figure. */
export type WhatIfName = keyof typeof WHAT_IF_FIELDS;

function isName(name: string): name is WhatIfName {
  return name in WHAT_IF_FIELDS;
}

/** The names of all figures. */
export const WHAT_IF_NAMES: readonly WhatIfName[] = Object.keys(WHAT_IF_FIELDS).filter(isName);

/** What stands in the fields, as it is written. */
export type WhatIfDraft = Readonly<Record<WhatIfName, string>>;

/** The same as numbers, in the units of the fields. */
export type WhatIfInputs = Readonly<Record<WhatIfName, number>>;

/** What is wrong, beside the field where it is. */
export type WhatIfFaults = Readonly<Partial<Record<WhatIfName, string>>>;

/** Something for each figure. */
export function forEachFigure<T>(make: (name: WhatIfName) => T): Record<WhatIfName, T> {
  return {
    lossLow: make('lossLow'),
    lossCentral: make('lossCentral'),
    lossHigh: make('lossHigh'),
    widthLow: make('widthLow'),
    widthCentral: make('widthCentral'),
    widthHigh: make('widthHigh'),
    diameter: make('diameter'),
    axisDepth: make('axisDepth'),
    distance: make('distance'),
    length: make('length'),
    angle: make('angle'),
    height: make('height'),
    founding: make('founding'),
    eOverG: make('eOverG'),
    poisson: make('poisson'),
  };
}
