import { classNames } from '../../lib/class-names.ts';

type Segment<T extends string> = { readonly value: T; readonly label: string };

type SegmentsProps<T extends string> = {
  readonly label: string;
  readonly segments: readonly Segment<T>[];
  readonly value: T;
  readonly onChange: (value: T) => void;
};

/** Ways of seeing the same thing, one of them chosen. */
export function Segments<T extends string>({ label, segments, value, onChange }: SegmentsProps<T>) {
  return (
    <div role="group" aria-label={label} className="inline-flex rounded border border-control">
      {segments.map((segment) => (
        <button
          key={segment.value}
          type="button"
          aria-pressed={segment.value === value}
          onClick={() => {
            onChange(segment.value);
          }}
          className={classNames(
            'h-7 px-3 text-small font-medium max-sm:h-11 [&+&]:border-l [&+&]:border-control',
            segment.value === value
              ? 'bg-ink text-ink-on-dark'
              : 'bg-paper-raised hover:bg-paper-sunk',
          )}
        >
          {segment.label}
        </button>
      ))}
    </div>
  );
}
