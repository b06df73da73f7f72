import type { AskedFor } from '../../../../shared/schemas/appointments.ts';
import { Button } from '../../../components/ui/button.tsx';
import { askedDayWords } from '../appointment-words.ts';

type AskedDaysProps = {
  readonly askedFor: AskedFor;
  readonly onTake: ((day: AskedFor['days'][number]) => void) | null;
};

/** The days that an owner asked for; one is taken into the offer. */
export function AskedDays({ askedFor, onTake }: AskedDaysProps) {
  const { days, note } = askedFor;
  return (
    <div className="border-l-4 border-clay pl-3">
      <p className="text-small font-semibold">Days that suit better</p>
      <ul>
        {days.map((asked) => (
          <li key={askedDayWords(asked)} className="flex min-h-row items-center gap-3 text-body">
            {askedDayWords(asked)}
            {onTake !== null && (
              <Button
                kind="quiet"
                onClick={() => {
                  onTake(asked);
                }}
              >
                Take this day
              </Button>
            )}
          </li>
        ))}
      </ul>
      {note !== '' && (
        <p className="mt-1 text-small break-words text-ink-2" dir="auto">
          {note}
        </p>
      )}
    </div>
  );
}
