import { rulesSchema } from '../../../shared/schemas/rules.ts';
import type { AuditEntryAnswer } from '../../../shared/schemas/audit.ts';
import { changesBetween, type ValueChange } from '../../lib/changes-between.ts';
import { ruleChanges } from '../rules/rule-lines.ts';

type Named = Pick<AuditEntryAnswer, 'named'>;

const SETTINGS = 'the server’s settings';
/** Whose hand it was where nobody was signed in; whatever else it is, the demo was filled with it. */
const WITHOUT_PERSON: Readonly<Record<string, string>> = {
  'create person': 'the demo',
  'create scheme': 'the demo',
  'create alignment': 'the demo',
  'change roles': 'the demo',
  'change register': 'the demo',
  'invite person': SETTINGS,
  'change person': SETTINGS,
};

/** Who did it where the entry names no person. */
export function doerWithoutPerson({ action }: Pick<AuditEntryAnswer, 'action'>): string {
  return WITHOUT_PERSON[action] ?? 'nobody signed in';
}

/** The person that an entry is about. */
export function personAbout({ subject, named }: AuditEntryAnswer) {
  return subject.kind === 'person' ? named.find(({ id }) => id === subject.id) : undefined;
}

function withNames(text: string | undefined, { named }: Named): string | undefined {
  return named.reduce(
    (words, { id, name, email }) => words?.replaceAll(id, `${name}, ${email}`),
    text,
  );
}

/** From which values to which, as people call them: rules as their page says them, people by name. */
export function entryChanges(entry: AuditEntryAnswer): ValueChange[] {
  const [before, after] = [entry.before, entry.after].map(
    (values) => rulesSchema.safeParse(values?.rules).data,
  );
  if (before !== undefined && after !== undefined) return ruleChanges(before, after);
  return changesBetween(entry.before, entry.after).map((change) => ({
    path: withNames(change.path, entry) ?? '',
    before: withNames(change.before, entry),
    after: withNames(change.after, entry),
  }));
}
