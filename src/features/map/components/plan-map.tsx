import { useRef } from 'react';
import { ErrorNote } from '../../../components/ui/error-note.tsx';
import type { CameraBounds } from '../camera.ts';
import type { MapHandle } from '../map-handle.ts';
import type { MapPlan } from '../map-plan.ts';
import { useOpenMap } from '../hooks/use-open-map.ts';
import { OpenPlanMap } from './open-plan-map.tsx';

export type PlanMapProps = {
  readonly plan: MapPlan;
  /** What the map is called for who hears it. */
  readonly label: string;
  /** What the map shows at first and when it is fitted. */
  readonly home: CameraBounds;
  /** The scheme's grid for proj4. */
  readonly gridDefinition: string;
  readonly selected: number | null;
  readonly onSelect: (buildingId: number | null) => void;
  /** Gives the page its way to move the map, and null when the map goes. */
  readonly onHandle: (handle: MapHandle | null) => void;
};

/** The map of a scheme: draws the plan, selects, moves by pointer and keys. */
export function PlanMap(props: PlanMapProps) {
  const frame = useRef<HTMLDivElement>(null);
  const opened = useOpenMap(frame, props.label, props.home);
  return (
    <div className="relative size-full overflow-hidden bg-land">
      {/* the map library makes it relative */}
      <div ref={frame} className="size-full" />
      {opened.state === 'open' && <OpenPlanMap {...props} map={opened.map} />}
      {opened.state === 'impossible' && (
        <div className="absolute inset-x-4 top-4">
          <ErrorNote
            failed="This browser cannot draw the map."
            stands="It lacks WebGL 2. Search and the panel work without it."
          />
        </div>
      )}
    </div>
  );
}
