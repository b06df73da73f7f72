import type { CameraBounds } from '../camera.ts';
import type { MapCursor } from '../map-cursor.ts';
import type { MapDrawing } from '../map-drawing.ts';
import type { MapHandle } from '../map-handle.ts';
import type { LineShape } from '../map-line.ts';
import type { MapPlan } from '../map-plan.ts';

/** What the page tells the map. */
export type PlanMapProps = {
  readonly plan: MapPlan;
  /** What the map is called for who hears it. */
  readonly label: string;
  /** What the map shows at first and when it is fitted. */
  readonly home: CameraBounds;
  /** The scheme's grid for proj4. */
  readonly gridDefinition: string;
  readonly selected: number | null;
  /** What is being drawn by hand; buildings can then not be selected, unless nothing has to be pointed at. */
  readonly drawing?: MapDrawing | null;
  /** A designed line and its settlement. */
  readonly line?: readonly LineShape[];
  /** What else is said of the place under the cursor, and who wants to know of it. */
  readonly cursor?: MapCursor;
  readonly onSelect: (buildingId: number | null) => void;
  /** Gives the page its way to move the map, and null when the map goes. */
  readonly onHandle: (handle: MapHandle | null) => void;
};
