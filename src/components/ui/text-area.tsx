import type { ComponentProps } from 'react';
import { classNames } from '../../lib/class-names.ts';
import { FieldFrame, INPUT_STYLE, type FieldWords } from './field-frame.tsx';

type TextAreaProps = FieldWords & Omit<ComponentProps<'textarea'>, 'id'>;

/** A field of several lines. */
export function TextArea({ label, hint, error, className, ...input }: TextAreaProps) {
  return (
    <FieldFrame label={label} hint={hint} error={error}>
      {(ties) => (
        <textarea
          rows={4}
          {...input}
          {...ties}
          className={classNames(INPUT_STYLE, 'block py-1.5 leading-normal', className)}
        />
      )}
    </FieldFrame>
  );
}
