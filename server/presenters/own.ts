import { boundingBox, type Box } from '../../shared/geometry/bounding-box.ts';
import { ownerDecisionWords } from '../../shared/presentation/owner-decision.ts';
import type { PlanPoint } from '../../shared/geometry/point.ts';
import type { LetterSettings } from '../../shared/schemas/letter-settings.ts';
import { ownSchema, type Own } from '../../shared/schemas/own.ts';
import { toLonLat } from '../crs/to-lon-lat.ts';
import { linesWithin } from '../documents/sheet/lines-within.ts';
import { toldOfBuilding } from '../letters/told-of-building.ts';
import type { FoundOwnBuilding } from '../models/find-own-buildings.ts';
import type { FoundOwnFigures } from '../models/find-own-figures.ts';
import type { FoundOwnLetter } from '../models/find-own-letters.ts';
import type { Scheme } from '../models/scheme.ts';
import { presentOwnLetter } from './own-letter.ts';

/** How far round a building its owner is shown the tunnels, in metres. */
const ROUND = 120;

function widened({ west, south, east, north }: Box): Box {
  return { west: west - ROUND, south: south - ROUND, east: east + ROUND, north: north + ROUND };
}

function presentFigures(found: FoundOwnFigures, definition: string) {
  const { design, parts } = found;
  const { facts, axes } = toldOfBuilding(found, design);
  const box = widened(boundingBox(parts.flat(2)));
  const place = toLonLat(definition);
  const lines = axes.flatMap((axis) =>
    linesWithin(
      axis.map(([east, north]): PlanPoint => [east, north]),
      box,
    ),
  );
  return { ...facts, diameter: design.diameter, lines: lines.map((line) => line.map(place)) };
}

function presentOwnBuilding(
  building: FoundOwnBuilding,
  found: FoundOwnFigures | undefined,
  definition: string,
) {
  return {
    id: building.id,
    name: building.name,
    address: building.address,
    use: building.use,
    outline: building.outline,
    figures: found === undefined ? null : presentFigures(found, definition),
    decision: found?.decision ? ownerDecisionWords(found.decision) : null,
    measures: building.measures,
  };
}

/** What leaves the server for an owner's page: nothing but their own. */
export function presentOwn(
  scheme: Scheme,
  definition: string,
  found: {
    readonly settings: LetterSettings;
    readonly letters: readonly FoundOwnLetter[];
    readonly buildings: readonly FoundOwnBuilding[];
    readonly figures: readonly FoundOwnFigures[];
  },
): Own {
  const { contact, milestones, repairs, answerDays, timeZone } = found.settings;
  const { name, email, phone, hours } = contact;
  return ownSchema.parse({
    scheme: { id: scheme.id, name: scheme.name },
    contact: { name, email, phone, hours },
    ...{ milestones, answerDays, timeZone },
    repairs: repairs.words,
    letters: found.letters.map(presentOwnLetter),
    buildings: found.buildings.map((building) => {
      const figures = found.figures.find(({ buildingId }) => buildingId === building.id);
      return presentOwnBuilding(building, figures, definition);
    }),
  });
}
