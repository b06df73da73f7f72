import { Link, type LinkProps } from 'react-router-dom';
import { buttonStyle, type ButtonKind } from './button-style.ts';

/** A link to another screen that looks like a button. */
export function ButtonLink({
  kind = 'plain',
  className,
  ...rest
}: LinkProps & { readonly kind?: ButtonKind }) {
  return <Link {...rest} className={buttonStyle(kind, className)} />;
}
