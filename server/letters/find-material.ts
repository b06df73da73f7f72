import type { Transaction } from 'sequelize';
import type { LetterWords } from '../../shared/presentation/letter-text.ts';
import { alignmentDesignSchema } from '../../shared/schemas/alignments.ts';
import type { LetterSettings } from '../../shared/schemas/letter-settings.ts';
import { daysAfter, dayIn } from '../days.ts';
import { Run } from '../models/run.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Material } from './compose-letters.ts';
import type { FoundRecipients } from './find-recipients.ts';

/** What letters are written from that go out today, to those who were found. */
export async function findMaterial(
  scheme: Scheme,
  settings: LetterSettings,
  template: LetterWords,
  { runId, told }: FoundRecipients,
  transaction: Transaction | null = null,
): Promise<Material> {
  const run = runId === null ? null : await Run.findByPk(runId, { transaction });
  return {
    ...{ schemeName: scheme.name, template, settings, told },
    design: run === null ? null : alignmentDesignSchema.parse(run.design),
    answerBy: dayIn(daysAfter(new Date(), settings.answerWithin), settings.timeZone),
  };
}
