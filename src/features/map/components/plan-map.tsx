import { useRef } from 'react';
import { ErrorNote } from '../../../components/ui/error-note.tsx';
import { useOpenMap } from '../hooks/use-open-map.ts';
import { OpenPlanMap } from './open-plan-map.tsx';
import type { PlanMapProps } from './plan-map-props.ts';

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
