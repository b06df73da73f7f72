import { useHotkeys } from '../../../hooks/use-hotkeys.ts';
import { useKeyHelp } from '../../../hooks/use-key-help.ts';
import type { CornerAt } from '../../map/map-drawing.ts';
import { DRAFT_KEYS, TOOL_KEYS } from '../draw-keys.ts';
import type { Draft } from '../drafts/draft.ts';
import { removeCorner, takeLastBack } from '../drafts/edit-corners.ts';
import { addingOf, beginRing, closeRing, leaveRing, type RingKind } from '../drafts/edit-rings.ts';
import type { ToolId } from '../tools.ts';
import type { Drafting } from './use-drafting.ts';
import { useDraftKeys } from './use-draft-keys.ts';

type Actions = {
  readonly press: (tool: ToolId) => void;
  readonly save: () => void;
};

/** Enter closes what is drawn and splits or joins; what is closed waits for its form. */
function close(draft: Draft | null, { editShape }: Drafting, save: () => void): boolean {
  if (draft === null || (draft.tool !== 'join' && draft.open === null)) return false;
  if (draft.tool === 'draw' || draft.tool === 'edit') editShape(closeRing);
  else save();
  return true;
}

/** Gives up what is being added, else all that is drawn. */
function giveUp({ draft, editShape }: Drafting, press: Actions['press']): boolean {
  if (draft === null) return false;
  if (draft.tool !== 'join' && addingOf(draft) !== null) editShape(leaveRing);
  else press('select');
  return true;
}

function remove({ chosen, editShape }: Drafting, press: Actions['press']): boolean {
  const at: CornerAt | null = chosen;
  if (at === null) press('remove');
  else editShape((now) => removeCorner(now, at));
  return true;
}

/** The keys of the tools and of what is drawn. */
export function useDrawingKeys(
  drafting: Drafting,
  { press, save }: Actions,
  active: boolean,
): void {
  const { draft } = drafting;
  const isClosed = draft !== null && draft.tool !== 'join' && draft.open === null;
  const begin = (kind: RingKind) => () => {
    drafting.editShape((now) => beginRing(now, kind));
  };
  useHotkeys({ h: begin('courtyard'), n: begin('part') }, active && isClosed);
  useKeyHelp(TOOL_KEYS, active);
  useKeyHelp(DRAFT_KEYS, active && draft !== null);
  useHotkeys(
    {
      v: () => { press('select'); },
      d: () => { press('draw'); },
      e: () => { press('edit'); },
      c: () => { press('split'); },
      u: () => { press('join'); },
    },
    active,
  ); // prettier-ignore
  useDraftKeys(
    {
      undo: () => { press('undo'); },
      redo: () => { press('redo'); },
      giveUp: () => giveUp(drafting, press),
      takeBack: () => {
        if (draft === null || draft.tool === 'join' || draft.open === null) return false;
        drafting.editShape(takeLastBack);
        return true;
      },
      remove: () => (draft !== null && drafting.chosen === null ? false : remove(drafting, press)),
      close: () => close(draft, drafting, save),
    },
    active,
  ); // prettier-ignore
}
