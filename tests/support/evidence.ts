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

/** A schedule of all buildings. */
export function aSchedule(): EvidenceLayout {
  return { kind: 'schedule', paper: 'A4', fields: FIELDS, rows: 'all' };
}
