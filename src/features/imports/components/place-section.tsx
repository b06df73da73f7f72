import { useState } from 'react';
import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import type { ImportDraft } from '../hooks/use-import-draft.ts';
import { accuracyInWords, SAID_BY } from '../place-words.ts';
import { PlaceCandidates } from './place-candidates.tsx';
import { PlaceShift } from './place-shift.tsx';
import { SystemSearch } from './system-search.tsx';

type Place = NonNullable<ImportAnswer['place']>;

type PlaceSectionProps = { readonly place: Place; readonly draft: ImportDraft };

/** The system that is used, who says so, and what is lost on the way to the scheme's. */
function SystemUsed({ place, crs }: { readonly place: Place; readonly crs: number }) {
  const isAnswered = place.crs === crs;
  return (
    <div>
      <p className="text-lead font-semibold">
        EPSG:{crs} {isAnswered && place.name}
      </p>
      <p className="text-small text-ink-2">
        {isAnswered
          ? `${SAID_BY[place.from]}; ${accuracyInWords(place.accuracy)}.`
          : 'Not checked with it yet.'}
      </p>
    </div>
  );
}

/** Where a file lies: its system, exchanged axes and a stated shift. */
export function PlaceSection({ place, draft }: PlaceSectionProps) {
  const [picks, setPicks] = useState(false);
  const { place: chosen } = draft.options;
  const asks = picks || chosen.crs === null;

  function pick(crs: number): void {
    setPicks(false);
    draft.chooseNow({ place: { ...chosen, crs } });
  }
  return (
    <Panel title="Where it lies">
      <div className="grid grid-cols-1 gap-3 pt-3">
        <div className="flex flex-wrap items-start justify-between gap-x-4 gap-y-2">
          {chosen.crs === null ? (
            <p className="text-lead font-semibold">The system is not known</p>
          ) : (
            <SystemUsed place={place} crs={chosen.crs} />
          )}
          {!asks && (
            <Button
              onClick={() => {
                setPicks(true);
              }}
            >
              Pick another
            </Button>
          )}
        </div>
        <p className="max-w-[70ch] text-body">{place.words}</p>
        <PlaceCandidates candidates={place.candidates} used={chosen.crs} onPick={pick} />
        {asks && <SystemSearch onChoose={pick} />}
        {picks && chosen.crs !== null && (
          <Button
            kind="quiet"
            className="justify-self-start"
            onClick={() => {
              setPicks(false);
            }}
          >
            Keep EPSG:{chosen.crs}
          </Button>
        )}
        <Checkbox
          label="Exchange the two axes"
          hint="For files that write northing before easting, or latitude before longitude."
          checked={chosen.exchangeAxes}
          onChange={({ target }) => {
            draft.chooseNow({ place: { ...chosen, exchangeAxes: target.checked } });
          }}
        />
        <PlaceShift
          shift={chosen.shift}
          onChange={(shift) => {
            draft.choose({ place: { ...chosen, shift } });
          }}
        />
      </div>
    </Panel>
  );
}
