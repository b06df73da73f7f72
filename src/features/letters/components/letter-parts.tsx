import type { Letter } from '../../../../shared/schemas/letters.ts';

/** What a letter says, as whoever gets it reads it; its link leads nowhere here. */
export function LetterParts({ parts }: Pick<Letter, 'parts'>) {
  return (
    <div className="grid max-w-[62ch] gap-3 text-[15px] leading-relaxed break-words">
      {parts.map((part, k) => {
        if (typeof part === 'string') return <p key={k}>{part}</p>;
        if ('link' in part) {
          return (
            <p key={k} className="text-clay-deep underline">
              {part.link}
            </p>
          );
        }
        return (
          <ul key={k} className="list-disc pl-5">
            {part.list.map((item, n) => (
              <li key={n}>{item}</li>
            ))}
          </ul>
        );
      })}
    </div>
  );
}
