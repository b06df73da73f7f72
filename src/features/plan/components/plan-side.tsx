import type { ComponentProps, RefObject } from 'react';
import type { BuildingRow, ExtentAnswer } from '../../../../shared/schemas/buildings.ts';
import { classNames } from '../../../lib/class-names.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import type { useSteps } from '../hooks/use-steps.ts';
import { BuildingSearch } from './building-search.tsx';
import { NoBuildings } from './no-buildings.tsx';
import { NothingSelected } from './nothing-selected.tsx';
import { SelectedBuilding, type BuildingQuery, type SheetProps } from './selected-building.tsx';
import { StepButtons } from './step-buttons.tsx';

type PlanSideProps = {
  /** What the scheme's extent is taken from; undefined until it is known. */
  readonly from: ExtentAnswer['from'] | undefined;
  readonly selected: number | null;
  readonly building: BuildingQuery;
  readonly sheet: SheetProps;
  readonly run: ComponentProps<typeof SelectedBuilding>['run'];
  readonly steps: ReturnType<typeof useSteps>;
  readonly onGoTo: (buildingId: number) => void;
  readonly onDeselect: () => void;
  /** Gets the focus when a building is chosen from the list. */
  readonly chosen: RefObject<HTMLDivElement | null>;
};

/** At the side of the map: find, go through, and what is selected. */
export function PlanSide(props: PlanSideProps) {
  const {
    from = 'buildings',
    selected,
    building,
    sheet,
    run,
    steps,
    onGoTo,
    onDeselect,
    chosen,
  } = props;
  const isWriting = sheet.view === 'edit';
  const scheme = useScheme();
  if (from !== 'buildings') {
    return <NoBuildings scheme={scheme} hasBackground={from === 'background'} />;
  }

  function choose({ id }: BuildingRow, words: string, found: readonly BuildingRow[]): void {
    steps.follow(words, found);
    onGoTo(id);
    chosen.current?.focus({ preventScroll: true });
  }
  return (
    <>
      {!isWriting && (
        <>
          <BuildingSearch schemeId={scheme.id} onChoose={choose} />
          <StepButtons
            trail={steps.trail}
            selected={selected}
            onStep={steps.step}
            onLeave={steps.leave}
          />
        </>
      )}
      <div
        ref={chosen}
        tabIndex={-1}
        aria-live={isWriting ? 'off' : 'polite'}
        className={classNames('outline-none', !isWriting && 'mt-4')}
      >
        {selected === null ? (
          <NothingSelected />
        ) : (
          <SelectedBuilding {...{ building, sheet, run, onDeselect }} />
        )}
      </div>
    </>
  );
}
