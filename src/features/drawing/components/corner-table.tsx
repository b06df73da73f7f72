import type { CornerAt } from '../../map/map-drawing.ts';
import type { CornerDraft } from '../drafts/draft.ts';
import {
  insertCorner,
  middleAfter,
  moveCorner,
  reasonToKeepCorner,
  removeCorner,
  removeHole,
  ringAt,
} from '../drafts/edit-corners.ts';
import { CornerRow } from './corner-row.tsx';
import { RingHead } from './ring-head.tsx';

type CornerTableProps<T extends CornerDraft> = {
  readonly draft: T;
  readonly chosen: CornerAt | null;
  readonly onEdit: (edit: (draft: T) => T) => void;
};

function ringName({ parts, tool }: CornerDraft, part: number, ring: number): string {
  if (tool === 'split' || tool === 'line') return 'Line';
  const name = ring === 0 ? 'Outline' : `Courtyard ${ring}`;
  return parts.length > 1 ? `Part ${part + 1}, ${name.toLowerCase()}` : name;
}

type RingRowsProps<T extends CornerDraft> = CornerTableProps<T> & {
  readonly part: number;
  readonly ring: number;
};

function RingTable<T extends CornerDraft>({ draft, chosen, onEdit, part, ring }: RingRowsProps<T>) {
  const name = ringName(draft, part, ring);
  const corners = ringAt(draft, { part, ring, corner: 0 });
  const word = draft.tool === 'split' || draft.tool === 'line' ? 'Point' : 'Corner';
  return (
    <table className="mt-2 w-full table-fixed border-collapse">
      <RingHead
        name={name}
        onRemove={
          ring === 0
            ? null
            : () => {
                onEdit((now) => removeHole(now, { part, ring, corner: 0 }));
              }
        }
      />
      <tbody>
        {corners.map((place, corner) => {
          const at = { part, ring, corner };
          const middle = middleAfter(draft, at);
          const isChosen =
            chosen?.part === part && chosen.ring === ring && chosen.corner === corner;
          return (
            <CornerRow
              key={corner}
              name={`${ring > 0 || draft.parts.length > 1 ? `${name}, ` : ''}${word} ${corner + 1}`}
              number={corner + 1}
              place={place}
              isChosen={isChosen}
              onMove={(to) => {
                onEdit((now) => moveCorner(now, at, to));
              }}
              onInsert={
                middle === null
                  ? null
                  : () => {
                      onEdit((now) => insertCorner(now, at, middle));
                    }
              }
              onRemove={() => {
                onEdit((now) => removeCorner(now, at));
              }}
              reasonToKeep={reasonToKeepCorner(draft, at)}
            />
          );
        })}
      </tbody>
    </table>
  );
}

/** Every corner of a draft in figures, so that what the pointer does can be done by keys. */
export function CornerTable<T extends CornerDraft>(props: CornerTableProps<T>) {
  const { parts } = props.draft;
  return parts.map((rings, part) =>
    rings.map((corners, ring) =>
      corners.length === 0 ? null : (
        <RingTable key={`${part}.${ring}`} {...props} part={part} ring={ring} />
      ),
    ),
  );
}
