import { LEFT_OUT, type LeftOut } from '../what-if/left-out.ts';

/** Where the figures came from, when it was a sheet, and what of it is left out here. */
export function AboutSheet({ leftOut }: { readonly leftOut: readonly LeftOut[] }) {
  if (leftOut.length === 0) {
    return (
      <p className="mb-3 text-small text-ink-2">
        This began as a wall of a sheet: its figures are those of the sheet until something is
        changed.
      </p>
    );
  }
  return (
    <div className="mb-3 border-l-4 border-clay pl-3 text-small">
      <p>
        This began as a wall of a sheet, simplified, so its figures may differ from those of the
        sheet.
      </p>
      <ul className="mt-1 list-disc pl-4">
        {leftOut.map((one) => (
          <li key={one}>{LEFT_OUT[one]}</li>
        ))}
      </ul>
    </div>
  );
}
