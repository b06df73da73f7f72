import { useId } from 'react';
import type { OpenedWall } from '../../../../shared/assessment/open-wall.ts';
import type { DeepBeam } from '../../../../shared/building/deep-beam.ts';
import type { StrainedZone } from '../../../../shared/building/strained-zone.ts';
import { CATEGORIES } from '../../../../shared/damage/categories.ts';
import { hatchFill, HatchPatterns } from '../../../components/ui/hatch-patterns.tsx';
import { useWidth } from '../../../hooks/use-width.ts';
import { percentWords } from '../../../../shared/presentation/bracket-words.ts';
import {
  INTERACTION,
  interactionFrame,
  numberPlaces,
  pointsBeside,
  type InteractionFrame,
} from '../../../../shared/presentation/interaction-frame.ts';
import { Axes, CategoryNumber, Regions } from './interaction-parts.tsx';

type Opened = Pick<OpenedWall, 'result' | 'points' | 'wall'>;

function beamOf({ wall }: Opened, { start, end }: StrainedZone): DeepBeam {
  const { height, eOverG, poisson } = wall;
  return { length: end - start, height, eOverG: eOverG.central, poisson };
}

function Points({
  opened,
  zone,
  frame,
}: {
  opened: Opened;
  zone: StrainedZone;
  frame: InteractionFrame;
}) {
  const { alike } = pointsBeside(opened.points, zone);
  const { across, up } = frame;
  return (
    <>
      {alike.map(({ volumeLoss, troughWidth, zone: other }) => (
        <circle
          key={`${volumeLoss} ${troughWidth}`}
          cx={across(other.horizontalStrain)}
          cy={up(other.deflectionRatio)}
          r="3.2"
          strokeWidth="1.2"
          className="fill-sheet stroke-ink"
        />
      ))}
      <circle
        cx={across(zone.horizontalStrain)}
        cy={up(zone.deflectionRatio)}
        r="5.2"
        strokeWidth="1.8"
        className="fill-ink stroke-sheet"
      />
    </>
  );
}

function Chart({ opened, zone }: { readonly opened: Opened; readonly zone: StrainedZone }) {
  const prefix = useId();
  const { width, frame: box } = useWidth(320, 560);
  const beam = beamOf(opened, zone);
  const { alike, otherwise } = pointsBeside(opened.points, zone);
  const frame = interactionFrame([zone, ...alike.map((point) => point.zone)], width);
  const words = `Deflection ratio ${percentWords(zone.deflectionRatio, 4)} against horizontal strain ${percentWords(zone.horizontalStrain, 4)}: category ${CATEGORIES[opened.result.category]?.label ?? ''}.`;
  return (
    <div ref={box}>
      <svg
        viewBox={`0 0 ${width} ${INTERACTION.top + INTERACTION.height + INTERACTION.foot}`}
        width="100%"
        role="img"
        aria-label={words}
        className="block"
      >
        <HatchPatterns prefix={prefix} scale={0.9} />
        <clipPath id={`${prefix}-clip`}>
          <rect
            x={INTERACTION.left}
            y={INTERACTION.top}
            width={width - INTERACTION.left - INTERACTION.right}
            height={INTERACTION.height}
          />
        </clipPath>
        <g clipPath={`url(#${prefix}-clip)`}>
          <rect width={width} height="300" fill={hatchFill(prefix, 4)} />
          <Regions {...{ zone, beam, frame, prefix }} />
        </g>
        {numberPlaces(zone, beam, frame).map(({ category, at }) => (
          <CategoryNumber
            key={category}
            category={category}
            x={frame.across(at.horizontalStrain)}
            y={frame.up(at.deflectionRatio)}
          />
        ))}
        <Points {...{ opened, zone, frame }} />
        <Axes frame={frame} width={width} />
      </svg>
      <p className="mt-1 text-cap text-ink-2">
        Curves for the governing zone, {zone.mode}, {beam.length.toFixed(1)} m long. Rings are the
        rest of the nine; their zones differ in length, so that one may lie beside its own curve.
        {otherwise > 0 && ` ${otherwise} bend the other way and are not drawn.`}
      </p>
    </div>
  );
}

/** Deflection ratio against horizontal strain, with the categories of the deep beam behind. */
export function InteractionChart({ opened }: { readonly opened: Opened }) {
  const zone = opened.result.zones[opened.result.governingZone];
  if (zone === undefined) {
    return (
      <p className="py-2 text-small text-ink-2">
        The wall is not affected: it has no zone to draw.
      </p>
    );
  }
  return <Chart opened={opened} zone={zone} />;
}
