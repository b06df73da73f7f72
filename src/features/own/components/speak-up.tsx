import { useId, useState } from 'react';
import type { MatterKind } from '../../../../shared/schemas/matters.ts';
import type { AnswerDays } from '../../../../shared/schemas/owner-terms.ts';
import type { OwnBuilding } from '../../../../shared/schemas/own.ts';
import { formatWeekday } from '../../../lib/format-date.ts';
import { FORM_WORDS } from '../own-words.ts';
import { Certainty } from './certainty.tsx';
import { MatterForm } from './matter-form.tsx';
import { ThanksNote } from './thanks-note.tsx';

type Opened = MatterKind | 'sure' | null;

const SURE = 'How sure are you?';

/** What often is wanted stands first. */
const ORDER: readonly (MatterKind | 'sure')[] = [
  'question',
  'concern',
  'sure',
  'correction',
  'claim',
];

type SpeakUpProps = {
  readonly building: OwnBuilding;
  readonly answerDays: AnswerDays;
  /** Whether anything may be sent: an archived scheme is only read. */
  readonly mayAnswer: boolean;
};

/** Ways to ask, to tell and to understand, one open at a time. */
export function SpeakUp({ building, answerDays, mayAnswer }: SpeakUpProps) {
  const id = useId();
  const [opened, setOpened] = useState<Opened>(null);
  const [thanks, setThanks] = useState<string | null>(null);
  const { figures } = building;
  const offered = ORDER.filter((one) => (one === 'sure' ? figures !== null : mayAnswer));
  function open(one: Opened) {
    setThanks(null);
    setOpened(one === opened ? null : one);
  }
  return (
    <div className="mt-4 print:hidden">
      <p className="flex flex-wrap gap-x-6">
        {offered.map((one) => (
          <button
            key={one}
            type="button"
            aria-expanded={one === opened}
            aria-controls={id}
            className="inline-flex items-center text-left text-clay-deep underline underline-offset-2 hover:text-ink"
            onClick={() => {
              open(one);
            }}
          >
            {one === 'sure' ? SURE : FORM_WORDS[one].link}
          </button>
        ))}
      </p>
      <div id={id} className={opened === null ? '' : 'mt-3 border-t border-hairline pt-4'}>
        {opened === 'sure' && figures !== null && (
          <section aria-label={SURE}>
            <h2 className="mb-2 text-h2">{SURE}</h2>
            <Certainty figures={figures} />
          </section>
        )}
        {opened !== null && opened !== 'sure' && (
          <MatterForm
            key={opened}
            buildingId={building.id}
            kind={opened}
            answerDays={answerDays[opened]}
            onDone={({ due }) => {
              setOpened(null);
              setThanks(`Thank you. Someone will answer by ${formatWeekday(due)}.`);
            }}
            onClose={() => {
              setOpened(null);
            }}
          />
        )}
      </div>
      {thanks !== null && (
        <ThanksNote>
          <p>{thanks}</p>
        </ThanksNote>
      )}
    </div>
  );
}
