type Point = readonly [number, number];

/** What a file holds, before it is believed: nothing of the features is checked yet. */
export type Drawing = {
  /** From the file's grid to longitude and latitude. */
  readonly place: (point: Point) => Point;
  readonly features: readonly { readonly geometry: unknown; readonly name: unknown }[];
};
