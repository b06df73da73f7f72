import type { BuildingField } from '../../shared/schemas/building-fields.ts';
import { BUILDING_FIELDS } from '../../shared/schemas/building-fields.ts';
import type { RemovedBuilding } from '../models/known-buildings.ts';

const METRE = new Intl.NumberFormat('en-GB', { maximumFractionDigits: 2 });

function metres(value: number): string {
  return METRE.format(value).replaceAll(',', ' ');
}

function quoted(text: string): string {
  return `“${text.length > 40 ? `${text.slice(0, 40)}…` : text}”`;
}

function near([east, north]: readonly [number, number]): string {
  return `near E ${metres(east)}, N ${metres(north)}`;
}

const DAY = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' });

type Cell = { readonly field: BuildingField | 'reference'; readonly column: string };

function cell({ field, column }: Cell): string {
  const label = field === 'reference' ? 'Reference' : BUILDING_FIELDS[field].label;
  return `${label} (column ${quoted(column)})`;
}

const LEFT = 'It is left as unknown, or as it was.';

/** What a report says of a row, each in a whole sentence that says what to do. */
export const REMARKS = {
  noFootprint: 'There is no footprint in this row. Add one, or leave the row out.',
  noReference: 'The reference is blank. Give the building a reference.',
  longReference: 'The reference is longer than 60 letters. Shorten it.',
  sameReference: (reference: string, row: number) =>
    `The reference ${quoted(reference)} stands in row ${row} already. Give each building its own.`,
  noSuchBuilding: (reference: string, isPoint: boolean) =>
    `No building of the register has the reference ${quoted(reference)}. ${isPoint ? 'Its X and Y are a point, which is no footprint. ' : ''}Correct it, or import its footprint first.`,
  unreadable: (at: Cell, text: string, why: string) =>
    `${cell(at)}: ${quoted(text)} ${why}. ${LEFT}`,
  commaRead: (at: Cell, text: string, value: number) =>
    `${cell(at)}: ${quoted(text)} was read as ${value}, with a decimal comma.`,
  longText: (at: Cell) => `${cell(at)}: the text is longer than 300 letters and was cut.`,
  fewCorners: 'A ring has fewer than three corners that differ. Draw it anew.',
  degrees: 'These look like longitude and latitude: choose a system in degrees.',
  acrossDateLine:
    'The footprint lies across 180° of longitude, where the map is cut, and cannot be kept. Leave it out, or bring in the part on one side.',
  unplaced: (system: string) =>
    `The coordinates cannot be placed in ${system}. Check the system of the file.`,
  outside: (system: string) =>
    `The footprint lies outside the area of ${system}. Check the system of the file, or this row’s coordinates.`,
  exchanged:
    'Easting and northing look exchanged in this row: the other way round it lies with the rest. Exchange them.',
  allExchanged: (system: string) =>
    `Easting and northing look exchanged: only the other way round the footprint lies in the area of ${system}. Exchange the axes of the file.`,
  far: (kilometres: number) =>
    `The footprint lies ${Math.round(kilometres)} km from the rest of the file. Check its coordinates.`,
  crossing: (
    place: readonly [number, number],
    { isOneRing, canBeMended }: { readonly isOneRing: boolean; readonly canBeMended: boolean },
  ) => {
    const what = isOneRing ? 'The ring crosses itself' : 'Its rings cross or lie over each other';
    return `${what} ${near(place)}. ${canBeMended ? 'Have it mended, or draw it anew.' : 'Draw it anew.'}`;
  },
  mended: (place: readonly [number, number], isOneRing: boolean) => {
    const [what, were] = isOneRing ? ['The ring crossed itself', 'was'] : ['Its rings crossed or lay over each other', 'were']; // prettier-ignore
    return `${what} ${near(place)} and ${were} mended. Compare it with the building.`;
  },
  holeOutside: 'A hole lies outside the ring that it should be cut from. Draw it anew.',
  tiny: (area: number) =>
    `The footprint has an area of ${metres(area)} m², which is no building. Leave it out, or check the file’s units.`,
  small: (area: number) =>
    `The footprint has an area of ${metres(area)} m² only. Check whether it is a building.`,
  huge: (area: number) =>
    `The footprint has an area of ${metres(area)} m². Check the file’s units, or split it by building.`,
  manyCorners: 'The footprint has more than 10,000 corners. Simplify it.',
  sameFootprint: (row: number) => `The footprint is that of row ${row}. Leave one of them out.`,
  removed: ({ reference, at, joinedInto }: RemovedBuilding) =>
    joinedInto === null
      ? `${reference} was taken out of the register on ${DAY.format(at)}. It would come back.`
      : `${reference} was joined into ${joinedInto} on ${DAY.format(at)}. It would come back beside it.`,
  overlap: (row: number, area: number) =>
    `The footprint overlaps that of row ${row} by ${metres(area)} m².`,
  overlapRegister: (reference: string, area: number) =>
    `The footprint overlaps ${reference} of the register by ${metres(area)} m².`,
} as const;
