import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import type { GridPlace } from '../../map/place/grid-projection.ts';

/** Corners in order, the first not repeated at the end. */
export type Ring = readonly GridPlace[];
/** Parts of a building, each an outline and its courtyards. */
export type Parts = readonly (readonly Ring[])[];

/** One ring of a draft: the outline of a part is its first, courtyards follow. */
export type RingAt = { readonly part: number; readonly ring: number };

export const FIRST_RING: RingAt = { part: 0, ring: 0 };

/** What is set corner by corner. */
export type CornerDraft = {
  readonly tool: 'draw' | 'edit' | 'split' | 'line';
  /** Of a line, one part with one ring. */
  readonly parts: Parts;
  /** The ring whose corners are being set; null once all are closed. */
  readonly open: RingAt | null;
};

/** What is drawn of a building: a new one, another outline, or a line to split along. */
export type ShapeDraft = CornerDraft & {
  readonly tool: 'draw' | 'edit' | 'split';
  /** The building as it was seen; null for a new one. */
  readonly building: BuildingAnswer | null;
};

/** Buildings that are to become one, in the order in which they were picked. */
export type JoinDraft = { readonly tool: 'join'; readonly buildings: readonly BuildingAnswer[] };

export type Draft = ShapeDraft | JoinDraft;

/** A footprint as the register has it, without the repeated corners; no value of it is touched. */
export function partsOf(footprint: Parts): Parts {
  return footprint.map((part) =>
    part.map((ring) => {
      const [first, last] = [ring[0], ring.at(-1)];
      const isRepeated = ring.length > 1 && first?.[0] === last?.[0] && first?.[1] === last?.[1];
      return isRepeated ? ring.slice(0, -1) : ring;
    }),
  );
}

/** The same as it is sent: rings repeat their first corner. */
export function footprintOf(parts: Parts): [number, number][][][] {
  return parts.map((part) =>
    part.map((ring) => [...ring, ...ring.slice(0, 1)].map(([east, north]) => [east, north])),
  );
}

export function newOutline(): ShapeDraft {
  return { tool: 'draw', building: null, parts: [[[]]], open: FIRST_RING };
}

export function outlineOf(building: BuildingAnswer): ShapeDraft {
  return { tool: 'edit', building, parts: partsOf(building.footprint), open: null };
}

export function newCut(building: BuildingAnswer): ShapeDraft {
  return { tool: 'split', building, parts: [[[]]], open: FIRST_RING };
}

/** The corners of what is drawn one after another; of what is closed, its first outline. */
export function lineOf({ parts, open }: Pick<CornerDraft, 'parts' | 'open'>): Ring {
  const { part, ring } = open ?? FIRST_RING;
  return parts[part]?.[ring] ?? [];
}
