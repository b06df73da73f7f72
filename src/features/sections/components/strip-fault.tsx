/** Why the method shows nothing. */
export function StripFault({ fault }: { readonly fault: string | null }) {
  if (fault === null) return null;
  return <p className="px-4 py-1 text-small text-clay-deep">No settlement is shown. {fault}</p>;
}
