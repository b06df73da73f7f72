import type { Parts, Ring } from '../drafts/draft.ts';
import { areaWords } from '../measure-words.ts';
import { FigureLine } from './figure-line.tsx';

type SplitResultProps = {
  readonly reference: string;
  readonly line: Ring;
  readonly pieces: readonly Parts[];
};

/** What a line would make of a building. */
export function SplitResult({ reference, line, pieces }: SplitResultProps) {
  return (
    <div aria-live="polite">
      {pieces.length > 1 && (
        <dl>
          {pieces.map((piece, k) => (
            <FigureLine
              key={k}
              label={k === 0 ? `${reference} keeps` : 'A new building gets'}
              value={areaWords(piece)}
            />
          ))}
        </dl>
      )}
      {line.length > 1 && pieces.length < 2 && (
        <p className="py-1 text-small text-ink-2">
          The line does not cut the building yet: begin and end it outside.
        </p>
      )}
    </div>
  );
}
