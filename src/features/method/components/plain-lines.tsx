/** Sentences, one a line. */
export function PlainLines({ lines }: { readonly lines: readonly string[] }) {
  return (
    <ul>
      {lines.map((line) => (
        <li key={line} className="border-b border-hairline py-1.5">
          <span className="block max-w-[90ch]">{line}</span>
        </li>
      ))}
    </ul>
  );
}

type NamedLinesProps = {
  readonly label: string;
  readonly lines: readonly (readonly [name: string, words: string])[];
};

/** Sentences, each under its name. */
export function NamedLines({ label, lines }: NamedLinesProps) {
  return (
    <dl aria-label={label}>
      {lines.map(([name, words]) => (
        <div
          key={name}
          className="grid gap-x-5 border-b border-hairline py-1.5 sm:grid-cols-[minmax(0,2fr)_minmax(0,5fr)] print:break-inside-avoid"
        >
          <dt className="font-semibold first-letter:uppercase">{name}</dt>
          <dd className="max-w-[84ch] first-letter:uppercase">{words}</dd>
        </div>
      ))}
    </dl>
  );
}
