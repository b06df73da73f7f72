import { capital } from '../../../../shared/presentation/capital.ts';
import type { LetterSettings } from '../../../../shared/schemas/letter-settings.ts';
import { Facts } from '../../../components/ui/facts.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { formatDay } from '../../../lib/format-date.ts';
import { ANSWERED } from '../letter-words.ts';

/** What owners are promised, to be read. */
export function TermsView({ settings }: { readonly settings: LetterSettings }) {
  const { repairs, answerDays, timeZone, holidays } = settings;
  const answers = ANSWERED.map(([kind, label]) => `${label} within ${answerDays[kind]}`);
  return (
    <Panel title="What owners are promised" className="mt-0!">
      <Facts
        facts={[
          ['Repairs', repairs.words],
          ['Source', repairs.source],
          ['Answers', `${capital(answers.join(', '))} working days`],
          ['Times', timeZone],
          [
            'Holidays',
            holidays.length === 0
              ? 'none'
              : holidays.map(({ date, name }) => (
                  <span key={date} className="block">{`${formatDay(date)}, ${name}`}</span>
                )),
          ],
        ]}
      />
    </Panel>
  );
}
