import type { Sheet } from '../../../../shared/evidence/sheet.ts';
import type { Spot } from '../../../../shared/evidence/marks.ts';
import { classNames } from '../../../lib/class-names.ts';
import { useDrag } from '../hooks/use-drag.ts';
import { SheetMarks } from './sheet-marks.tsx';

type SheetViewProps = {
  readonly sheet: Sheet;
  readonly isTrueSize: boolean;
  /** Moves what the sheet shows; null where it cannot be moved. */
  readonly onMove: ((by: Spot) => void) | null;
};

/** A sheet as it will lie on paper. */
export function SheetView({ sheet, isTrueSize, onMove }: SheetViewProps) {
  const { name, width, height, marks } = sheet;
  const { shift, handlers } = useDrag(width, onMove);
  const words = onMove === null ? name : `${name}. Arrow keys or the mouse move the frame.`;
  return (
    <svg
      {...handlers}
      role={onMove === null ? 'img' : 'application'}
      aria-label={words}
      tabIndex={onMove === null ? undefined : 0}
      viewBox={`0 0 ${width} ${height}`}
      style={isTrueSize ? { width: `${width}mm` } : undefined}
      className={classNames(
        'block border border-rule bg-sheet shadow-lift',
        isTrueSize ? 'max-w-none' : 'w-full',
        onMove !== null && 'cursor-grab active:cursor-grabbing sm:touch-none',
      )}
    >
      <SheetMarks marks={marks} shift={shift} />
    </svg>
  );
}
