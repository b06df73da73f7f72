import { Button } from '../../../components/ui/button.tsx';
import { BuildingSearch } from '../../plan/components/building-search.tsx';
import { placeName } from '../../matters/matter-words.ts';

/** A building as a choice knows it. */
export type ChosenBuilding = {
  readonly id: number;
  readonly reference: string;
  readonly name: string | null;
  readonly address?: string | null;
};

type BuildingChoiceProps = {
  readonly schemeId: string;
  readonly error?: string | undefined;
  readonly value: ChosenBuilding | null;
  readonly onChoose: (building: ChosenBuilding | null) => void;
};

/** One building of the register, found by reference, name or address. */
export function BuildingChoice({ schemeId, error, value, onChoose }: BuildingChoiceProps) {
  return (
    <div>
      {value === null ? (
        <BuildingSearch schemeId={schemeId} onChoose={onChoose} />
      ) : (
        <>
          <p className="mb-1 text-small font-semibold">Building</p>
          <p className="flex min-h-[30px] items-center gap-3 text-body max-sm:min-h-11">
            <span className="min-w-0 truncate">{placeName(value)}</span>
            <Button
              kind="quiet"
              className="flex-none"
              onClick={() => {
                onChoose(null);
              }}
            >
              Another one
            </Button>
          </p>
        </>
      )}
      {error !== undefined && (
        <p role="alert" className="mt-1 text-small font-medium text-clay-deep">
          {error}
        </p>
      )}
    </div>
  );
}
