import {
  letterSettingsSchema,
  type LetterRule,
  type LetterSettings,
} from '../../../shared/schemas/letter-settings.ts';
import type { MatterKind } from '../../../shared/schemas/matters.ts';
import type { RegisterFilter } from '../../../shared/schemas/register.ts';
import { faultOfHolidays, holidaysOfLines, linesOfHolidays } from './holiday-lines.ts';

type NearDraft = { readonly name: string; readonly east: string; readonly north: string; readonly metres: string }; // prettier-ignore

/** A rule while it is being written; figures as they were typed. */
export type RuleDraft = Omit<LetterRule, 'near' | 'shaftWithin'> & {
  readonly near: NearDraft | null;
  readonly shaftWithin: string | null;
};

/** The settings while they are being written. */
export type SettingsDraft = Omit<
  LetterSettings,
  | 'rules'
  | 'answerWithin'
  | 'remindAfter'
  | 'escalateAfter'
  | 'keepYears'
  | 'contact'
  | 'answerDays'
  | 'holidays'
> & {
  readonly rules: readonly RuleDraft[];
  readonly answerWithin: string;
  readonly remindAfter: string;
  readonly escalateAfter: string;
  readonly keepYears: string;
  readonly contact: Omit<LetterSettings['contact'], 'address'> & { readonly address: string };
  readonly answerDays: Readonly<Record<MatterKind, string>>;
  readonly holidays: string;
};

/** What is wrong, by place, as `rules.0.why`. */
export type SettingsFaults = Readonly<Record<string, string>>;

/** What every part of the form is given. */
export type PartProps = {
  readonly draft: SettingsDraft;
  readonly faults: SettingsFaults;
  readonly onChange: (some: Partial<SettingsDraft>) => void;
};

function mapDays<A, B>(days: Record<MatterKind, A>, to: (day: A) => B): Record<MatterKind, B> {
  const { question, concern, claim, correction } = days;
  return {
    question: to(question),
    concern: to(concern),
    claim: to(claim),
    correction: to(correction),
  };
}

/** What is written, from what holds. */
export function draftOfSettings(settings: LetterSettings): SettingsDraft {
  const { rules, contact, answerWithin, remindAfter, escalateAfter, keepYears } = settings;
  const { answerDays, holidays } = settings;
  return {
    ...settings,
    rules: rules.map(({ near, shaftWithin, ...rule }) => ({
      ...rule,
      shaftWithin: shaftWithin === null ? null : String(shaftWithin),
      near: near && {
        name: near.name,
        east: String(near.east),
        north: String(near.north),
        metres: String(near.metres),
      },
    })),
    answerWithin: String(answerWithin),
    remindAfter: String(remindAfter),
    escalateAfter: String(escalateAfter),
    keepYears: String(keepYears),
    contact: { ...contact, address: contact.address.join('\n') },
    answerDays: mapDays(answerDays, String),
    holidays: linesOfHolidays(holidays),
  };
}

function numberOf(text: string): number {
  return text.trim() === '' ? NaN : Number(text);
}

/** What was written, checked; or its faults. */
export function readSettings(
  draft: SettingsDraft,
): { readonly settings: LetterSettings } | { readonly faults: SettingsFaults } {
  const holidays = holidaysOfLines(draft.holidays);
  const parsed = letterSettingsSchema.safeParse({
    ...draft,
    rules: draft.rules.map(({ near, shaftWithin, ...rule }) => ({
      ...rule,
      shaftWithin: shaftWithin === null ? null : numberOf(shaftWithin),
      near: near && {
        name: near.name,
        east: numberOf(near.east),
        north: numberOf(near.north),
        metres: numberOf(near.metres),
      },
    })),
    answerWithin: numberOf(draft.answerWithin),
    remindAfter: numberOf(draft.remindAfter),
    escalateAfter: numberOf(draft.escalateAfter),
    keepYears: numberOf(draft.keepYears),
    contact: {
      ...draft.contact,
      address: draft.contact.address
        .split('\n')
        .map((line) => line.trim())
        .filter((line) => line !== ''),
    },
    answerDays: mapDays(draft.answerDays, numberOf),
    timeZone: draft.timeZone.trim(),
    holidays,
  });
  if (parsed.success) return { settings: parsed.data };
  const faults = parsed.error.issues.map(({ path, message }) =>
    path[0] === 'holidays'
      ? (['holidays', faultOfHolidays(holidays, { path, message })] as const)
      : ([path.join('.'), message] as const),
  );
  return { faults: Object.fromEntries(faults.reverse()) };
}

/** A rule to begin with. */
export function newRule(date: string): RuleDraft {
  const filter: RegisterFilter = { ranges: { settlement: { from: 1 } } };
  return {
    ...{ kind: 'first information', why: '', filter, near: null, listedOnly: false },
    shaftWithin: null,
    ...{ source: '', date, isOn: true },
  };
}
