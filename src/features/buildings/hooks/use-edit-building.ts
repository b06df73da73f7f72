import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import type { RegisterChange } from '../../../../shared/schemas/register-changes.ts';
import { isRefusal } from '../../../lib/api-error.ts';
import { useChangeBuilding } from '../api/change-building.ts';
import { buildingQuery } from '../api/get-building.ts';
import {
  changedNames,
  clashOf,
  editOf,
  onTopOf,
  type Clash,
  type EditedName,
  type WrittenBuilding,
} from '../building-draft.ts';

type Clashing = {
  readonly clash: Clash;
  readonly written: WrittenBuilding;
  readonly fresh: BuildingAnswer;
};

type Saved = (change: RegisterChange | null) => void;

/** Saves a building on top of the version that was seen; where that is gone, tells what clashes. */
export function useEditBuilding(schemeId: string, building: BuildingAnswer, onSaved: Saved) {
  const client = useQueryClient();
  // as it was when the form was opened, whatever is fetched meanwhile
  const [seen, setSeen] = useState(building);
  const [clashing, setClashing] = useState<Clashing | null>(null);
  const change = useChangeBuilding(schemeId, building.id);

  async function compare(error: Error, written: WrittenBuilding, base: BuildingAnswer) {
    if (!isRefusal(error, 'conflict')) return;
    const query = buildingQuery(schemeId, building.id);
    const fresh = await client.query({ ...query, staleTime: 0 });
    if (fresh.version === base.version) return;
    setClashing({ clash: clashOf(written, base, fresh), written, fresh });
  }
  function send(written: WrittenBuilding, names: readonly EditedName[], base: BuildingAnswer) {
    if (names.length === 0) {
      onSaved(null);
      return;
    }
    const { reference, attributes } = editOf(written, names);
    change.mutate(
      { version: base.version, attributes, ...(reference !== undefined && { reference }) },
      {
        onSuccess: onSaved,
        onError: (error) => void compare(error, written, base),
      },
    );
  }
  return {
    seen,
    clash: clashing?.clash ?? null,
    busy: change.isPending,
    error: clashing === null ? change.error : null,
    save: (written: WrittenBuilding) => {
      send(written, changedNames(written, seen), seen);
    },
    settle: (mine: readonly EditedName[]) => {
      if (clashing === null) return;
      const { written, fresh } = clashing;
      setSeen(fresh);
      setClashing(null);
      send(onTopOf(fresh, written, mine), mine, fresh);
    },
    /** Back to writing: mine on top of what somebody else left. */
    leaveClash: (): WrittenBuilding | null => {
      if (clashing === null) return null;
      const { written, fresh, clash } = clashing;
      setSeen(fresh);
      setClashing(null);
      change.reset();
      const mine = [...clash.mineOnly, ...clash.both.map(({ name }) => name)];
      return onTopOf(fresh, written, mine);
    },
  };
}
