import type { OwnBuilding } from '../../../../shared/schemas/own.ts';
import { Select } from '../../../components/ui/select.tsx';
import { addressOf } from '../own-words.ts';

type BuildingChoiceProps = {
  readonly buildings: readonly OwnBuilding[];
  readonly chosen: number;
  readonly onChoose: (id: number) => void;
};

/** Which of several buildings the page is about. */
export function BuildingChoice({ buildings, chosen, onChoose }: BuildingChoiceProps) {
  if (buildings.length < 2) return null;
  return (
    <div className="mb-6 max-w-md print:hidden">
      <Select
        label="Which of your buildings?"
        options={buildings.map((building) => ({
          value: String(building.id),
          label: addressOf(building),
        }))}
        value={String(chosen)}
        onChange={({ target }) => {
          onChoose(Number(target.value));
        }}
      />
    </div>
  );
}
