import {
  EVIDENCE_LIMITS,
  type TitleFields as Fields,
} from '../../../../shared/schemas/evidence.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import type { DraftProps } from './draft-field.tsx';

type Revision = Fields['revisions'][number];

const NAMES = [
  ['title', 'Title'],
  ['subtitle', 'Second line of the title'],
  ['number', 'Drawing number'],
  ['issued', 'Issued on'],
  ['prepared', 'Prepared by'],
  ['checked', 'Checked by'],
  ['approved', 'Approved by'],
] as const;

const OF_REVISION = [
  ['revision', 'Revision'],
  ['date', 'Date'],
  ['change', 'Change'],
  ['by', 'By'],
  ['checked', 'Checked by'],
] as const;

const NO_REVISION: Revision = { revision: '', date: '', change: '', by: '', checked: '' };

type RevisionRowProps = {
  readonly revision: Revision;
  readonly index: number;
  readonly faults: DraftProps['faults'];
  readonly onChange: (revision: Revision | null) => void;
};

function RevisionRow({ revision, index, faults, onChange }: RevisionRowProps) {
  return (
    <fieldset className="grid grid-cols-2 items-start gap-2 border-t border-hairline pt-2">
      <legend className="sr-only">Revision {index + 1}</legend>
      {OF_REVISION.map(([name, label]) => (
        <Field
          key={name}
          label={label}
          type={name === 'date' ? 'date' : 'text'}
          maxLength={EVIDENCE_LIMITS.words}
          frameClassName={name === 'change' ? 'col-span-2' : ''}
          value={revision[name]}
          error={faults[`fields.revisions.${index}.${name}`]}
          onChange={({ target }) => {
            onChange({ ...revision, [name]: target.value });
          }}
        />
      ))}
      <Button
        kind="quiet"
        className="col-span-2 justify-self-start"
        onClick={() => {
          onChange(null);
        }}
      >
        Take this revision out
      </Button>
    </fieldset>
  );
}

/** What people write into the title block, and the revisions, the newest first. */
export function TitleFields({ draft: { fields }, faults, onChange }: DraftProps) {
  const { revisions } = fields;
  function set(change: Partial<Fields>) {
    onChange({ fields: { ...fields, ...change } });
  }
  return (
    <div className="grid gap-3">
      <div className="grid grid-cols-2 items-start gap-3">
        {NAMES.map(([name, label]) => (
          <Field
            key={name}
            label={label}
            type={name === 'issued' ? 'date' : 'text'}
            maxLength={EVIDENCE_LIMITS.words}
            frameClassName={name === 'title' || name === 'subtitle' ? 'col-span-2' : ''}
            value={fields[name]}
            error={faults[`fields.${name}`]}
            onChange={({ target }) => {
              set({ [name]: target.value });
            }}
          />
        ))}
      </div>
      {revisions.map((revision, index) => (
        <RevisionRow
          key={index}
          {...{ revision, index, faults }}
          onChange={(changed) => {
            set({
              revisions: revisions.flatMap((one, k) => {
                if (k !== index) return [one];
                return changed === null ? [] : [changed];
              }),
            });
          }}
        />
      ))}
      {revisions.length < EVIDENCE_LIMITS.revisions && (
        <Button
          className="justify-self-start"
          onClick={() => {
            set({ revisions: [NO_REVISION, ...revisions] });
          }}
        >
          Add a revision
        </Button>
      )}
    </div>
  );
}
