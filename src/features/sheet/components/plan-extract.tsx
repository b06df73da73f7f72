import { useQuery } from '@tanstack/react-query';
import { useId } from 'react';
import { footprintMiddle } from '../../../../shared/building/footprint-middle.ts';
import type { BuildingSheet } from '../../../../shared/assessment/sheet-of-building.ts';
import type { PlanPoint } from '../../../../shared/geometry/point.ts';
import type { RunBuilding, RunDetail } from '../../../../shared/schemas/runs.ts';
import { millimetresFromMetres } from '../../../../shared/units/millimetres-from-metres.ts';
import { pathOf } from '../../../components/chart/path-of.ts';
import { hatchFill, HatchPatterns } from '../../../components/ui/hatch-patterns.tsx';
import { useWidth } from '../../../hooks/use-width.ts';
import { runContoursQuery } from '../../runs/api/get-run-contours.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { outlinesQuery } from '../../sections/api/list-outlines.ts';
import {
  labelPlace,
  letterPlace,
  planFrame,
  type PlanFrame,
} from '../../../../shared/presentation/plan-frame.ts';

type PlanExtractProps = {
  readonly schemeId: string;
  readonly run: RunDetail;
  readonly building: RunBuilding;
  readonly sheet: BuildingSheet;
  /** The wall that is opened. */
  readonly index: number;
};

type Rings = readonly (readonly (readonly PlanPoint[])[])[];

function ringsPath(frame: PlanFrame, parts: Rings): string {
  return parts
    .flat()
    .map((ring) => `${pathOf(ring.map(frame.place))}Z`)
    .join('');
}

function Neighbours({ frame, buildingId }: { frame: PlanFrame; buildingId: number }) {
  const { id, registerVersion } = useScheme();
  const { data = [] } = useQuery(outlinesQuery(id, registerVersion, frame.box));
  return (
    <g className="fill-bldg stroke-bldg-edge print:fill-sheet" strokeWidth=".8">
      {data
        .filter((one) => one.id !== buildingId)
        .map((one) => (
          <path key={one.id} d={ringsPath(frame, one.footprint)} fillRule="evenodd" />
        ))}
    </g>
  );
}

function Contours({
  frame,
  schemeId,
  runId,
}: {
  frame: PlanFrame;
  schemeId: string;
  runId: string;
}) {
  const { data = [] } = useQuery(runContoursQuery(schemeId, runId));
  return (
    <g>
      {data.map(({ level, line }, k) => {
        const label = labelPlace(frame, line);
        return (
          <g key={k}>
            <path
              d={pathOf(line.map(frame.place))}
              fill="none"
              className="stroke-contour"
              strokeWidth={level === 0.01 ? 1.6 : 0.9}
            />
            {label !== null && (
              <text
                x={label[0]}
                y={label[1]}
                textAnchor="middle"
                className="fill-contour stroke-paper text-micro"
                strokeWidth="3"
                paintOrder="stroke"
              >
                {millimetresFromMetres(level)} mm
              </text>
            )}
          </g>
        );
      })}
    </g>
  );
}

function Drives({ frame, sheet }: { frame: PlanFrame; sheet: BuildingSheet }) {
  return (
    <g fill="none" className="stroke-ink" strokeWidth="1.2" strokeDasharray="9 3 2 3">
      {sheet.inputs.model.drives.map(({ name, axis }) => (
        <path key={name} d={pathOf(axis.map(([e, n]) => frame.place([e, n])))} />
      ))}
    </g>
  );
}

function Walls({ frame, sheet, index }: { frame: PlanFrame; sheet: BuildingSheet; index: number }) {
  const { prepared, strain } = sheet;
  const opened = strain?.walls[index];
  const middle = footprintMiddle([prepared.rings]);
  return (
    <g>
      {prepared.walls.map(({ name, segment }, k) => {
        const isOpen = opened?.wallIndex === k;
        const [[x1, y1], [x2, y2]] = [frame.place(segment.start), frame.place(segment.end)];
        const [x, y] = letterPlace(frame, segment, middle);
        return (
          <g key={name}>
            <path
              d={`M${x1} ${y1}L${x2} ${y2}`}
              className={isOpen ? 'stroke-clay' : 'stroke-ink'}
              strokeWidth={isOpen ? 4 : 1.4}
            />
            <circle
              cx={x}
              cy={y}
              r="8"
              className={isOpen ? 'fill-clay' : 'fill-paper stroke-ink'}
            />
            <text
              x={x}
              y={y + 3.5}
              textAnchor="middle"
              className={isOpen ? 'fill-paper text-micro' : 'fill-ink text-micro'}
            >
              {name}
            </text>
          </g>
        );
      })}
      {opened?.joined === true && (
        <path
          d={pathOf([frame.place(opened.wall.segment.start), frame.place(opened.wall.segment.end)])}
          fill="none"
          className="stroke-clay"
          strokeWidth="1.6"
          strokeDasharray="5 3"
        />
      )}
    </g>
  );
}

const SCALE_BAR = 10;

function ScaleBar({ frame }: { readonly frame: PlanFrame }) {
  const { pixelsPerMetre, width, height } = frame;
  const end = width - 10;
  const start = end - SCALE_BAR * pixelsPerMetre;
  return (
    <g>
      <path
        d={`M${start} ${height - 14}v4H${end}v-4`}
        fill="none"
        className="stroke-ink"
        strokeWidth="1.2"
      />
      <text
        x={(start + end) / 2}
        y={height - 16}
        textAnchor="middle"
        className="fill-ink text-micro"
      >
        {SCALE_BAR} m
      </text>
    </g>
  );
}

/** The building in plan with its walls by letter, the drives and the run's contours; north is up. */
export function PlanExtract({ schemeId, run, building, sheet, index }: PlanExtractProps) {
  const prefix = useId();
  const { width, frame: box } = useWidth(300, 300);
  const { facts, result } = building;
  const frame = planFrame(facts.parts, width);
  return (
    <div ref={box} className="mt-2">
      <svg
        viewBox={`0 0 ${frame.width} ${frame.height}`}
        width="100%"
        role="img"
        aria-label={`${facts.reference} in plan with its walls by letter, north up, about 1 to ${frame.denominator}`}
        className="block border border-ink"
      >
        <HatchPatterns prefix={prefix} />
        <Neighbours frame={frame} buildingId={Number(facts.id)} />
        <path
          d={ringsPath(frame, facts.parts)}
          fillRule="evenodd"
          {...(result.category === null
            ? { className: 'fill-sheet' }
            : { fill: hatchFill(prefix, result.category) })}
        />
        <Contours frame={frame} schemeId={schemeId} runId={run.id} />
        <Drives frame={frame} sheet={sheet} />
        <Walls frame={frame} sheet={sheet} index={index} />
        <ScaleBar frame={frame} />
      </svg>
    </div>
  );
}
