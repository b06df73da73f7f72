import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import type { RegisterChange } from '../../../../shared/schemas/register-changes.ts';
import { buildingQuery } from '../../buildings/api/get-building.ts';
import { newCut, newOutline, outlineOf, type Draft } from '../drafts/draft.ts';
import { togglePicked } from '../drafts/edit-join.ts';
import { mapDrawingOf } from '../map-drawing-of.ts';
import { reasonAgainst, type Situation, type ToolId } from '../tools.ts';
import { overlapWords, sentWords } from '../send-draft.ts';
import { useAim } from './use-aim.ts';
import { useDone } from './use-done.ts';
import { useDrafting } from './use-drafting.ts';
import { useDrawingKeys } from './use-drawing-keys.ts';
import { useSaveDraft } from './use-save-draft.ts';

type Around = {
  readonly schemeId: string;
  readonly canDraw: boolean;
  /** Values of the selected building are being written: tools rest until that is saved or left. */
  readonly isWriting: boolean;
  /** The selected building, once it is there. */
  readonly building: BuildingAnswer | undefined;
  readonly select: (buildingId: number | null) => void;
};

/** A tool's first draft; null for those that draw nothing. */
function firstDraft(tool: ToolId, building: BuildingAnswer | undefined): Draft | null {
  switch (tool) {
    case 'draw':
      return newOutline();
    case 'edit':
      return building === undefined ? null : outlineOf(building);
    case 'split':
      return building === undefined ? null : newCut(building);
    case 'join':
      return { tool, buildings: building === undefined ? [] : [building] };
    case 'select':
    case 'remove':
    case 'undo':
    case 'redo':
      return null;
  }
}

/** What is left selected once a draft is saved. */
function selectedAfter(draft: Draft, left: readonly number[]): number | null {
  if (draft.tool === 'join') return draft.buildings[0]?.id ?? null;
  return draft.building?.id ?? left[0] ?? null;
}

/** Saves what is drawn and tells that it is done. */
function useSaving({ schemeId, building, select }: Around) {
  const drafting = useDrafting();
  const done = useDone(schemeId, select);
  const saving = useSaveDraft(schemeId, (change, { draft, reference }) => {
    const { changeId, buildingIds } = change;
    const before = building?.id ?? null;
    const words = sentWords(draft, reference);
    done.push({ changeId, words, remark: overlapWords(change), before });
    drafting.set(null);
    select(selectedAfter(draft, buildingIds));
  });
  function save(reference = ''): void {
    const { draft } = drafting;
    if (draft === null || saving.isPending) return;
    // the others will be gone
    if (draft.tool === 'join') select(draft.buildings[0]?.id ?? null);
    saving.save(draft, reference);
  }
  /** Saves on top of what somebody else did. */
  function saveOnTop(draft: Draft): void {
    saving.save(draft, '');
  }
  function changedByHand({ changeId }: RegisterChange): void {
    if (building === undefined) return;
    const { id, reference } = building;
    done.push({ changeId, words: `${reference} is changed.`, before: id });
  }
  return { drafting, done, saving, save, saveOnTop, changedByHand };
}

/** The tools for drawing on the plan: what is drawn, by pointer and keys, until it is saved. */
export function usePlanDrawing(around: Around) {
  const { schemeId, canDraw, isWriting, building } = around;
  const client = useQueryClient();
  const saved = useSaving(around);
  const { drafting, done, saving, save } = saved;
  const aim = useAim(schemeId);
  const [isSquare, setSquare] = useState(false);
  const [isRemoving, setRemoving] = useState(false);
  const { draft, chosen } = drafting;
  const tool: ToolId = draft?.tool ?? 'select';
  const situation: Situation = {
    tool,
    hasBuilding: building !== undefined,
    steps: drafting.steps,
    saved: done.saved,
    undone: done.undone,
    isWriting,
  };

  function begin(next: ToolId): void {
    drafting.leave(() => {
      saving.forget();
      done.forget();
      drafting.set(firstDraft(next, building));
      setRemoving(next === 'remove');
    });
  }
  function press(next: ToolId): void {
    if (!canDraw || saving.isPending || reasonAgainst(next, situation) !== null) return;
    if (next === 'undo') (draft === null ? done : drafting).undo();
    else if (next === 'redo') (draft === null ? done : drafting).redo();
    else if (next !== tool) begin(next);
  }
  function pick(buildingId: number): void {
    void client.query(buildingQuery(schemeId, buildingId)).then((one) => {
      drafting.editJoin((now) => togglePicked(now, one));
    }, drafting.keep);
  }
  /** A building of the map, or none, is pressed. */
  function pressBuilding(buildingId: number | null): void {
    if (isWriting) return;
    if (draft === null) around.select(buildingId);
    else if (buildingId !== null) pick(buildingId);
  }
  useDrawingKeys(drafting, { press, save }, canDraw);
  const hands = { ...aim, chosen, isSquare, edit: drafting.editShape, choose: drafting.choose };

  return {
    ...{ schemeId, canDraw },
    ...saved,
    ...{ press, pick, pressBuilding, situation },
    square: { isSquare, setSquare },
    removing: { building: isRemoving ? building : undefined, setRemoving },
    map: draft === null ? null : mapDrawingOf(draft, hands),
  };
}

export type PlanDrawing = ReturnType<typeof usePlanDrawing>;
