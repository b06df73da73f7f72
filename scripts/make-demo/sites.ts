import { closedSpline, pointAt, spline } from './lines.ts';
import { along, left, place, rectangle, unit } from './vector.ts';
import type { Line, Point, Ring } from './vector.ts';

/** Ground kept clear of streets and plots, whether open or for one landmark. */
export type Site = {
  readonly name: string;
  readonly kind: 'square' | 'churchyard' | 'park' | 'quay' | 'works' | 'school';
  readonly ring: Ring;
  /** Width of the street that goes round it; 0 for none. */
  readonly edge: number;
  readonly edgeName: string;
};

/** The line the demo's metro takes, west to east, for placing what it should pass. */
export const crossingLine: Line = spline(
  [
    [-60, 262], [60, 268], [180, 282], [310, 305], [430, 335], [550, 372], [660, 408], [760, 438],
    [880, 462], [1000, 474], [1100, 478],
  ], 12,
); // prettier-ignore

/** Chainage at the start of the line, as drawn on the schemes. */
const lineStart = 2060;

export function atChainage(chainage: number, offsetLeft: number): Point {
  const { point, heading } = pointAt(crossingLine, chainage - lineStart);
  return along(point, left(heading), offsetLeft);
}

function headingAt(chainage: number): Point {
  return pointAt(crossingLine, chainage - lineStart).heading;
}

export const boxFrom = 2906;
export const boxTo = 3026;

/** The station box: about 120 by 30 m under the Market Place. */
export function stationBox(): Ring {
  const middle = (boxFrom + boxTo) / 2;
  return rectangle(atChainage(middle, 0), headingAt(middle), boxTo - boxFrom, 30);
}

const market: Ring = [
  [-71, -22], [-40, -24.5], [10, -23], [72, -21], [74, 8], [70, 26], [20, 24], [-30, 25], [-68, 22],
]; // prettier-ignore
const churchyard: Ring = [
  [-40, -20], [4, -23], [38, -19], [42, 6], [33, 24], [-8, 27], [-38, 20], [-43, 2],
]; // prettier-ignore
const customs: Ring = [
  [-20, -24], [-6, -25], [20, -24], [33, -20], [32, 22], [4, 25], [-22, 25],
]; // prettier-ignore

const hillPark: Ring = closedSpline([
  [838, 640], [880, 588], [948, 592], [1000, 640], [1002, 702], [944, 742], [874, 730],
]); // prettier-ignore
const southPark: Ring = closedSpline([
  [560, 132], [606, 108], [664, 124], [690, 172], [652, 206], [592, 196],
]); // prettier-ignore
const westPark: Ring = closedSpline([
  [10, 460], [62, 440], [112, 470], [108, 530], [58, 556], [12, 520],
]); // prettier-ignore

/** Every kept site, in the order in which they take their ground. */
export function makeSites(): Site[] {
  const middle = (boxFrom + boxTo) / 2;
  const shaft = rectangle(atChainage(2696, -31), headingAt(2696), 34, 28);
  const westShaft = rectangle(atChainage(2236, 31), headingAt(2236), 36, 30);
  return [
    { name: 'Market Place', kind: 'square', ring: place(market, atChainage(middle, 0), headingAt(middle)), edge: 9, edgeName: 'Market Place' },
    { name: 'St Elwin’s churchyard', kind: 'churchyard', ring: place(churchyard, atChainage(2748, 46), headingAt(2748)), edge: 5, edgeName: 'Church Row' },
    { name: 'Customs Quay', kind: 'quay', ring: place(customs, atChainage(2640, 26), headingAt(2640)), edge: 0, edgeName: 'Customs Quay' },
    { name: 'Rope Walk yard', kind: 'works', ring: shaft, edge: 4, edgeName: 'Tarpaulin Lane' },
    { name: 'West Quay yard', kind: 'works', ring: westShaft, edge: 5, edgeName: 'Bollard Yard' },
    { name: 'School ground', kind: 'school', ring: rectangle([700, 566], unit([10, 2.6]), 86, 62), edge: 5, edgeName: 'School Lane' },
    { name: 'Fish quay', kind: 'quay', ring: rectangle([472, 184], unit([24, 60]), 84, 38), edge: 0, edgeName: 'Fish Quay' },
    { name: 'Ropewalk ground', kind: 'works', ring: rectangle([178, 612], unit([-40, 152]), 138, 22), edge: 0, edgeName: 'Ropewalk' },
    { name: 'Almoner’s green', kind: 'churchyard', ring: rectangle([508, 640], unit([10, 3]), 58, 46), edge: 4.5, edgeName: 'Almoner’s Row' },
    { name: 'Beacon Park', kind: 'park', ring: hillPark, edge: 7, edgeName: 'Beacon Park Road' },
    { name: 'Admiral’s Garden', kind: 'park', ring: southPark, edge: 6.5, edgeName: 'Garden Crescent' },
    { name: 'Netfield', kind: 'park', ring: westPark, edge: 6, edgeName: 'Netfield Road' },
  ]; // prettier-ignore
}
