import type { CameraBounds } from '../camera.ts';
import type { MapDrawing } from '../map-drawing.ts';
import type { MapHandle } from '../map-handle.ts';
import type { MapLasso } from '../map-lasso.ts';
import type { LineShape, SectionShape } from '../map-line.ts';
import type { MapPlan } from '../map-plan.ts';
import type { GridPlace } from '../place/grid-projection.ts';

/** What is said of a place beside its easting and northing. */
export type WordsAt = (place: GridPlace) => readonly string[];

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
  /** An outline round buildings; while it is drawn they cannot be selected. Never beside `drawing`. */
  readonly lasso?: MapLasso;
  /** A designed line and its settlement. */
  readonly line?: readonly LineShape[];
  /** Where a section across the line is looked at. */
  readonly section?: readonly SectionShape[];
  /** What else is said of the place under the cursor. */
  readonly wordsAt?: WordsAt;
  /** What is said beside the cursor of the building under it. */
  readonly tipOf?: ((buildingId: number) => readonly string[]) | undefined;
  /** The cursor is over a place of the grid. When it leaves the map, nothing is told. */
  readonly onCursor?: (place: GridPlace) => void;
  readonly onSelect: (buildingId: number | null) => void;
  /** Gives the page its way to move the map, and null when the map goes. */
  readonly onHandle: (handle: MapHandle | null) => void;
};
