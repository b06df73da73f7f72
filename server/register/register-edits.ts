import type { BuildingAttributes } from '../../shared/schemas/building-fields.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import type { ImportedValues } from '../models/building-state.ts';
import type { GroundLevelFrom } from '../models/building.ts';
import type { RegisterChangeKind } from '../models/register-change.ts';
import type { Actor } from '../policies/actor.ts';

/** Why a register changes, and who changes it; nobody, where the demo is filled in. */
export type RegisterCause = {
  readonly kind: RegisterChangeKind;
  readonly by: Pick<Actor, 'id'> | null;
  /** Where values come from, in words: a file's name, a survey. */
  readonly source?: string | undefined;
  readonly importId?: string | undefined;
  /** The change that this one takes back. */
  readonly undoes?: string | undefined;
};

/** A list, or what gives one building after the other so that a hundred thousand need no memory. */
export type Many<T> = Iterable<T> | AsyncIterable<T>;

/** What takes the place of what is there; `imported` is written as a whole. */
type Written = {
  readonly imported?: ImportedValues | undefined;
  /** Left out, it follows from the kind of change. */
  readonly groundLevelFrom?: GroundLevelFrom | null | undefined;
};

/** A building to bring in. What its attributes leave out is unknown. */
export type CreatedBuilding = Written & {
  readonly reference: string;
  /** In the scheme's grid; rings are closed where they are not. */
  readonly footprint: FootprintRings;
  readonly attributes: BuildingAttributes;
};

/** A building to change, on top of a version. What is left out stays as it is. */
export type ChangedBuilding = Written & {
  readonly id: number;
  readonly version: number;
  readonly reference?: string | undefined;
  readonly attributes?: BuildingAttributes | undefined;
  readonly footprint?: FootprintRings | undefined;
};

/** A building to take out, or to put back, at a version. */
export type VersionedBuilding = { readonly id: number; readonly version: number };

/** All that a change does. Buildings are taken out first, so that their references are free. */
export type RegisterEdits = {
  readonly removed?: Many<VersionedBuilding> | undefined;
  readonly changed?: Many<ChangedBuilding> | undefined;
  readonly restored?: Many<VersionedBuilding> | undefined;
  readonly created?: Many<CreatedBuilding> | undefined;
};
