import type { ReactNode } from 'react';

/** What a thing is, line by line: the word at the left, the value at the right. */
export function Facts({
  facts,
}: {
  readonly facts: readonly (readonly [word: string, value: ReactNode])[];
}) {
  return (
    <dl className="text-small">
      {facts.map(([word, value]) => (
        <div
          key={word}
          className="grid grid-cols-[116px_minmax(0,1fr)] gap-x-2 border-b border-hairline py-1 last:border-0"
        >
          <dt className="text-ink-2">{word}</dt>
          <dd className="break-words">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
