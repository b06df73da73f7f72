/** What lies on the paper, by name, as on the screen; the paper itself is white. */
export const INKS = {
  ink: '#16212e',
  second: '#3b4754',
  third: '#5c6570',
  hairline: '#d5ccb9',
  rule: '#a39a87',
  clay: '#9e4326',
  clayDeep: '#7a3019',
  clayWash: '#f3e1d5',
  clayLine: '#c98466',
  contour: '#2e4f78',
  select: '#174c9e',
  selectWash: '#dfe8f4',
  band: '#b9c4cf',
  bandLine: '#53677c',
  buildingEdge: '#a2977f',
  paper: '#ffffff',
} as const;
