import { z } from 'zod';
import { chainageSchema, coordinateSchema } from './places.ts';

/**
 * How much a layout may ask for, and how long its words may be.
 *
 * Units: letters, pieces, m. Valid: read only. Source: [own].
 */
export const EVIDENCE_LIMITS = {
  name: 80,
  words: 120,
  revisions: 8,
  sections: 40,
  sheets: 200,
  denominator: { least: 50, most: 50_000 },
  halfWidth: 500,
  exaggeration: 1000,
} as const;

/**
 * The papers of sheets, by name.
 *
 * Units: none. Valid: closed list. Source: iso-paper-2007.
 */
export const PAPER_NAMES = ['A4', 'A3', 'A1', 'A0'] as const;

/**
 * What buildings of a plan are coloured by: their category at an end of the likely range, the settlement
 * under them, or the stage they came to.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const PLAN_SHOWS = ['low', 'central', 'high', 'settlement', 'stage'] as const;

const words = z
  .string()
  .trim()
  .max(EVIDENCE_LIMITS.words, `At most ${EVIDENCE_LIMITS.words} letters.`)
  .regex(/^\P{Cc}*$/u, 'Keep to one line.');

/**
 * A line of a revision table.
 *
 * Units: none. Valid: all but the mark and the change may be empty. Source: [own].
 */
export const revisionSchema = z.strictObject({
  revision: words.min(1, 'Give the revision a mark, as A.'),
  date: z.union([z.literal(''), z.iso.date()]),
  change: words,
  by: words,
  checked: words,
});

/**
 * The fields of a title block that people write; what is empty stays to be filled in by hand.
 *
 * Units: none. Valid: plain words of one line. Source: iso-title-blocks-2004.
 */
export const titleFieldsSchema = z.strictObject({
  title: words,
  subtitle: words,
  number: words,
  prepared: words,
  checked: words,
  approved: words,
  issued: z.union([z.literal(''), z.iso.date()]),
  revisions: z.array(revisionSchema).max(EVIDENCE_LIMITS.revisions),
});

/**
 * The fields of a title block.
 *
 * Units: none. Valid: parsed by titleFieldsSchema. Source: iso-title-blocks-2004.
 */
export type TitleFields = z.infer<typeof titleFieldsSchema>;

/**
 * What plans show.
 *
 * Units: none. Valid: names stand at the buildings that take a colour. Source: [own].
 */
export const planContentSchema = z.strictObject({
  shows: z.enum(PLAN_SHOWS),
  names: z.enum(['none', 'references', 'addresses']),
  contours: z.boolean(),
  line: z.boolean(),
  background: z.boolean(),
});

/**
 * What plans show.
 *
 * Units: none. Valid: parsed by planContentSchema. Source: [own].
 */
export type PlanContent = z.infer<typeof planContentSchema>;

const { least, most } = EVIDENCE_LIMITS.denominator;
const sheets = {
  paper: z.enum(PAPER_NAMES),
  denominator: z
    .number('Write a number.')
    .min(least, `At least 1 : ${least}.`)
    .max(most, `At most 1 : ${most}.`),
  fields: titleFieldsSchema,
};

/**
 * What is printed: one plan round a point, a series of plans along the line, sections, or a table of
 * buildings.
 *
 * Units: m; scales 1 : `denominator`, lengths up times `exaggeration` in sections; chainages along the drawn line, `overlap` between sheets
 * of a series. Valid: the end of a stretch is beyond its start; `to` null is the end of the line.
 * Source: [own].
 */
export const evidenceLayoutSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('plan'),
    ...sheets,
    centre: z.tuple([coordinateSchema, coordinateSchema]),
    content: planContentSchema,
  }),
  z.strictObject({
    kind: z.literal('strip'),
    ...sheets,
    from: chainageSchema,
    to: chainageSchema.nullable(),
    overlap: z.number('Write a number.').min(0).max(1000),
    content: planContentSchema,
  }),
  z.strictObject({
    kind: z.literal('sections'),
    ...sheets,
    exaggeration: z.number('Write a number.').min(1).max(100),
    settlementExaggeration: z.number('Write a number.').min(1).max(EVIDENCE_LIMITS.exaggeration),
    isLong: z.boolean(),
    across: z.array(chainageSchema).max(EVIDENCE_LIMITS.sections),
    halfWidth: z.number('Write a number.').min(5).max(EVIDENCE_LIMITS.halfWidth),
  }),
  z.strictObject({
    kind: z.literal('schedule'),
    paper: z.enum(['A4', 'A3']),
    fields: titleFieldsSchema,
    rows: z.enum(['all', 'affected']),
  }),
]);

/**
 * What is printed.
 *
 * Units: as evidenceLayoutSchema. Valid: parsed by it. Source: [own].
 */
export type EvidenceLayout = z.infer<typeof evidenceLayoutSchema>;

/**
 * A layout that is drawn as sheets of marks; a schedule is a table instead.
 *
 * Units: as evidenceLayoutSchema. Valid: parsed by it. Source: [own].
 */
export type DrawnLayout = Exclude<EvidenceLayout, { kind: 'schedule' }>;

const name = z
  .string()
  .trim()
  .min(1, 'Give the layout a name.')
  .max(EVIDENCE_LIMITS.name)
  .regex(/^\P{Cc}*$/u);

/**
 * A new named layout.
 *
 * Units: as evidenceLayoutSchema. Valid: a name that no other layout of the scheme has. Source: [own].
 */
export const newLayoutSchema = z.strictObject({ name, layout: evidenceLayoutSchema });

/**
 * A change of a named layout, on top of the version that was seen.
 *
 * Units: as evidenceLayoutSchema. Valid: an older version is refused, and what changed is told.
 * Source: [own].
 */
export const changeLayoutSchema = newLayoutSchema.extend({ version: z.number().int().min(1) });

/**
 * The address of a named layout.
 *
 * Units: none. Valid: a layout of the scheme. Source: [own].
 */
export const layoutParamsSchema = z.object({ schemeId: z.string(), layoutId: z.uuid() });

/**
 * A named layout.
 *
 * Units: as evidenceLayoutSchema. Valid: version grows with every change. Source: [own].
 */
export const layoutSchema = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  version: z.number(),
  layout: evidenceLayoutSchema,
  changedAt: z.iso.datetime(),
  changedBy: z.string().nullable(),
});

/**
 * A named layout.
 *
 * Units: as layoutSchema. Valid: parsed by it. Source: [own].
 */
export type LayoutAnswer = z.infer<typeof layoutSchema>;

/**
 * The layouts of a scheme by name.
 *
 * Units: as layoutSchema. Valid: any. Source: [own].
 */
export const layoutsSchema = z.array(layoutSchema);

/**
 * Where a print stands.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const PRINT_STATES = ['waiting', 'printing', 'done', 'cancelled', 'failed'] as const;

/**
 * A print that is asked for.
 *
 * Units: as evidenceLayoutSchema. Valid: of a complete run of the scheme. Source: [own].
 */
export const newPrintSchema = z.strictObject({ name, layout: evidenceLayoutSchema });

/**
 * The address of a print.
 *
 * Units: none. Valid: a print of the scheme. Source: [own].
 */
export const printParamsSchema = z.object({ schemeId: z.string(), printId: z.uuid() });

/**
 * A print: what was asked for, of which run, how far it is, and the fingerprint of its file once it is
 * done.
 *
 * Units: sheets, bytes; fingerprint SHA-256 as hexadecimal digits. Valid: `fault` says why it failed.
 * Source: [own].
 */
export const printSchema = z.strictObject({
  id: z.uuid(),
  number: z.number(),
  name: z.string(),
  layout: evidenceLayoutSchema,
  runId: z.uuid(),
  runNumber: z.number(),
  state: z.enum(PRINT_STATES),
  done: z.number(),
  sheets: z.number().nullable(),
  fault: z.string().nullable(),
  bytes: z.number().nullable(),
  fingerprint: z.string().nullable(),
  askedAt: z.iso.datetime(),
  askedBy: z.string().nullable(),
});

/**
 * A print.
 *
 * Units: as printSchema. Valid: parsed by it. Source: [own].
 */
export type PrintAnswer = z.infer<typeof printSchema>;

/**
 * The newest prints of a scheme, the newest first.
 *
 * Units: as printSchema. Valid: at most 100. Source: [own].
 */
export const printsSchema = z.array(printSchema);
