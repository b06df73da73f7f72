import type { PartyDetail } from '../../../../shared/schemas/party-answers.ts';
import { ValueChanges } from '../../../components/ui/value-changes.tsx';
import { changesBetween } from '../../../lib/changes-between.ts';
import { formatMoment } from '../../../lib/format-date.ts';
import { doneWords, valueWords } from '../party-words.ts';

/** Who changed what of a party, when, from which values to which. */
export function PartyHistory({ history }: { readonly history: PartyDetail['history'] }) {
  return (
    <ol>
      {history.map((entry, index) => {
        const { at, by, before, after } = entry;
        const changes = before === null || after === null ? [] : changesBetween(before, after);
        return (
          <li key={`${at} ${index}`} className="border-b border-hairline py-2 text-small">
            <div className="flex flex-wrap items-baseline gap-x-2">
              <time dateTime={at} className="text-ink-3">
                {formatMoment(at)}
              </time>
              <b className="font-semibold">{by ?? 'Groundsill'}</b>
              <span className="text-ink-2">{doneWords(entry)}</span>
            </div>
            {changes.length > 0 && (
              <div className="mt-1">
                <ValueChanges
                  label={`Changed on ${formatMoment(at)}`}
                  changes={changes.map((one) => ({ ...one, path: valueWords(one.path) }))}
                />
              </div>
            )}
          </li>
        );
      })}
    </ol>
  );
}
