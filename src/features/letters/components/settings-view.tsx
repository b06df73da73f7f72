import type { HeldLetterSettings } from '../../../../shared/schemas/letter-settings.ts';
import { Facts } from '../../../components/ui/facts.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { StateMark } from '../../../components/ui/state-mark.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { formatDay, formatShortDay } from '../../../lib/format-date.ts';
import { KIND_LABELS } from '../letter-words.ts';
import { ruleWords } from '../rule-words.ts';
import { TermsView } from './terms-view.tsx';

type Rule = HeldLetterSettings['settings']['rules'][number] & { readonly id: string };

const RULES: readonly Column<Rule>[] = [
  { id: 'kind', heading: 'Letter', width: 200, cell: ({ kind }) => KIND_LABELS[kind] },
  { id: 'why', heading: 'Why', width: 300, cell: ({ why }) => <span title={why}>{why}</span> },
  {
    id: 'which',
    heading: 'Buildings',
    wide: true,
    cell: (rule) => <span title={ruleWords(rule)}>{ruleWords(rule)}</span>,
  },
  {
    id: 'source',
    heading: 'Source',
    width: 220,
    spare: true,
    cell: ({ source, date }) => `${source}, ${formatShortDay(date)}`,
  },
  {
    id: 'on',
    heading: 'Holds',
    width: 84,
    cell: ({ isOn }) => (
      <StateMark state={isOn ? 'done' : 'not-started'}>{isOn ? 'Yes' : 'No'}</StateMark>
    ),
  },
];

/** What letters go by, to be read. */
export function SettingsView({ held }: { readonly held: HeldLetterSettings }) {
  const { version, by, at, settings } = held;
  const { contact, milestones, answerWithin, remindAfter, escalateAfter } = settings;
  const note =
    at === null
      ? 'what every scheme starts with'
      : `version ${version}, ${by ?? ''}, ${formatDay(at)}`;
  return (
    <>
      <Panel title="Rules" note={note}>
        <Table
          label="Rules"
          columns={RULES}
          rows={settings.rules.map((rule, k) => ({ ...rule, id: String(k) }))}
          idOf={({ id }) => id}
        />
      </Panel>
      <div className="mt-5 grid max-w-[980px] grid-cols-2 gap-8 max-lg:grid-cols-1">
        <Panel title="Days">
          <Facts
            facts={[
              ['Answer within', `${answerWithin} days of the letter, or by the next working day`],
              ['Reminded after', `${remindAfter} days, by e-mail, once`],
              ['Escalated after', `${escalateAfter} days: somebody calls or goes`],
              ['Letters kept', `${settings.keepYears} years. ${settings.keepGround}`],
            ]}
          />
        </Panel>
        <Panel title="Whom owners ask" className="mt-0!">
          <Facts
            facts={[
              ['Name', contact.name],
              ['E-mail', contact.email],
              ['Telephone', contact.phone === '' ? 'none' : contact.phone],
              ['Hours', contact.hours === '' ? 'none' : contact.hours],
              ['Address', contact.address.length === 0 ? 'none' : contact.address.join(', ')],
            ]}
          />
        </Panel>
        <TermsView settings={settings} />
        <Panel title="What happens when" className="mt-0!">
          {milestones.length === 0 ? (
            <p className="py-2 text-small text-ink-2">
              Nothing yet. What is written here stands in letters and on the pages of owners.
            </p>
          ) : (
            <Facts
              facts={milestones.map(({ when, title, words }) => [when, `${title}. ${words}`])}
            />
          )}
        </Panel>
      </div>
    </>
  );
}
