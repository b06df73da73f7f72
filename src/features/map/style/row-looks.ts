import { MAP_COLOURS } from './map-colours.ts';

/** How a row of a file is drawn by what becomes of it: ground, edge and strokes, never a damage colour. */
export type RowLook = {
  readonly fill: string;
  readonly opacity: number;
  readonly edge: string;
  readonly width: number;
  readonly dashes?: readonly [number, number];
  readonly hatch?: 'strokes' | 'crossed';
};

/** The looks by outcome. */
export const ROW_LOOKS: Readonly<
  Record<'same' | 'new' | 'changed' | 'refused' | 'conflict', RowLook>
> = {
  same: { fill: MAP_COLOURS.bldg, opacity: 0.55, edge: MAP_COLOURS.bldgEdge, width: 0.8 },
  new: { fill: MAP_COLOURS.paperRaised, opacity: 0.92, edge: MAP_COLOURS.ink, width: 1.1 },
  changed: {
    fill: MAP_COLOURS.paperRaised,
    opacity: 0.92,
    edge: MAP_COLOURS.bandLine,
    width: 1.8,
    hatch: 'strokes',
  },
  refused: {
    fill: MAP_COLOURS.paperRaised,
    opacity: 0.35,
    edge: MAP_COLOURS.ink,
    width: 1.4,
    dashes: [2, 2],
  },
  conflict: {
    fill: MAP_COLOURS.clayWash,
    opacity: 0.95,
    edge: MAP_COLOURS.clay,
    width: 2.2,
    hatch: 'crossed',
  },
};
