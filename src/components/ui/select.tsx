import type { ComponentProps } from 'react';
import { classNames } from '../../lib/class-names.ts';
import { FieldFrame, INPUT_STYLE, type FieldWords } from './field-frame.tsx';

export type Option = { readonly value: string; readonly label: string };

type SelectProps = FieldWords &
  Omit<ComponentProps<'select'>, 'id' | 'children'> & {
    readonly options: readonly Option[];
    /** What is shown while nothing is chosen. */
    readonly unchosen?: string;
    readonly frameClassName?: string;
  };

/** One of a few. */
export function Select({
  label,
  hint,
  error,
  options,
  unchosen,
  frameClassName,
  className,
  ...select
}: SelectProps) {
  return (
    <FieldFrame label={label} hint={hint} error={error} className={frameClassName}>
      {(ties) => (
        <select
          {...select}
          {...ties}
          className={classNames(INPUT_STYLE, 'h-[30px] pr-1 text-ellipsis max-sm:h-11', className)}
        >
          {unchosen !== undefined && <option value="">{unchosen}</option>}
          {options.map(({ value, label: words }) => (
            <option key={value} value={value}>
              {words}
            </option>
          ))}
        </select>
      )}
    </FieldFrame>
  );
}
