/** How tables call the coordinates of a point, in one word and small letters. */
const [EASTINGS, NORTHINGS, HEIGHTS] = [
  /^(x|xcoord|xcoordinate|coordx|pointx|easting|eastings|east|lon|lng|long|longitude)$/,
  /^(y|ycoord|ycoordinate|coordy|pointy|northing|northings|north|lat|latitude)$/,
  /^(z|zcoord|zcoordinate|coordz|pointz|height|altitude|elevation)$/,
] as const;

function word(name: string): string {
  return name.toLowerCase().replaceAll(/[^a-z]/g, '');
}

/** Whether some columns of a table give points. */
export function givePoints(columns: readonly string[]): boolean {
  const words = columns.map(word);
  return [EASTINGS, NORTHINGS].every((names) => words.some((one) => names.test(one)));
}

/** Whether a table holds points and nothing else. */
export function giveOnlyPoints(columns: readonly string[]): boolean {
  const names = [EASTINGS, NORTHINGS, HEIGHTS];
  return givePoints(columns) && columns.map(word).every((one) => names.some((is) => is.test(one)));
}
