import type { EvidenceLayout } from '../../shared/schemas/evidence.ts';

const FIELDS = {
  ...{ title: 'Plan of the quay', subtitle: '', number: '', prepared: '', checked: '' },
  ...{ approved: '', issued: '', revisions: [] },
} satisfies EvidenceLayout['fields'];

/** A plan at 1 : 500 on A3 round a point of the grid. */
export function aPlan(centre: [number, number]): Extract<EvidenceLayout, { kind: 'plan' }> {
  return {
    ...{ kind: 'plan', paper: 'A3', denominator: 500, fields: FIELDS, centre },
    content: {
      shows: 'central',
      names: 'references',
      contours: true,
      line: true,
      background: true,
    },
  };
}

type Strip = Extract<EvidenceLayout, { kind: 'strip' }>;

/** Plans at 1 : 500 on A3 along the whole of the line. */
export function aStrip(overrides: Partial<Strip> = {}): Strip {
  const { content } = aPlan([0, 0]);
  return {
    ...{ kind: 'strip', paper: 'A3', denominator: 500, fields: FIELDS, content },
    ...{ from: 0, to: null, overlap: 10, ...overrides },
  };
}

type Schedule = Extract<EvidenceLayout, { kind: 'schedule' }>;

/** A schedule of all buildings on A4. */
export function aSchedule(overrides: Partial<Schedule> = {}): Schedule {
  return { kind: 'schedule', paper: 'A4', fields: FIELDS, rows: 'all', ...overrides };
}

type Sections = Extract<EvidenceLayout, { kind: 'sections' }>;

/** Sections at 1 : 500 on A3, levels as lengths: unless said otherwise one across the line, 60 m to either side. */
export function someSections(overrides: Partial<Sections> = {}): Sections {
  return {
    ...{ kind: 'sections', paper: 'A3', denominator: 500, fields: FIELDS },
    ...{ exaggeration: 1, settlementExaggeration: 500 },
    ...{ isLong: false, across: [500], halfWidth: 60, ...overrides },
  };
}
