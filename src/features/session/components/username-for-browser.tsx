/** Tells the browser's keeper of passwords whose password is set below. */
export function UsernameForBrowser({ email }: { readonly email: string }) {
  return (
    <input
      type="text"
      autoComplete="username"
      value={email}
      readOnly
      tabIndex={-1}
      aria-hidden="true"
      className="sr-only"
    />
  );
}
