import type { GridPlace } from './place/grid-projection.ts';

/** Which corner of a drawing: its part, the ring of the part, its place in the ring. */
export type CornerAt = { readonly part: number; readonly ring: number; readonly corner: number };

/** Something that the pointer can take hold of: a corner, or the middle of the side after it. */
export type Handle = {
  readonly kind: 'corner' | 'middle';
  readonly at: CornerAt;
  readonly place: GridPlace;
};

/** Where the pointer is, and what stands near enough to be snapped to. */
export type AimRequest = {
  readonly place: GridPlace;
  /** Buildings within reach, by number. */
  readonly near: readonly number[];
  /** In metres. */
  readonly reach: number;
  readonly isSquare: boolean;
  /** What is being dragged. */
  readonly held: Handle | null;
};

/** Where a corner comes to stand. */
export type Aim = {
  readonly place: GridPlace;
  readonly to: 'corner' | 'edge' | 'ground';
  readonly held: Handle | null;
};

/** How something that is drawn looks. */
export type DraftLook =
  'outline' | 'piece' | 'cut' | 'ghost' | 'corner' | 'middle' | 'chosen' | 'target';

/** What is seen of a drawing, in the grid; the text stands on it. */
export type DraftShape =
  | { readonly kind: 'area'; readonly look: DraftLook; readonly rings: readonly (readonly GridPlace[])[] }
  | { readonly kind: 'line'; readonly look: DraftLook; readonly places: readonly GridPlace[]; readonly text?: string }
  | { readonly kind: 'point'; readonly look: DraftLook; readonly place: GridPlace }
  | { readonly kind: 'text'; readonly place: GridPlace; readonly text: string }; // prettier-ignore

/** A drawing under way: what the pointer does to it and what is seen of it. */
export type MapDrawing = {
  /** Places are set one after another, or corners dragged; or only looked at. */
  readonly mode: 'line' | 'outline' | 'none';
  readonly handles: readonly Handle[];
  readonly shapes: (aim: Aim | null) => readonly DraftShape[];
  /** With what is known of the neighbours by now. */
  readonly aim: (request: AimRequest) => Aim;
  /** Once the neighbours are known exactly. */
  readonly settle: (request: AimRequest) => Promise<Aim>;
  /** A place was set, or what was dragged let go. */
  readonly put: (aim: Aim) => void;
  /** A handle was pressed without being dragged. */
  readonly press: (handle: Handle) => void;
};
