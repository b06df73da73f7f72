import { CATEGORIES, type Category } from '../../../shared/damage/categories.ts';
import { DAMAGE, HATCH_TILE } from '../../../shared/presentation/damage-style.ts';
import { hatchPath } from '../../theme/damage.ts';

/** What a shape in a chart is filled with; `prefix` is the one that its HatchPatterns has. */
export function hatchFill(prefix: string, category: Category): string {
  return `url(#${prefix}-${category})`;
}

function HatchPattern({
  id,
  category,
  scale,
}: {
  readonly id: string;
  readonly category: Category;
  readonly scale: number;
}) {
  const { fill, hatch } = DAMAGE[category];
  return (
    <pattern
      id={id}
      width={HATCH_TILE}
      height={HATCH_TILE}
      patternUnits="userSpaceOnUse"
      patternTransform={`scale(${scale})`}
    >
      <rect width={HATCH_TILE} height={HATCH_TILE} fill={fill} />
      {hatch !== null && (
        <path d={hatchPath(category)} fill="none" stroke={hatch.colour} strokeWidth={hatch.width} />
      )}
    </pattern>
  );
}

/** The hatches of all categories for the shapes of one SVG; they are fixed to the page, not the shape. */
export function HatchPatterns({
  prefix,
  scale = 1,
}: {
  readonly prefix: string;
  readonly scale?: number;
}) {
  return (
    <defs>
      {CATEGORIES.map(({ category }) => (
        <HatchPattern
          key={category}
          id={`${prefix}-${category}`}
          category={category}
          scale={scale}
        />
      ))}
    </defs>
  );
}
