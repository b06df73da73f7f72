import type { Transaction } from 'sequelize';
import type { LetterWords } from '../../shared/presentation/letter-text.ts';
import { alignmentDesignSchema } from '../../shared/schemas/alignments.ts';
import type { LetterSettings } from '../../shared/schemas/letter-settings.ts';
import { daysAfter, dayIn } from '../days.ts';
import { Run } from '../models/run.ts';
import type { Scheme } from '../models/scheme.ts';
import { workingDayFrom } from '../working-days.ts';
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
  const { answerWithin, timeZone, holidays } = settings;
  const last = dayIn(daysAfter(new Date(), answerWithin), timeZone);
  const run = runId === null ? null : await Run.findByPk(runId, { transaction });
  return {
    ...{ schemeName: scheme.name, template, settings, told },
    design: run === null ? null : alignmentDesignSchema.parse(run.design),
    // nobody is asked to answer on a day on which they reach nobody
    answerBy: workingDayFrom(last, holidays),
  };
}
