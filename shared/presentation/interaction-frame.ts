import type { BracketPoint } from '../assessment/bracket-points.ts';
import { beamStrains, type DeepBeam } from '../building/deep-beam.ts';
import type { StrainedZone } from '../building/strained-zone.ts';
import { CATEGORIES, type Category } from '../damage/categories.ts';
import { categoryOfStrain } from '../damage/category-of-strain.ts';
import { linearScale, type Scale } from './linear-scale.ts';
import { CENTRAL } from '../numerics/range.ts';

/**
 * Where the chart of deflection ratio against horizontal strain stands, in pixels.
 *
 * Units: pixels. Valid: read only. Source: [own].
 */
export const INTERACTION = { left: 48, right: 10, top: 10, height: 190, foot: 42 } as const;

/** As m/m; the chart shows at least so much, so that the lower categories are always seen. */
const LEAST = { horizontalStrain: 0.0012, deflectionRatio: 0.0008 } as const;
const ROOM_OVER_POINTS = 1.15;

/**
 * The ends of the chart and its scales, from m/m to pixels.
 *
 * Units: from, to and most m/m. Valid: made by `interactionFrame`. Source: [own].
 */
export type InteractionFrame = {
  readonly from: number;
  readonly to: number;
  readonly most: number;
  readonly across: Scale;
  readonly up: Scale;
};

type Strained = Pick<StrainedZone, 'horizontalStrain' | 'deflectionRatio'>;

/**
 * A chart that has room for all zones, `width` pixels wide.
 *
 * Units: width pixels. Valid: at least one zone. Source: [own].
 */
export function interactionFrame(zones: readonly Strained[], width: number): InteractionFrame {
  const strains = zones.map(({ horizontalStrain }) => horizontalStrain);
  const ratios = zones.map(({ deflectionRatio }) => deflectionRatio);
  const from = ROOM_OVER_POINTS * Math.min(0, ...strains);
  const to = Math.max(LEAST.horizontalStrain, ROOM_OVER_POINTS * Math.max(...strains));
  const most = Math.max(LEAST.deflectionRatio, ROOM_OVER_POINTS * Math.max(...ratios));
  return {
    from,
    to,
    most,
    across: linearScale([from, to], [INTERACTION.left, width - INTERACTION.right]),
    up: linearScale([0, most], [INTERACTION.top + INTERACTION.height, INTERACTION.top]),
  };
}

/** Whether a combination stands among the nine that are shown: no half-way value of K. */
function isOfNine({ troughWidth }: BracketPoint): boolean {
  return troughWidth % 2 === 0;
}

function isCentral({ volumeLoss, troughWidth }: BracketPoint): boolean {
  return volumeLoss === 'central' && troughWidth === CENTRAL;
}

/**
 * The combinations beside the central one whose zone bends like the governing one, and how many do not.
 *
 * Units: m/m. Valid: points of the wall whose zone it is. Source: [own].
 */
export function pointsBeside(points: readonly BracketPoint[], zone: StrainedZone) {
  const others = points.filter((point) => isOfNine(point) && !isCentral(point));
  const alike = others.filter((point) => point.zone.mode === zone.mode);
  return { alike, otherwise: others.length - alike.length };
}

const STEPS = 80;
/** A category that takes less of the way than so many steps has no room for its number. */
const ROOM_FOR_NUMBER = 5;

/**
 * Where the number of each category stands: in the middle of its stretch of the diagonal of the chart.
 *
 * Units: m/m. Valid: a category without room is left out. Source: [own].
 */
export function numberPlaces(
  { mode }: Pick<StrainedZone, 'mode'>,
  beam: DeepBeam,
  { from, to, most }: Pick<InteractionFrame, 'from' | 'to' | 'most'>,
): readonly { readonly category: Category; readonly at: Strained }[] {
  const start = Math.max(from, 0);
  const along = Array.from({ length: STEPS - 1 }, (_, k) => {
    const share = (k + 1) / STEPS;
    const at = { horizontalStrain: start + share * (to - start), deflectionRatio: share * most };
    const { strain } = beamStrains(mode, beam, at.deflectionRatio, at.horizontalStrain);
    return { category: categoryOfStrain(strain), at };
  });
  return CATEGORIES.flatMap(({ category }) => {
    const own = along.filter((one) => one.category === category);
    const middle = own[own.length >> 1];
    return own.length < ROOM_FOR_NUMBER || middle === undefined ? [] : [middle];
  });
}
