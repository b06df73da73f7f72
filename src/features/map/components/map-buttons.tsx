import { classNames } from '../../../lib/class-names.ts';

type MapButtonsProps = {
  readonly onZoom: (steps: number) => void;
  readonly onFit: () => void;
};

type MapButtonProps = {
  readonly name: string;
  readonly keyName: string;
  readonly path: string;
  readonly onPress: () => void;
  readonly apart?: boolean;
};

function MapButton({ name, keyName, path, onPress, apart = false }: MapButtonProps) {
  return (
    <button
      type="button"
      aria-label={name}
      title={`${name} (${keyName})`}
      onClick={onPress}
      className={classNames(
        'grid size-[30px] place-items-center rounded text-ink-2 hover:bg-paper-sunk hover:text-ink',
        'max-sm:size-11',
        apart && 'mt-[3px] rounded-t-none border-t border-hairline',
      )}
    >
      <svg width="18" height="18" viewBox="0 0 18 18" aria-hidden="true">
        <path d={path} className="fill-none stroke-current" strokeWidth="1.5" />
      </svg>
    </button>
  );
}

/** What the keys + − F do, for who has a pointer. */
export function MapButtons({ onZoom, onFit }: MapButtonsProps) {
  return (
    <div
      role="group"
      aria-label="Move the map"
      className="flex flex-col rounded border border-rule bg-paper-raised p-[3px] shadow-lift"
    >
      <MapButton
        name="Zoom in"
        keyName="+"
        path="M9 3v12M3 9h12"
        onPress={() => {
          onZoom(1);
        }}
      />
      <MapButton
        name="Zoom out"
        keyName="−"
        path="M3 9h12"
        onPress={() => {
          onZoom(-1);
        }}
      />
      <MapButton
        apart
        name="Fit the scheme"
        keyName="F"
        path="M2.5 6.5v-4h4M11.5 2.5h4v4M15.5 11.5v4h-4M6.5 15.5h-4v-4M6 6h6v6H6z"
        onPress={onFit}
      />
    </div>
  );
}
