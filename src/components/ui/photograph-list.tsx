type PhotographListProps = {
  readonly photographs: readonly {
    readonly id: string;
    readonly caption: string;
    readonly href: string;
  }[];
};

/** Photographs, small; each opens whole. */
export function PhotographList({ photographs }: PhotographListProps) {
  return (
    <ul aria-label="Photographs" className="mt-1.5 flex flex-wrap gap-2">
      {photographs.map(({ id, caption, href }, index) => (
        <li key={id} className="w-24">
          <a
            href={href}
            target="_blank"
            rel="noreferrer"
            className="block text-cap text-ink-2 no-underline"
          >
            <img
              src={href}
              alt={caption === '' ? `Photograph ${index + 1}` : ''}
              loading="lazy"
              className="size-24 border border-rule object-cover"
            />
            {caption}
          </a>
        </li>
      ))}
    </ul>
  );
}
