import type { AssessCase } from '../../../../shared/schemas/assess-case.ts';
import type { WhatIfInputs } from './what-if-fields.ts';

/** In metres each way: the drive goes on far beyond the reach of its trough. */
const HALF_LENGTH = 3000;

/** Coordinates to the micrometre, so that a right angle is one. */
function rounded(metres: number): number {
  return Number(metres.toFixed(6)) + 0;
}

/** Per cent as a fraction, through the text, so that 1.5 % is 0.015 and nothing beside it. */
function fraction(percent: number): number {
  return Number(`${percent}e-2`);
}

/** Where a wall ends that begins beside the middle of the drive. */
function farEnd({ distance, length, angle }: WhatIfInputs): [number, number] {
  const turned = (angle * Math.PI) / 180;
  // it leads away from the drive on the side on which it begins, or towards it where the angle is negative
  const side = distance < 0 ? -1 : 1;
  return [rounded(length * Math.cos(turned)), rounded(distance + side * length * Math.sin(turned))];
}

/** One straight level drive and one wall, as a case that `assess` takes as well. Ground level is 0. */
export function caseOfInputs(inputs: WhatIfInputs): AssessCase {
  const { axisDepth, diameter, distance, founding, height, eOverG, poisson } = inputs;
  const level = -axisDepth;
  return {
    groundLevel: 0,
    drives: [
      {
        name: 'drive',
        axis: [
          [-HALF_LENGTH, 0, level],
          [HALF_LENGTH, 0, level],
        ],
        diameter,
        volumeLoss: [
          fraction(inputs.lossLow),
          fraction(inputs.lossCentral),
          fraction(inputs.lossHigh),
        ],
        troughWidth: [inputs.widthLow, inputs.widthCentral, inputs.widthHigh],
      },
    ],
    walls: [
      {
        name: 'wall',
        from: [0, distance],
        to: farEnd(inputs),
        foundingLevel: 0 - founding,
        height,
        eOverG,
        poisson,
      },
    ],
  };
}
