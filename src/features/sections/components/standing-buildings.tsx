import { classNames } from '../../../lib/class-names.ts';
import type { AcrossLayout } from '../across-layout.ts';
import type { CutBuilding } from '../cut-buildings.ts';

type StandingBuildingsProps = {
  readonly layout: AcrossLayout;
  readonly buildings: readonly CutBuilding[];
  readonly selected: number | null;
};

/** A reference needs so much of a building's width and height, in pixels. */
const NAMED_FROM = { width: 40, height: 16 };

function titleOf({ reference, name, eavesHeight, isHeightAssumed }: CutBuilding): string {
  const called = name === null ? reference : `${reference} ${name}`;
  return `${called}, ${eavesHeight.toFixed(1)} m to the eaves${isHeightAssumed ? ', assumed' : ''}`;
}

/** Buildings where a section cuts them, at their true width and height; an assumed height is dotted. */
export function StandingBuildings({ layout, buildings, selected }: StandingBuildingsProps) {
  const { x, ground, pixelsPerMetre } = layout;
  return buildings.map((building) => {
    const [left, right] = [x(building.to), x(building.from)];
    const [width, height] = [right - left, building.eavesHeight * pixelsPerMetre];
    const isSelected = building.id === selected;
    const isNamed = width >= NAMED_FROM.width && height >= NAMED_FROM.height;
    return (
      <g key={`${building.id} ${building.from}`}>
        <title>{titleOf(building)}</title>
        <path
          d={`M${left} ${ground}v${-height}h${width}v${height}`}
          strokeWidth={isSelected ? 2 : 1}
          className={classNames('fill-bldg', isSelected ? 'stroke-select' : 'stroke-bldg-edge')}
        />
        {building.isHeightAssumed && (
          <path
            d={`M${left} ${ground - height}h${width}`}
            className="stroke-clay"
            strokeWidth="1.5"
            strokeDasharray="1.5 2.5"
          />
        )}
        {isNamed && (
          <text
            x={(left + right) / 2}
            y={ground - height / 2 + 3.5}
            textAnchor="middle"
            className="fill-ink-2 text-micro"
          >
            {building.reference}
          </text>
        )}
      </g>
    );
  });
}
