import { useEffect, useRef } from 'react';
import type { GridPlace } from '../../map/place/grid-projection.ts';
import { classNames } from '../../../lib/class-names.ts';
import { CoordinateInput } from './coordinate-input.tsx';

type CornerRowProps = {
  /** How the corner is called, as `Corner 3`. */
  readonly name: string;
  readonly number: number;
  readonly place: GridPlace;
  readonly isChosen: boolean;
  readonly onMove: (place: GridPlace) => void;
  /** Without it there is no side after this corner. */
  readonly onInsert: (() => void) | null;
  readonly onRemove: () => void;
  /** Why the corner has to stay. */
  readonly reasonToKeep: string | null;
};

const BUTTON =
  'grid h-7 w-6 place-items-center rounded text-ink-2 hover:bg-paper-sunk hover:text-ink aria-disabled:text-rule max-md:size-11';

/** One corner in figures. */
export function CornerRow(props: CornerRowProps) {
  const { name, number, place, isChosen, onMove, onInsert, onRemove, reasonToKeep } = props;
  const row = useRef<HTMLTableRowElement>(null);
  useEffect(() => {
    if (isChosen) row.current?.scrollIntoView({ block: 'nearest' });
  }, [isChosen]);
  const [east, north] = place;
  return (
    <tr ref={row} className={classNames(isChosen && 'bg-select-wash')}>
      <th scope="row" className="pr-1.5 text-right text-cap font-normal text-ink-3">
        {number}
      </th>
      <td className="py-0.5 pr-1">
        <CoordinateInput
          label={`${name}, easting`}
          value={east}
          onChange={(value) => {
            onMove([value, north]);
          }}
        />
      </td>
      <td className="py-0.5">
        <CoordinateInput
          label={`${name}, northing`}
          value={north}
          onChange={(value) => {
            onMove([east, value]);
          }}
        />
      </td>
      <td className="w-12 max-md:w-[88px]">
        <div className="flex justify-end">
          {onInsert !== null && (
            <button
              type="button"
              aria-label={`Insert a corner after ${name.toLowerCase()}`}
              title="Insert a corner after this one"
              className={BUTTON}
              onClick={onInsert}
            >
              <span aria-hidden="true">+</span>
            </button>
          )}
          <button
            type="button"
            aria-label={`Remove ${name.toLowerCase()}`}
            aria-disabled={reasonToKeep !== null || undefined}
            title={reasonToKeep ?? 'Remove this corner'}
            className={BUTTON}
            onClick={onRemove}
          >
            <span aria-hidden="true">×</span>
          </button>
        </div>
      </td>
    </tr>
  );
}
