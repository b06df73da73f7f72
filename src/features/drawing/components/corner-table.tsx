import type { CornerAt } from '../../map/map-drawing.ts';
import type { CornerDraft, RingAt } from '../drafts/draft.ts';
import {
  insertCorner,
  middleAfter,
  moveCorner,
  reasonToKeepCorner,
  removeCorner,
  ringAt,
} from '../drafts/edit-corners.ts';
import { isRemovable, removeRing } from '../drafts/edit-rings.ts';
import { CornerRow } from './corner-row.tsx';
import { RingHead } from './ring-head.tsx';

type CornerTableProps<T extends CornerDraft> = {
  readonly draft: T;
  readonly chosen: CornerAt | null;
  readonly onEdit: (edit: (draft: T) => T) => void;
};

/** As `Courtyard 1`, or `Part 2, courtyard 1` where there are several parts. */
function ringName({ parts, tool }: CornerDraft, { part, ring }: RingAt): string {
  if (tool === 'split' || tool === 'line') return 'Line';
  const name = ring === 0 ? 'Outline' : `Courtyard ${ring}`;
  return parts.length > 1 ? `Part ${part + 1}, ${name.toLowerCase()}` : name;
}

/** What goes with a ring: an outline takes its courtyards along. */
function removedName(draft: CornerDraft, at: RingAt): string {
  return at.ring === 0 ? `part ${at.part + 1}` : ringName(draft, at).toLowerCase();
}

type RingRowsProps<T extends CornerDraft> = CornerTableProps<T> & RingAt;

function RingTable<T extends CornerDraft>({ draft, chosen, onEdit, part, ring }: RingRowsProps<T>) {
  const name = ringName(draft, { part, ring });
  const corners = ringAt(draft, { part, ring });
  const word = draft.tool === 'split' || draft.tool === 'line' ? 'Point' : 'Corner';
  return (
    <table className="mt-2 w-full table-fixed border-collapse">
      <RingHead
        name={name}
        removed={removedName(draft, { part, ring })}
        onRemove={
          draft.open === null && isRemovable(draft, { part, ring })
            ? () => {
                onEdit((now) => removeRing(now, { part, ring }));
              }
            : null
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

/**
 * Every corner of a draft in figures, so that what the pointer does can be done by keys; while a ring is
 * drawn, its corners alone.
 */
export function CornerTable<T extends CornerDraft>(props: CornerTableProps<T>) {
  const { parts, open } = props.draft;
  if (open !== null) {
    return ringAt(props.draft, open).length > 0 && <RingTable {...props} {...open} />;
  }
  return parts.map((rings, part) =>
    rings.map((_, ring) => (
      <RingTable key={`${part}.${ring}`} {...props} part={part} ring={ring} />
    )),
  );
}
