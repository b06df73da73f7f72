import { faultsOfMarks } from '../../shared/presentation/letter-text.ts';
import { alignmentDesignSchema } from '../../shared/schemas/alignments.ts';
import type { LetterKind } from '../../shared/schemas/letter-settings.ts';
import {
  previewedTemplateSchema,
  type PreviewedTemplate,
} from '../../shared/schemas/letter-templates.ts';
import { daysAfter, dayOf } from '../days.ts';
import { heldSettings } from '../models/letter-settings.ts';
import { Run } from '../models/run.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Services } from '../services.ts';
import { composeLetter } from './compose-letters.ts';
import { findRecipients } from './find-recipients.ts';

type Asked = {
  readonly kind: LetterKind;
  readonly subject: string;
  readonly body: string;
  readonly partyId: string | null;
};

/** So many parties are offered to look at a template with. */
const MOST = 50;

/** A template as a party whom the rules name would read it; nothing is kept. */
export async function previewTemplate(
  { database }: Pick<Services, 'database'>,
  scheme: Scheme,
  { kind, subject, body, partyId }: Asked,
): Promise<PreviewedTemplate> {
  const faults = [...faultsOfMarks(subject), ...faultsOfMarks(body)];
  const { settings } = await heldSettings(database, scheme);
  // free text has no rule of its own: it is looked at with whoever is told first
  const rules = kind === 'free text' ? 'first information' : kind;
  const asked = { kind: rules, leftOut: [], chosen: [] };
  const found = await findRecipients(database, scheme.id, settings, asked, null);
  const recipient =
    found.recipients.find(({ party }) => party.partyId === partyId) ?? found.recipients[0];
  const parties = found.recipients
    .slice(0, MOST)
    .map(({ party }) => ({ id: party.partyId, name: party.name }));
  if (recipient === undefined || faults.length > 0) {
    return previewedTemplateSchema.parse({ faults, parties, letter: null });
  }
  const run = found.runId === null ? null : await Run.findByPk(found.runId);
  const letter = composeLetter(
    {
      ...{ schemeName: scheme.name, template: { subject, body }, settings, told: found.told },
      design: run === null ? null : alignmentDesignSchema.parse(run.design),
      answerBy: dayOf(daysAfter(new Date(), settings.answerWithin)),
    },
    recipient,
  );
  const { name, subject: title, facts } = letter;
  return previewedTemplateSchema.parse({
    ...{ faults, parties },
    letter: { name, subject: title, parts: facts.parts },
  });
}
