import { vi } from 'vitest';
import type { LayoutAnswer, PrintAnswer } from '../../shared/schemas/evidence.ts';
import { EvidencePage } from '../../src/features/evidence/evidence-page.tsx';
import { SchemeContext } from '../../src/features/schemes/scheme-context.ts';
import { anId, aSchemeAnswer } from './answers.ts';
import { aPlan } from './evidence.ts';
import { fakeApi } from './fake-api.ts';
import { renderPage } from './render-page.tsx';
import { aRunAnswer, aRunDetail } from './run-answers.ts';

export const EVIDENCE_SCHEME = `/api/schemes/${anId(10)}`;
const RUN = `${EVIDENCE_SCHEME}/runs/${anId(60)}`;

/** A named layout of the quay. */
export function aLayoutAnswer(overrides: Partial<LayoutAnswer> = {}): LayoutAnswer {
  return {
    ...{ id: anId(90), name: 'The quay', version: 1, layout: aPlan([10, 20]) },
    ...{ changedAt: '2026-12-01T10:00:00.000Z', changedBy: 'Ada', ...overrides },
  };
}

/** A print of the quay that waits. */
export function aPrintAnswer(overrides: Partial<PrintAnswer> = {}): PrintAnswer {
  return {
    ...{ id: anId(95), number: 3, name: 'The quay', layout: aPlan([10, 20]) },
    ...{ runId: anId(60), runNumber: 1, state: 'waiting', done: 0, sheets: null },
    ...{ fault: null, bytes: null, fingerprint: null },
    ...{ askedAt: '2026-12-02T10:00:00.000Z', askedBy: 'Ada', ...overrides },
  };
}

/** A house beside the middle of the line that comes to category 2. */
const MATERIAL = {
  buildings: [
    {
      ...{ id: '7', reference: 'B0007', address: '3 Cable Street' },
      parts: [[[[-5, 5], [5, 5], [5, 15], [-5, 15], [-5, 5]]]],
      result: {
        ...{ stage: 3, categoryLow: 1, category: 2, categoryHigh: 3 },
        ...{ settlement: 0.012, strain: 0.001, breakpointVolumeLoss: null },
      },
    },
  ],
  ...{ background: [], contours: [] },
}; // prettier-ignore

/** jsdom has no fonts to load and none to measure words in. */
export function withoutFonts(): void {
  Object.defineProperty(document, 'fonts', {
    configurable: true,
    value: { load: () => Promise.resolve([]) },
  });
  vi.spyOn(HTMLCanvasElement.prototype, 'getContext').mockReturnValue(null);
}

type Shown = {
  readonly answers?: Readonly<Record<string, unknown>>;
  readonly abilities?: Readonly<Record<string, boolean>>;
};

/** The page of evidence of a scheme with one run, for who may prepare it unless said otherwise. */
export function showEvidence({ answers = {}, abilities = { prepareEvidence: true } }: Shown = {}) {
  withoutFonts();
  const api = fakeApi({
    'GET /api/session': undefined,
    [`GET ${EVIDENCE_SCHEME}/runs`]: [aRunAnswer()],
    [`GET ${RUN}/evidence/about`]: {
      scheme: { name: 'Port Dogger crossing', crs: { code: 32631, name: 'UTM zone 31N' } },
      ...{ run: aRunDetail(), keyGround: [] },
    },
    [`GET ${RUN}/evidence`]: { material: MATERIAL },
    [`GET ${EVIDENCE_SCHEME}/layouts`]: [],
    [`GET ${EVIDENCE_SCHEME}/prints`]: [],
    ...answers,
  });
  const scheme = aSchemeAnswer({ abilities: { readEvidence: true, ...abilities } });
  renderPage(
    <SchemeContext value={scheme}>
      <EvidencePage />
    </SchemeContext>,
  );
  return api;
}
