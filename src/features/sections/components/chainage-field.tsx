import { useState, type KeyboardEvent } from 'react';
import { INPUT_STYLE } from '../../../components/ui/field-frame.tsx';
import { classNames } from '../../../lib/class-names.ts';
import { chainageWords } from '../../../../shared/presentation/chainage-words.ts';
import { chainageOfText } from '../chainage-of-text.ts';

type ChainageFieldProps = {
  readonly chainage: number;
  readonly onGo: (chainage: number) => void;
};

/** Where the section is; it follows the cursor unless it is being written. */
export function ChainageField({ chainage, onGo }: ChainageFieldProps) {
  const [text, setText] = useState<string | null>(null);
  const written = text === null ? chainage : chainageOfText(text);

  function go(): void {
    if (text !== null && text !== chainageWords(chainage) && written !== null) onGo(written);
    setText(null);
  }
  function press({ key, currentTarget }: KeyboardEvent<HTMLInputElement>): void {
    if (key === 'Enter') go();
    if (key === 'Escape') {
      setText(null);
      currentTarget.blur();
    }
  }
  return (
    <label className="flex items-center gap-1.5 text-small">
      <span>
        at<span className="sr-only"> chainage</span>
      </span>
      <span className="w-[72px] max-sm:w-24">
        <input
          inputMode="decimal"
          autoComplete="off"
          value={text ?? chainageWords(chainage)}
          aria-invalid={written === null || undefined}
          onChange={({ target }) => {
            setText(target.value);
          }}
          onBlur={go}
          onKeyDown={press}
          className={classNames(INPUT_STYLE, 'h-7 text-right font-semibold max-sm:h-11')}
        />
      </span>
    </label>
  );
}
