import { classNames } from '../../../lib/class-names.ts';
import { labelOf, type ShownBuilding } from '../shown-categories.ts';

/** The number of a category and a reference need so much of a building's width and height, in pixels. */
const NUMBERED_FROM = { width: 12, height: 14 };
const NAMED_FROM = { width: 40, height: 16 };
/** A line of words, in pixels. */
const LINE = 13;

type Frame = {
  readonly left: number;
  readonly right: number;
  readonly width: number;
  readonly height: number;
  readonly middle: number;
};

type StandingWordsProps = {
  readonly building: ShownBuilding;
  /** Where it stands in the drawing, in pixels. */
  readonly frame: Frame;
};

function fits({ width, height }: Frame, least: typeof NAMED_FROM, lines: number): boolean {
  return width >= least.width && height >= least.height + (lines - 1) * LINE;
}

/** The number of the category over the reference, as far as there is room. */
export function StandingWords({ building, frame }: StandingWordsProps) {
  const { reference, category } = building;
  const halo = category === null ? '' : 'stroke-paper-raised';
  const label = fits(frame, NUMBERED_FROM, 1) ? labelOf(building) : null;
  const lines = [
    ...(label === null ? [] : [{ words: label, isNumber: true }]),
    ...(fits(frame, NAMED_FROM, label === null ? 1 : 2)
      ? [{ words: reference, isNumber: false }]
      : []),
  ];
  return lines.map(({ words, isNumber }, k) => (
    <text
      key={isNumber ? 'category' : 'reference'}
      x={(frame.left + frame.right) / 2}
      y={frame.middle + 3.5 + (k - (lines.length - 1) / 2) * LINE}
      textAnchor="middle"
      // clear of the hatch, as on the map
      strokeWidth="3"
      paintOrder="stroke"
      className={classNames(
        halo,
        isNumber ? 'fill-ink text-cap font-semibold' : 'fill-ink-2 text-micro',
      )}
    >
      {words}
    </text>
  ));
}
