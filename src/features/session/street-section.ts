import type { Category } from '../../../shared/damage/categories.ts';

/** The drawing beside the sign-in: an invented street, drawn in no scale. */
export const SECTION = {
  width: 800,
  top: 70,
  height: 424,
  ground: 290,
  drives: [
    { x: 352, y: 446, radius: 34 },
    { x: 466, y: 446, radius: 34 },
  ],
} as const;

const DEEPEST = 46;
const TROUGH_WIDTH = 92;
const STEP = 8;

/** A house of the street. */
export type House = {
  readonly from: number;
  readonly to: number;
  readonly eaves: number;
  readonly roof: 'flat' | 'pitched' | 'spire';
  readonly category: Category;
};

function house(
  from: number,
  to: number,
  eaves: number,
  roof: House['roof'],
  category: Category,
): House {
  return { from, to, eaves, roof, category };
}

export const HOUSES: readonly House[] = [
  house(24, 62, 66, 'pitched', 0),
  house(62, 100, 66, 'pitched', 0),
  house(100, 138, 66, 'pitched', 0),
  house(166, 238, 128, 'flat', 1),
  house(256, 294, 70, 'pitched', 2),
  house(294, 332, 70, 'pitched', 2),
  house(332, 370, 70, 'pitched', 1),
  house(398, 420, 110, 'spire', 0),
  house(420, 488, 76, 'pitched', 1),
  house(508, 546, 62, 'pitched', 3),
  house(546, 584, 62, 'pitched', 2),
  house(584, 622, 62, 'pitched', 1),
  house(648, 706, 104, 'flat', 0),
  house(730, 776, 58, 'pitched', 0),
];

function settlementAt(x: number): number {
  return SECTION.drives.reduce((sum, drive) => {
    const away = (x - drive.x) / TROUGH_WIDTH;
    return sum + (DEEPEST / 2) * Math.exp(-(away * away) / 2);
  }, 0);
}

/** The ground after both drives, `factor` times as deep. */
export function troughPath(factor: number): string {
  const points: string[] = [];
  for (let x = 0; x <= SECTION.width; x += STEP) {
    points.push(`${x} ${(SECTION.ground + factor * settlementAt(x)).toFixed(1)}`);
  }
  return `M${points.join('L')}`;
}

/** A house standing on the ground as it has become. */
export function outlineOf({ from, to, eaves, roof }: House): string {
  const [left, right] = [from, to].map((x) => SECTION.ground + settlementAt(x));
  const [a, b] = [left ?? 0, right ?? 0];
  const middle = (from + to) / 2;
  const rise = { flat: 0, pitched: (to - from) * 0.4, spire: 118 }[roof];
  const ridge = `L${middle} ${((a + b) / 2 - eaves - rise).toFixed(1)}`;
  return `M${from} ${a.toFixed(1)}V${(a - eaves).toFixed(1)}${ridge}L${to} ${(b - eaves).toFixed(1)}V${b.toFixed(1)}Z`;
}
