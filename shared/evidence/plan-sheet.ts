import { drivesOfDesign } from '../assessment/drives-of-design.ts';
import { boundingBox } from '../geometry/bounding-box.ts';
import { footprintMiddle } from '../building/footprint-middle.ts';
import { offsetPolyline } from '../geometry/offset-polyline.ts';
import type { PlanPoint } from '../geometry/point.ts';
import {
  categoryLabels,
  CATEGORY_SIZE,
  nameLabels,
  NAME_SIZE,
  type LabelledBuilding,
} from './building-labels.ts';
import {
  chainageLabels,
  CHAINAGE_SIZE,
  chainageTicks,
  type ChainageTick,
} from './chainage-marks.ts';
import { contourLabels, CONTOUR_SIZE } from './contour-labels.ts';
import { gridMarks } from './grid-marks.ts';
import type { GroundFrame } from './ground-frame.ts';
import { labelBoxOf, labelCorners, type LabelBox } from './label-box.ts';
import { lineMark, type Mark, type Measure, type Spot } from './marks.ts';
import { placeLabels, type Placement } from './place-labels.ts';
import {
  categoryShown,
  type PlanBuilding,
  type PlanMaterial,
  type ShownEnd,
} from './plan-material.ts';
import { northBox, northMarks, scaleBarBox, scaleBarMarks } from './plan-signs.ts';

/**
 * What a plan shows: which end of the bracket, and what is written beside its buildings.
 *
 * Units: none. Valid: any. Source: [own].
 */
export type PlanContent = {
  readonly end: ShownEnd;
  readonly names: 'none' | 'references' | 'addresses';
  readonly hasContours: boolean;
  readonly hasBackground: boolean;
};
