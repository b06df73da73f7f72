import { resultOfOutcome } from '../../shared/assessment/result-of-outcome.ts';
import { sheetOfBuilding } from '../../shared/assessment/sheet-of-building.ts';
import type { RunFacts } from '../../shared/schemas/runs.ts';
import type { SheetMaterial } from '../../server/documents/sheet/sheet-material.ts';
import { aDesign } from './designs.ts';
import { aRing, someFacts } from './register-facts.ts';
import { aRunDetail } from './run-answers.ts';

function runFacts(overrides: Partial<RunFacts>): RunFacts {
  const { parts, ...known } = someFacts();
  return {
    ...{
      id: '7',
      reference: 'B0007',
      name: 'Sailmakers’ Hall',
      address: '3 Cable Street',
      use: 'dwelling',
    },
    ...known,
    parts: parts.map((rings) =>
      rings.map((ring) => ring.map(([e, n]): [number, number] => [e, n])),
    ),
    ...{ inspected: null, structureReason: null, featuresReason: null },
    ...overrides,
  };
}

/** A run of a line that moves the ground a good deal. */
export const SHEET_RUN = aRunDetail({
  design: aDesign({
    volumeLoss: { low: 0.01, central: 0.02, high: 0.03 },
    troughWidth: { low: 0.4, central: 0.5, high: 0.6 },
  }),
  number: 4,
});

/** The sheet of a building over the line: unless said otherwise it comes to the strain stage. */
export function aSheetMaterial(
  facts: Partial<RunFacts> = {},
  overrides: Partial<SheetMaterial> = {},
): SheetMaterial {
  const taken = runFacts(facts);
  const { outcome } = sheetOfBuilding(SHEET_RUN.design, SHEET_RUN.rules, taken, new Map());
  return {
    scheme: { name: 'Port Dogger crossing' },
    run: SHEET_RUN,
    building: {
      facts: taken,
      version: 1,
      changedSince: false,
      rows: [],
      result: resultOfOutcome(outcome),
    },
    neighbours: [[[aRing(5, 2, 10, 8)]]],
    contours: JSON.stringify([{ level: 0.01, line: [[-60, 6], [60, 6]], isClosed: false }]), // prettier-ignore
    history: [],
    samples: null,
    printedAt: '2026-12-02T09:30:00.000Z',
    ...overrides,
  };
}

/** A place so far from the line that nothing moves there. */
export const FAR_AWAY: RunFacts['parts'] = [
  [aRing(0, 400, 10, 8).map(([e, n]): [number, number] => [e, n])],
];
