import { useId } from 'react';
import { hatchFill, HatchPatterns } from '../../../components/ui/hatch-patterns.tsx';
import { classNames } from '../../../lib/class-names.ts';
import { DAMAGE } from '../../../../shared/presentation/damage-style.ts';
import type { AcrossLayout } from '../across-layout.ts';
import { labelOf, type ShownBuilding } from '../shown-categories.ts';
import { StandingWords } from './standing-words.tsx';

type StandingBuildingsProps = {
  readonly layout: AcrossLayout;
  readonly buildings: readonly ShownBuilding[];
  readonly selected: number | null;
};

/** Of hatches, under which they would run together on a screen. */
const HATCH = 0.8;

function titleOf(building: ShownBuilding): string {
  const { reference, name, eavesHeight, isHeightAssumed } = building;
  const called = name === null ? reference : `${reference} ${name}`;
  const label = labelOf(building);
  const found = label === null ? '' : `, category ${label}`;
  return `${called}${found}, ${eavesHeight.toFixed(1)} m to the eaves${isHeightAssumed ? ', assumed' : ''}`;
}

/** Where a building stands in the drawing, in pixels. */
function frameOf({ x, ground, pixelsPerMetre }: AcrossLayout, building: ShownBuilding) {
  const [left, right] = [x(building.to), x(building.from)];
  const height = building.eavesHeight * pixelsPerMetre;
  return { left, right, width: right - left, height, middle: ground - height / 2 };
}

/**
 * Buildings where a section cuts them, at their true width and height, filled as the map fills them; an
 * assumed height is dotted.
 */
export function StandingBuildings({ layout, buildings, selected }: StandingBuildingsProps) {
  const prefix = useId();
  const { ground } = layout;
  return (
    <>
      <HatchPatterns prefix={prefix} scale={HATCH} />
      {buildings.map((building) => {
        const { id, from, category, isHeightAssumed } = building;
        const frame = frameOf(layout, building);
        const { left, width, height } = frame;
        const isSelected = id === selected;
        return (
          <g key={`${id} ${from}`}>
            <title>{titleOf(building)}</title>
            <path
              d={`M${left} ${ground}v${-height}h${width}v${height}`}
              strokeWidth={isSelected ? 2 : 1}
              {...(category !== null && {
                fill: hatchFill(prefix, category),
                stroke: DAMAGE[category].edge,
              })}
              className={classNames(
                category === null && 'fill-bldg',
                isSelected ? 'stroke-select' : category === null && 'stroke-bldg-edge',
              )}
            />
            {isHeightAssumed && (
              <path
                d={`M${left} ${ground - height}h${width}`}
                className="stroke-clay"
                strokeWidth="1.5"
                strokeDasharray="1.5 2.5"
              />
            )}
            <StandingWords building={building} frame={frame} />
          </g>
        );
      })}
    </>
  );
}
