import { useState } from 'react';
import type { BuildingValue } from '../../../../shared/schemas/building-fields.ts';
import { Button } from '../../../components/ui/button.tsx';
import type { Clash, EditedName } from '../building-draft.ts';
import { factsOf, formatFigure, inSentence } from '../../../../shared/presentation/field-words.ts';

type ClashChoiceProps = {
  readonly clash: Clash;
  readonly busy: boolean;
  /** What stood there before either changed it, where it is told too. */
  readonly before?: (name: EditedName) => BuildingValue;
  /** Saves mine of these names; the rest stays as somebody else left it. */
  readonly onSave: (mine: readonly EditedName[]) => void;
  readonly onBack: () => void;
};

function words(name: EditedName, value: BuildingValue): string {
  if (value === null) return 'not known';
  return typeof value === 'number' ? formatFigure(name, value) : value;
}

type ChoiceProps = Pick<ClashChoiceProps, 'before'> & {
  readonly both: Clash['both'][number];
  readonly takesMine: boolean;
  readonly onTake: (mine: boolean) => void;
};

function Choice({ both: { name, mine, theirs }, before, takesMine, onTake }: ChoiceProps) {
  const options = [
    { isMine: true, label: 'Mine', value: mine },
    { isMine: false, label: 'Theirs', value: theirs },
  ];
  return (
    <div
      role="radiogroup"
      aria-label={factsOf(name).label}
      className="grid grid-cols-[130px_minmax(0,1fr)] border-b border-hairline py-1.5 text-small"
    >
      <span className="row-span-2 py-1 text-ink-2">
        {factsOf(name).label}
        {before !== undefined && (
          <span className="block text-ink-3">was {words(name, before(name))}</span>
        )}
      </span>
      {options.map(({ isMine, label, value }) => (
        <label key={label} className="flex min-h-7 items-center gap-2 max-sm:min-h-11">
          <input
            type="radio"
            name={`clash-${name}`}
            checked={takesMine === isMine}
            onChange={() => {
              onTake(isMine);
            }}
            className="accent-ink"
          />
          <span className="w-10 text-ink-3">{label}</span>{' '}
          <b className="min-w-0 font-semibold break-words">{words(name, value)}</b>
        </label>
      ))}
    </div>
  );
}

/** Somebody else changed the same building: theirs beside mine, and nothing lost until it is chosen. */
export function ClashChoice({ clash, busy, before, onSave, onBack }: ClashChoiceProps) {
  const { both, mineOnly, theirsOnly } = clash;
  const [left, setLeft] = useState<readonly EditedName[]>([]);
  function take(name: EditedName, mine: boolean) {
    const others = left.filter((one) => one !== name);
    setLeft(mine ? others : [...others, name]);
  }
  const taken = both.map(({ name }) => name).filter((name) => !left.includes(name));
  return (
    <section aria-label="Changed by two" className="mt-3">
      <p role="alert" className="border-l-4 border-clay bg-clay-wash px-3 py-2.5 text-body">
        <b className="font-semibold">Somebody else changed this building meanwhile.</b>{' '}
        {both.length > 0
          ? 'Choose what to keep. Nothing of yours is saved yet.'
          : 'They changed other values than you. Save yours beside theirs?'}
      </p>
      {both.map((one) => (
        <Choice
          key={one.name}
          both={one}
          {...(before !== undefined && { before })}
          takesMine={!left.includes(one.name)}
          onTake={(mine) => {
            take(one.name, mine);
          }}
        />
      ))}
      {mineOnly.length > 0 && (
        <p className="mt-2 text-small">Saved as well: {mineOnly.map(inSentence).join(', ')}.</p>
      )}
      {theirsOnly.length > 0 && (
        <p className="mt-2 text-small text-ink-2">
          Stays as they left it: {theirsOnly.map(inSentence).join(', ')}.
        </p>
      )}
      <div className="mt-3 flex flex-wrap gap-2">
        <Button
          kind="main"
          busy={busy}
          onClick={() => {
            onSave([...mineOnly, ...taken]);
          }}
        >
          Save what is chosen
        </Button>
        <Button onClick={onBack}>Back to the form</Button>
      </div>
    </section>
  );
}
