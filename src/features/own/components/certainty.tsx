import { certaintyWords, OWNER_CAUTIONS } from '../../../../shared/presentation/owner-certainty.ts';
import type { OwnBuilding } from '../../../../shared/schemas/own.ts';

/** How sure a forecast is, and what has to be known of any. */
export function Certainty({ figures }: { readonly figures: NonNullable<OwnBuilding['figures']> }) {
  return (
    <>
      {certaintyWords(figures).map((paragraph) => (
        <p key={paragraph} className="mb-2 max-w-[34em]">
          {paragraph}
        </p>
      ))}
      <ul className="list-disc pl-5">
        {OWNER_CAUTIONS.map((caution) => (
          <li key={caution}>{caution}</li>
        ))}
      </ul>
    </>
  );
}
