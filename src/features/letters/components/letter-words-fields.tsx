import { LETTER_MARKS, type LetterWords } from '../../../../shared/presentation/letter-text.ts';
import { Facts } from '../../../components/ui/facts.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';

const MARKS = Object.entries(LETTER_MARKS).map(([name, words]) => [`{${name}}`, words] as const);

type LetterWordsFieldsProps = {
  readonly written: LetterWords;
  readonly rows: number;
  readonly readOnly?: boolean;
  readonly onChange: (written: LetterWords) => void;
};

/** What a letter says, with marks, and which marks there are. */
export function LetterWordsFields({ written, rows, readOnly, onChange }: LetterWordsFieldsProps) {
  return (
    <>
      <Field
        label="Subject"
        readOnly={readOnly}
        value={written.subject}
        onChange={({ target }) => {
          onChange({ ...written, subject: target.value });
        }}
      />
      <TextArea
        label="Letter"
        hint="Empty lines part paragraphs; lines that begin with “- ” are a list."
        rows={rows}
        readOnly={readOnly}
        value={written.body}
        onChange={({ target }) => {
          onChange({ ...written, body: target.value });
        }}
      />
      <details className="text-small">
        <summary className="cursor-pointer">What can be put in</summary>
        <Facts facts={MARKS} />
      </details>
    </>
  );
}
