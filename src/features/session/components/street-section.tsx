import { useId } from 'react';
import { HatchPatterns, hatchFill } from '../../../components/ui/hatch-patterns.tsx';
import { DAMAGE } from '../../../../shared/presentation/damage-style.ts';
import { HOUSES, outlineOf, SECTION, troughPath, type House } from '../street-section.ts';

function HouseInSection({ house, prefix }: { readonly house: House; readonly prefix: string }) {
  return (
    <path
      d={outlineOf(house)}
      fill={hatchFill(prefix, house.category)}
      stroke={DAMAGE[house.category].edge}
      strokeWidth="1"
    />
  );
}

/** A street over two drives, in section, with the trough under it drawn many times too deep. */
export function StreetSection() {
  const prefix = useId();
  const { width, top, height, ground, drives } = SECTION;
  return (
    <svg
      viewBox={`0 ${top} ${width} ${height}`}
      className="min-h-0 w-full flex-1 max-md:h-auto max-md:max-h-[210px]"
      aria-hidden="true"
    >
      <HatchPatterns prefix={prefix} scale={1.2} />
      {HOUSES.map((house) => (
        <HouseInSection key={house.from} house={house} prefix={prefix} />
      ))}
      <path d={`M0 ${ground}H${width}`} className="stroke-rule" strokeDasharray="6 4" />
      <path d={troughPath(1.4)} className="fill-none stroke-band-line" strokeDasharray="4 3" />
      <path d={troughPath(0.62)} className="fill-none stroke-band-line" strokeDasharray="1.5 3" />
      <path d={troughPath(1)} className="fill-none stroke-ink" strokeWidth="2.2" />
      {drives.map(({ x, y, radius }) => (
        <g key={x} className="fill-none stroke-ink">
          <circle cx={x} cy={y} r={radius} strokeWidth="1.8" className="fill-paper" />
          <path
            d={`M${x - radius - 8} ${y}H${x + radius + 8}M${x} ${y - radius - 8}V${y + radius + 8}`}
            strokeWidth=".8"
            strokeDasharray="9 3 2 3"
          />
          <path
            d={`M${x} ${ground}V${y - radius - 8}`}
            strokeWidth=".6"
            strokeDasharray="9 3 2 3"
          />
        </g>
      ))}
    </svg>
  );
}
