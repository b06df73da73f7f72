import { capital } from '../../../../shared/presentation/capital.ts';
import { Field } from '../../../components/ui/field.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import { ANSWERED } from '../letter-words.ts';
import type { PartProps } from '../settings-draft.ts';

function Repairs({ draft: { repairs }, faults, onChange }: PartProps) {
  return (
    <div className="grid grid-cols-[1.6fr_1fr] gap-3 pt-3 max-sm:grid-cols-1">
      <TextArea
        label="On repairs, and who pays"
        hint="Stands in letters and on the pages of owners as it is written here."
        rows={3}
        value={repairs.words}
        error={faults['repairs.words']}
        onChange={({ target }) => {
          onChange({ repairs: { ...repairs, words: target.value } });
        }}
      />
      <Field
        label="Source of this promise"
        value={repairs.source}
        error={faults['repairs.source']}
        onChange={({ target }) => {
          onChange({ repairs: { ...repairs, source: target.value } });
        }}
      />
    </div>
  );
}

function Answers({ draft: { answerDays }, faults, onChange }: PartProps) {
  return (
    <div className="mt-3 grid grid-cols-4 gap-3 max-sm:grid-cols-2">
      {ANSWERED.map(([kind, label]) => (
        <Field
          key={kind}
          label={`${capital(label)} answered within`}
          unit="working days"
          value={answerDays[kind]}
          error={faults[`answerDays.${kind}`]}
          onChange={({ target }) => {
            onChange({ answerDays: { ...answerDays, [kind]: target.value } });
          }}
        />
      ))}
    </div>
  );
}

/** What owners are promised: repairs, by when they are answered, and by which clocks and days that is. */
export function TermsFields(props: PartProps) {
  const { draft, faults, onChange } = props;
  return (
    <Panel title="What owners are promised">
      <Repairs {...props} />
      <Answers {...props} />
      <div className="mt-3 grid grid-cols-2 gap-3 max-sm:grid-cols-1">
        <Field
          label="Time zone of times told to owners"
          hint="By its name, as Europe/London"
          autoComplete="off"
          value={draft.timeZone}
          error={faults.timeZone}
          onChange={({ target }) => {
            onChange({ timeZone: target.value });
          }}
        />
        <TextArea
          label="Public holidays, which are no working days"
          hint="One a line, as 2027-05-03 Early May holiday"
          rows={5}
          value={draft.holidays}
          error={faults.holidays}
          onChange={({ target }) => {
            onChange({ holidays: target.value });
          }}
        />
      </div>
    </Panel>
  );
}
