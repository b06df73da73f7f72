import {
  evidenceLayoutSchema,
  type EvidenceLayout,
  type PlanContent,
  type TitleFields,
} from '../../../shared/schemas/evidence.ts';
import { numberOf } from '../../lib/number-of.ts';

/** A layout as it is written: figures as text until they are read, and what another kind would need with it. */
export type LayoutDraft = {
  readonly kind: EvidenceLayout['kind'];
  readonly paper: 'A4' | 'A3' | 'A1' | 'A0';
  readonly denominator: string;
  readonly east: string;
  readonly north: string;
  readonly content: PlanContent;
  readonly from: string;
  readonly to: string;
  readonly overlap: string;
  readonly exaggeration: string;
  readonly settlementExaggeration: string;
  readonly isLong: boolean;
  readonly across: string;
  readonly halfWidth: string;
  readonly rows: 'all' | 'affected';
  readonly fields: TitleFields;
};

/** What layouts are called until somebody says otherwise. */
const TITLES: Readonly<Record<EvidenceLayout['kind'], string>> = {
  plan: 'Buildings by damage category',
  strip: 'Buildings by damage category',
  sections: 'Sections',
  schedule: 'Building schedule',
};

/** The same layout of another kind; a title that nobody wrote goes with it. */
export function ofKind(draft: LayoutDraft, kind: EvidenceLayout['kind']): Partial<LayoutDraft> {
  const { fields, paper } = draft;
  const isOurs = fields.title === TITLES[draft.kind];
  // a table of A1 is nobody's
  const isTooLarge = kind === 'schedule' && (paper === 'A1' || paper === 'A0');
  return {
    kind,
    ...(isOurs && { fields: { ...fields, title: TITLES[kind] } }),
    ...(isTooLarge && { paper: 'A3' }),
  };
}

const NO_FIELDS: TitleFields = {
  ...{ title: TITLES.plan, subtitle: '', number: '' },
  ...{ prepared: '', checked: '', approved: '', issued: '', revisions: [] },
};

/** What a layout begins with, round a point of the grid. */
export function newDraft([east, north]: readonly [number, number]): LayoutDraft {
  return {
    ...{ kind: 'plan', paper: 'A3', denominator: '1250' },
    ...{ east: String(Math.round(east)), north: String(Math.round(north)) },
    content: {
      shows: 'central',
      names: 'references',
      contours: true,
      line: true,
      background: true,
    },
    ...{ from: '0', to: '', overlap: '20' },
    ...{
      exaggeration: '1',
      settlementExaggeration: '100',
      isLong: true,
      across: '',
      halfWidth: '60',
    },
    ...{ rows: 'affected', fields: NO_FIELDS },
  };
}

function textOf(value: number): string {
  return String(value);
}

/** A layout as it would be written again, on top of what stands of other kinds. */
export function draftOfLayout(layout: EvidenceLayout, draft: LayoutDraft): LayoutDraft {
  const { kind, paper, fields } = layout;
  const base = { ...draft, kind, paper, fields };
  if (layout.kind === 'schedule') return { ...base, rows: layout.rows };
  const scaled = { ...base, denominator: textOf(layout.denominator) };
  if (layout.kind === 'plan') {
    const [east, north] = layout.centre;
    return { ...scaled, content: layout.content, east: textOf(east), north: textOf(north) };
  }
  if (layout.kind === 'strip') {
    const { content, from, to, overlap } = layout;
    const stretch = { from: textOf(from), to: to === null ? '' : textOf(to) };
    return { ...scaled, content, ...stretch, overlap: textOf(overlap) };
  }
  return {
    ...scaled,
    exaggeration: textOf(layout.exaggeration),
    settlementExaggeration: textOf(layout.settlementExaggeration),
    isLong: layout.isLong,
    across: layout.across.join(', '),
    halfWidth: textOf(layout.halfWidth),
  };
}

function listOf(text: string): (number | null)[] {
  const parts = text.split(/[;,\s]+/).filter((part) => part !== '');
  return parts.map(numberOf);
}

function asked(draft: LayoutDraft): unknown {
  const { kind, paper, fields, content } = draft;
  if (kind === 'schedule') return { kind, paper, fields, rows: draft.rows };
  const sheets = { paper, fields, denominator: numberOf(draft.denominator) };
  if (kind === 'plan') {
    return { kind, ...sheets, content, centre: [numberOf(draft.east), numberOf(draft.north)] };
  }
  if (kind === 'strip') {
    const to = draft.to.trim() === '' ? null : numberOf(draft.to);
    const { from, overlap } = draft;
    return { kind, ...sheets, content, from: numberOf(from), to, overlap: numberOf(overlap) };
  }
  return {
    ...{ kind, ...sheets, isLong: draft.isLong, across: listOf(draft.across) },
    exaggeration: numberOf(draft.exaggeration),
    settlementExaggeration: numberOf(draft.settlementExaggeration),
    halfWidth: numberOf(draft.halfWidth),
  };
}

/** The field of the form that a path of the schema is written in. */
function fieldOf(path: readonly PropertyKey[]): string {
  const [first, second] = path;
  if (first === 'centre') return second === 0 ? 'east' : 'north';
  return first === 'across' ? 'across' : path.join('.');
}

export type Faults = Readonly<Record<string, string>>;

/** What a draft comes to, or what is wrong with it, by field. */
export function readDraft(
  draft: LayoutDraft,
): { readonly layout: EvidenceLayout } | { readonly faults: Faults } {
  const parsed = evidenceLayoutSchema.safeParse(asked(draft));
  if (parsed.success) return { layout: parsed.data };
  const faults = parsed.error.issues.map(({ path, message }) => [fieldOf(path), message] as const);
  return { faults: Object.fromEntries(faults.toReversed()) };
}
