import type { GroundAnswer } from '../../shared/schemas/ground.ts';
import type { ImportAnswer, ImportOptions, ImportRow } from '../../shared/schemas/imports.ts';
import { anId } from './answers.ts';

/** What is chosen of a file whose system and reference are known. */
export function importOptions(overrides: Partial<ImportOptions> = {}): ImportOptions {
  return {
    place: { crs: 4326, exchangeAxes: false, shift: [0, 0] },
    columns: { reference: 'ref', use: 'currentUse' },
    prefix: 'B',
    mend: true,
    settle: { others: 'ask', rows: {} },
    ...overrides,
  };
}

export function importCounts(
  overrides: Partial<NonNullable<ImportAnswer['counts']>> = {},
): NonNullable<ImportAnswer['counts']> {
  return {
    rows: 2253,
    new: 2253,
    changed: 0,
    same: 0,
    conflict: 0,
    refused: 0,
    noted: 0,
    mendable: 0,
    absent: 0,
    area: 368_818,
    ...overrides,
  };
}

/** A checked import of a town that waits to be confirmed. */
export function anImportAnswer(overrides: Partial<ImportAnswer> = {}): ImportAnswer {
  return {
    id: anId(50),
    version: 3,
    state: 'asking',
    fileName: 'town.geojson',
    format: 'geojson',
    kind: 'footprints',
    layer: null,
    layers: [],
    by: 'Assessor',
    at: '2026-12-01T09:00:00.000Z',
    progress: { done: 2253, of: 2253 },
    columns: [
      { name: 'ref', filled: 2253, samples: ['A1', 'A2'] },
      { name: 'currentUse', filled: 2229, samples: ['residential', 'industrial'] },
      { name: 'localId', filled: 2253, samples: ['x1'] },
    ],
    options: importOptions(),
    remembered: null,
    place: {
      crs: 4326,
      name: 'WGS 84',
      from: 'the format',
      candidates: [],
      accuracy: 1,
      words: 'The shift between these two may cost up to 1 m.',
    },
    missing: [],
    counts: importCounts(),
    bounds: [-4.8, 40, -4.7, 40.1],
    fault: null,
    changeId: null,
    ...overrides,
  };
}

/** A row of a report that brings a new building. */
export function anImportRow(overrides: Partial<ImportRow> = {}): ImportRow {
  return {
    row: 1,
    reference: 'A1',
    outcome: 'new',
    remarks: [],
    changes: [],
    centre: [-4.75, 40.05],
    area: 120.44,
    isMended: false,
    ...overrides,
  };
}

/** Spot heights that most buildings took their level from. */
export function aGroundAnswer(overrides: Partial<GroundAnswer> = {}): GroundAnswer {
  return {
    ground: {
      kind: 'spots',
      source: 'City survey',
      by: 'Assessor',
      at: '2026-05-01T09:00:00.000Z',
      points: 1204,
      lowest: 2.5,
      highest: 18.25,
    },
    buildings: { fromGround: 1190, fromFile: 0, byHand: 1, unknown: 3 },
    ...overrides,
  };
}
