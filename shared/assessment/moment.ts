/**
 * A moment of the works: how far each drive has come.
 *
 * Units: face chainages m; undefined means the drive is complete. Valid: faces in the order of the
 * drives. Source: [own].
 */
export type Moment = { readonly name: string; readonly faces: readonly (number | undefined)[] };

/**
 * The moment when every drive is complete.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const ALL_COMPLETE: Moment = { name: 'all drives complete', faces: [] };
