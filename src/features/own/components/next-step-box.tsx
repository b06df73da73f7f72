import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { OwnLetter } from '../../../../shared/schemas/own.ts';
import { ownLetterPath } from '../../../config/paths.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { formatDay, formatWeekdayMoment } from '../../../lib/format-date.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useOwnZone } from '../hooks/use-own-zone.ts';
import type { NextStep } from '../next-step.ts';
import { AskedBox } from './asked-box.tsx';
import { HaveTheLetter } from './have-the-letter.tsx';
import { ChooseDay } from './choose-day.tsx';
import { ThanksNote } from './thanks-note.tsx';

type Done = { readonly onDone: (thanks: string) => void };

function ReadLetter({ letter, onDone }: Done & { readonly letter: OwnLetter }) {
  const scheme = useScheme();
  const zone = useOwnZone();
  const by = letter.answerBy === null ? '' : ` by ${formatDay(letter.answerBy)}`;
  return (
    <AskedBox title="Please tell us that you have our letter">
      <p className="mb-3">
        {`We wrote to you on ${formatDay(letter.sentAt, zone)}: `}
        <Link to={ownLetterPath(scheme.id, letter.id)}>{letter.subject}</Link>
        {`. Please tell us${by} that it has reached you. You do not have to agree with it.`}
      </p>
      <HaveTheLetter
        letterId={letter.id}
        onDone={() => {
          onDone('Thank you. We know that our letter has reached you. A mail confirms it.');
        }}
      />
    </AskedBox>
  );
}

function Waiting({ step }: { readonly step: NextStep }) {
  const scheme = useScheme();
  const zone = useOwnZone();
  if (step.kind === 'days are with us') {
    return (
      <AskedBox title="We have your days">
        <p>We look for a time that suits you, and write to you.</p>
      </AskedBox>
    );
  }
  if (step.kind === 'we come') {
    const { id, startsAt, place } = step.appointment;
    return (
      <AskedBox title="Our visit is settled">
        <p>
          We come on <b className="font-semibold">{formatWeekdayMoment(startsAt, zone)}</b>
          {`. Where: ${place}. If that no longer suits you, ask us.`}
        </p>
        <a
          href={apiPath`/api/schemes/${scheme.id}/own/appointments/${id}/calendar`}
          className="inline-flex min-h-touch items-center"
        >
          Put it into my calendar
        </a>
      </AskedBox>
    );
  }
  return (
    <AskedBox title="You need do nothing now">
      <p>We write to you when something is to be done.</p>
    </AskedBox>
  );
}

/** The one thing to do, and after it the thanks. */
export function NextStepBox({ step }: { readonly step: NextStep }) {
  const [thanks, setThanks] = useState<string | null>(null);
  return (
    <>
      {thanks !== null && (
        <ThanksNote key={thanks}>
          <p>{thanks}</p>
        </ThanksNote>
      )}
      {step.kind === 'read a letter' && (
        <ReadLetter key={step.letter.id} letter={step.letter} onDone={setThanks} />
      )}
      {step.kind === 'choose a day' && (
        <ChooseDay key={step.appointment.id} appointment={step.appointment} onDone={setThanks} />
      )}
      {step.kind !== 'read a letter' && step.kind !== 'choose a day' && <Waiting step={step} />}
    </>
  );
}
