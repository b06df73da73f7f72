import { useState } from 'react';
import type { ImportOptions } from '../../../../shared/schemas/imports.ts';
import { Field } from '../../../components/ui/field.tsx';
import { metresOf } from '../metres-of.ts';

type Shift = ImportOptions['place']['shift'];

type PlaceShiftProps = { readonly shift: Shift; readonly onChange: (shift: Shift) => void };

type OneShiftProps = {
  readonly label: string;
  readonly value: number;
  readonly onChange: (metres: number) => void;
};

const FAULT = 'Write metres, from −2000 to 2000.';

function OneShift({ label, value, onChange }: OneShiftProps) {
  const [text, setText] = useState(String(value));
  const isShown = Object.is(metresOf(text), value) || Number.isNaN(value);
  return (
    <Field
      label={label}
      unit="m"
      frameClassName="w-[128px]"
      value={isShown ? text : String(value)}
      error={Number.isNaN(value) ? FAULT : undefined}
      onChange={({ target }) => {
        setText(target.value);
        onChange(metresOf(target.value));
      }}
    />
  );
}

/** A stated shift in the scheme's grid, for what the datums leave. */
export function PlaceShift({ shift: [east, north], onChange }: PlaceShiftProps) {
  return (
    <fieldset>
      <legend className="mb-1 text-small font-semibold">Stated shift</legend>
      <div className="flex flex-wrap gap-4">
        <OneShift
          label="East"
          value={east}
          onChange={(metres) => {
            onChange([metres, north]);
          }}
        />
        <OneShift
          label="North"
          value={north}
          onChange={(metres) => {
            onChange([east, metres]);
          }}
        />
      </div>
      <p className="mt-1 text-cap text-ink-3">
        Lay the footprints on the streets, then check again. It is kept with the import.
      </p>
    </fieldset>
  );
}
