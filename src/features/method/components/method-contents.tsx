/** A place on the page by its id and its name. */
export type Place = { readonly id: string; readonly title: string };

/** What stands on the page, to go there. */
export function MethodContents({ places }: { readonly places: readonly Place[] }) {
  return (
    <nav aria-label="On this page" className="text-small">
      <ul>
        {places.map(({ id, title }) => (
          <li key={id}>
            <a
              href={`#${id}`}
              className="flex min-h-7 items-center border-l-[3px] border-transparent px-3 py-1 leading-tight text-ink-2 no-underline hover:border-clay-line hover:text-ink max-md:min-h-11"
            >
              {title}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  );
}
