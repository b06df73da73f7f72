/** Why one row cannot be used, as a sentence; the other rows still can. */
export class RowFault extends Error {}
