import { useId, type ComponentProps, type ReactNode } from 'react';

type CheckboxProps = Omit<ComponentProps<'input'>, 'id' | 'type'> & {
  readonly label: ReactNode;
  readonly hint?: ReactNode;
};

/** Yes or no. The whole line can be pressed. */
export function Checkbox({ label, hint, ...input }: CheckboxProps) {
  const id = useId();
  const hintId = hint === undefined ? undefined : `${id}-hint`;
  return (
    <div>
      <label
        htmlFor={id}
        className="inline-flex min-h-6 cursor-pointer items-center gap-2 text-small max-sm:min-h-11"
      >
        <input
          {...input}
          id={id}
          type="checkbox"
          aria-describedby={hintId}
          className="size-4 flex-none rounded-none accent-ink"
        />
        {label}
      </label>
      {hint !== undefined && (
        <p id={hintId} className="pl-6 text-cap text-ink-3">
          {hint}
        </p>
      )}
    </div>
  );
}
