import { classNames } from '../../../lib/class-names.ts';
import type { MapLasso } from '../map-lasso.ts';

/** Begins an outline round buildings, or leaves it. */
export function LassoButton({ isDrawing, onPress }: Pick<MapLasso, 'isDrawing' | 'onPress'>) {
  return (
    <button
      type="button"
      aria-pressed={isDrawing}
      title="Draw round buildings to list them"
      onClick={onPress}
      className={classNames(
        'h-[36px] rounded border px-2.5 text-small shadow-lift max-sm:h-11',
        isDrawing
          ? 'border-select bg-select-wash text-ink'
          : 'border-rule bg-paper-raised text-ink-2 hover:bg-paper-sunk hover:text-ink',
      )}
    >
      Lasso
    </button>
  );
}

/** How it is drawn. */
export function LassoHint() {
  return (
    <div className="pointer-events-none! absolute inset-x-3 bottom-12 flex justify-center">
      <p
        role="status"
        className="rounded border border-rule bg-paper-raised px-2 py-1 text-small text-ink-2"
      >
        Draw round the buildings, or set corners. Enter closes the outline, Esc leaves it.
      </p>
    </div>
  );
}
