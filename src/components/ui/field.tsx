import type { ComponentProps, ReactNode } from 'react';
import { classNames } from '../../lib/class-names.ts';
import { FieldFrame, INPUT_STYLE, type FieldWords } from './field-frame.tsx';

export type FieldProps = FieldWords &
  Omit<ComponentProps<'input'>, 'id'> & {
    /** Stands after the figure and is part of the label for who hears it. */
    readonly unit?: ReactNode;
    /** A button beside the field. */
    readonly action?: ReactNode;
    readonly frameClassName?: string;
  };

function FieldLabel({ label, unit }: Pick<FieldProps, 'label' | 'unit'>) {
  if (unit === undefined) return label;
  return (
    <>
      {label}
      <span className="sr-only">, {unit}</span>
    </>
  );
}

/** A field of one line; with a unit it holds a figure and is set to the right. */
export function Field({
  label,
  hint,
  error,
  unit,
  action,
  frameClassName,
  className,
  ...input
}: FieldProps) {
  const words = { hint, error, className: frameClassName };
  return (
    <FieldFrame {...words} label={<FieldLabel label={label} unit={unit} />}>
      {(ties) => (
        <span className="flex items-center gap-1.5">
          <input
            {...input}
            {...ties}
            inputMode={input.inputMode ?? (unit === undefined ? undefined : 'decimal')}
            className={classNames(
              INPUT_STYLE,
              'h-[30px] max-sm:h-11',
              unit !== undefined && 'text-right',
              className,
            )}
          />
          {unit !== undefined && (
            <span aria-hidden="true" className="flex-none text-small text-ink-2">
              {unit}
            </span>
          )}
          {action}
        </span>
      )}
    </FieldFrame>
  );
}
