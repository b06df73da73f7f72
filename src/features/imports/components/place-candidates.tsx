import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { Button } from '../../../components/ui/button.tsx';

type PlaceCandidatesProps = {
  readonly candidates: NonNullable<ImportAnswer['place']>['candidates'];
  readonly used: number | null;
  readonly onPick: (code: number) => void;
};

/** Systems that the file's own words fit as well. */
export function PlaceCandidates({ candidates, used, onPick }: PlaceCandidatesProps) {
  const others = candidates.filter(({ code }) => code !== used);
  if (others.length === 0) return null;
  return (
    <div>
      <p className="mb-1 text-small font-semibold">
        {used === null ? 'One of these may be it' : 'Its words also fit'}
      </p>
      <ul className="flex flex-wrap gap-2">
        {others.map(({ code, name }) => (
          <li key={code} className="max-w-full">
            <Button
              className="max-w-full"
              onClick={() => {
                onPick(code);
              }}
            >
              <span className="truncate">
                {code} {name}
              </span>
            </Button>
          </li>
        ))}
      </ul>
    </div>
  );
}
