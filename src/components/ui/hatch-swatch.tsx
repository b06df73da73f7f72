import type { Category } from '../../../shared/damage/categories.ts';
import { classNames } from '../../lib/class-names.ts';
import { DAMAGE } from '../../../shared/presentation/damage-style.ts';
import { hatchTileUrl } from '../../theme/damage.ts';

/** A patch of a damage category; a number stands beside it, always. */
export function HatchSwatch({
  category,
  className = 'h-3.5 w-[22px]',
}: {
  readonly category: Category;
  readonly className?: string;
}) {
  return (
    <i
      aria-hidden="true"
      className={classNames(
        'inline-block flex-none border print:[print-color-adjust:exact]',
        className,
      )}
      style={{
        backgroundImage: `url("${hatchTileUrl(category)}")`,
        borderColor: DAMAGE[category].edge,
      }}
    />
  );
}
