import { Button } from '../../../components/ui/button.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import type { Trail } from '../hooks/use-steps.ts';

type StepButtonsProps = {
  readonly trail: Trail | null;
  readonly selected: number | null;
  readonly onStep: (by: 1 | -1) => void;
  readonly onLeave: () => void;
};

function Place({ trail, selected }: { readonly trail: Trail; readonly selected: number | null }) {
  const place = selected === null ? -1 : trail.ids.indexOf(selected);
  const count = place === -1 ? trail.ids.length : `${place + 1} of ${trail.ids.length}`;
  return (
    <>
      {count} found for <b className="font-semibold break-words text-ink">{trail.words}</b>
    </>
  );
}

/** Next and previous building, of what was found or of what is in view. */
export function StepButtons({ trail, selected, onStep, onLeave }: StepButtonsProps) {
  return (
    <div className="mt-3 border-y border-hairline py-2 text-small text-ink-2">
      <div className="flex flex-wrap items-center gap-2">
        <Button
          onClick={() => {
            onStep(-1);
          }}
        >
          Previous{' '}
          <span className="max-sm:hidden">
            <KeyCap>K</KeyCap>
          </span>
        </Button>
        <Button
          onClick={() => {
            onStep(1);
          }}
        >
          Next{' '}
          <span className="max-sm:hidden">
            <KeyCap>J</KeyCap>
          </span>
        </Button>
        {trail === null && <span>through buildings in view</span>}
      </div>
      {trail !== null && (
        <p className="mt-2">
          <Place trail={trail} selected={selected} />
          <Button kind="quiet" className="ml-1.5 h-6" onClick={onLeave}>
            Leave the list
          </Button>
        </p>
      )}
    </div>
  );
}
