/** Where a value stands in the bytes of a file. */
export type Span = { readonly start: number; readonly end: number };
