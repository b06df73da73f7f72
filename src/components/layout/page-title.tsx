/** The name of the page in the browser's tab. */
export function PageTitle({ children }: { readonly children: string }) {
  return <title>{`${children} · Groundsill`}</title>;
}
