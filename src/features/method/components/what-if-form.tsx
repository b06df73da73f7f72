import { Field } from '../../../components/ui/field.tsx';
import type { WhatIf } from '../what-if/use-what-if.ts';
import { WHAT_IF_FIELDS, type WhatIfName } from '../what-if/what-if-fields.ts';

type FiguresProps = {
  readonly whatIf: WhatIf;
  readonly legend: string;
  readonly unit?: string;
  /** What the labels leave out. */
  readonly words?: string;
  readonly names: readonly WhatIfName[];
  /** Side by side under one legend, as low, central and high. */
  readonly isRange?: boolean;
};

function Figures({ whatIf, legend, unit, words, names, isRange = false }: FiguresProps) {
  const { draft, faults, change } = whatIf;
  return (
    <fieldset className="mt-4 first:mt-0">
      <legend className="mb-1.5 w-full border-b border-hairline pb-1 text-small font-semibold">
        {legend}
        {unit !== undefined && <span className="font-normal text-ink-2"> {unit}</span>}
      </legend>
      <div
        className={
          isRange ? 'grid grid-cols-3 gap-2' : 'grid grid-cols-2 gap-x-3 gap-y-2 print:grid-cols-4'
        }
      >
        {names.map((name) => {
          const { label, unit: own } = WHAT_IF_FIELDS[name];
          return (
            <Field
              key={name}
              label={label}
              {...(isRange || own === '' ? { inputMode: 'decimal' } : { unit: own })}
              autoComplete="off"
              className="text-right"
              value={draft[name]}
              error={faults[name]}
              onChange={({ target }) => {
                change(name, target.value);
              }}
            />
          );
        })}
      </div>
      {words !== undefined && <p className="mt-1.5 text-cap text-ink-2">{words}</p>}
    </fieldset>
  );
}

/** What may be changed about the drive and the wall. */
export function WhatIfForm({ whatIf }: { readonly whatIf: WhatIf }) {
  return (
    <form
      aria-label="One drive and one wall"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
      }}
    >
      <Figures
        whatIf={whatIf}
        legend="Volume loss"
        unit="%"
        isRange
        names={['lossLow', 'lossCentral', 'lossHigh']}
      />
      <Figures
        whatIf={whatIf}
        legend="Trough width K"
        isRange
        names={['widthLow', 'widthCentral', 'widthHigh']}
      />
      <Figures
        whatIf={whatIf}
        legend="Drive"
        names={['diameter', 'axisDepth']}
        words="Diameter as excavated; the axis below ground level."
      />
      <Figures
        whatIf={whatIf}
        legend="Wall"
        words="From the axis: in plan, to where the wall begins. Height: from founding level to eaves. 90° leads straight away from the drive, 0° along it, −90° straight towards it."
        names={['distance', 'length', 'angle', 'height', 'founding', 'eOverG', 'poisson']}
      />
    </form>
  );
}
