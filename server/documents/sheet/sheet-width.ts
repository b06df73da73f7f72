/** The width of a sheet between its margins, in points: 700 pixels of a drawing. */
export const SHEET_WIDTH = 525;
