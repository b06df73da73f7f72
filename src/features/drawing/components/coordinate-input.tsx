import { useState } from 'react';
import { numberOf } from '../../../lib/number-of.ts';
import { coordinateText } from '../measure-words.ts';

type CoordinateInputProps = {
  readonly label: string;
  readonly value: number;
  readonly onChange: (value: number) => void;
};

/** An easting or northing. What is not written over keeps every digit. */
export function CoordinateInput({ label, value, onChange }: CoordinateInputProps) {
  const [written, setWritten] = useState<string | null>(null);
  const text = coordinateText(value);
  const number = written === null ? value : numberOf(written);

  function keep(): void {
    if (written === null || number === null) return;
    setWritten(null);
    if (written.trim() !== text) onChange(number);
  }
  return (
    <input
      aria-label={label}
      aria-invalid={number === null || undefined}
      title={number === null ? 'Write metres of the grid, as 412508.40.' : undefined}
      inputMode="decimal"
      autoComplete="off"
      value={written ?? text}
      onChange={({ target }) => {
        setWritten(target.value);
      }}
      onBlur={keep}
      onKeyDown={(event) => {
        if (event.key === 'Enter') keep();
        if (event.key === 'Escape') setWritten(null);
      }}
      className="h-7 w-full min-w-0 rounded border border-control bg-sheet px-1.5 text-right text-small aria-invalid:border-l-4 aria-invalid:border-clay max-md:h-11 max-sm:text-body"
    />
  );
}
