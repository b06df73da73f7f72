import type { ComponentProps, MouseEvent } from 'react';
import { buttonStyle, type ButtonKind } from './button-style.ts';

type ButtonProps = ComponentProps<'button'> & {
  readonly kind?: ButtonKind;
  /** Being done: the button stays in place and in focus, but takes no further press. */
  readonly busy?: boolean;
};

/** A button. What cannot be done is left out, not greyed. */
export function Button({
  kind = 'plain',
  busy = false,
  type = 'button',
  className,
  onClick,
  ...rest
}: ButtonProps) {
  function press(event: MouseEvent<HTMLButtonElement>) {
    if (busy) event.preventDefault();
    else onClick?.(event);
  }
  return (
    <button
      {...rest}
      type={type}
      aria-disabled={busy || undefined}
      className={buttonStyle(kind, className)}
      onClick={press}
    />
  );
}
