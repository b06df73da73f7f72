type TickBoxProps = {
  /** What is said of it; nothing is written beside it. */
  readonly name: string;
  readonly checked: boolean;
  /** Some of what it stands for are ticked. */
  readonly mixed?: boolean;
  readonly onToggle: () => void;
};

/** A tick in a table. All of its cell can be pressed. */
export function TickBox({ name, checked, mixed = false, onToggle }: TickBoxProps) {
  return (
    <label className="-my-1 -mr-2 -ml-(--edge) flex h-7 cursor-pointer items-center pl-(--edge) max-sm:h-11">
      <input
        type="checkbox"
        aria-label={name}
        checked={checked}
        ref={(element) => {
          if (element !== null) element.indeterminate = mixed;
        }}
        onChange={onToggle}
        className="size-4 flex-none accent-ink"
      />
    </label>
  );
}
