import { useState } from 'react';
import { GROUND_LIMITS } from '../../../../shared/schemas/ground.ts';
import { Field } from '../../../components/ui/field.tsx';
import { SendLevels } from './send-levels.tsx';

const LARGEST = GROUND_LIMITS.bytes / 1024 / 1024;

type Words = { readonly source: string; readonly crs: string };
type Faults = { readonly source?: string; readonly crs?: string };

function faultsOf({ source, crs }: Words): Faults {
  return {
    ...(source.trim() === '' && { source: 'Say where the levels come from.' }),
    ...(!/^\d{4,5}$|^$/.test(crs.trim()) && { crs: 'Write an EPSG number, or nothing.' }),
  };
}

type LevelsFileFormProps = { readonly schemeId: string; readonly schemeCrs: number };

/** Spot heights or a grid from a file, with where they come from and which grid they are in. */
export function LevelsFileForm({ schemeId, schemeCrs }: LevelsFileFormProps) {
  const [words, setWords] = useState<Words>({ source: '', crs: '' });
  const [faults, setFaults] = useState<Faults>({});

  function write(some: Partial<Words>) {
    setWords({ ...words, ...some });
    setFaults({});
  }
  function originOf() {
    const found = faultsOf(words);
    setFaults(found);
    if (Object.keys(found).length > 0) return null;
    const crs = words.crs.trim() === '' ? undefined : Number(words.crs);
    return { source: words.source.trim(), crs };
  }
  return (
    <div className="grid gap-3 pt-3">
      <p className="text-small text-ink-2">
        A CSV with columns for easting, northing and level, or an ASCII grid (.asc). Up to {LARGEST}{' '}
        MB.
      </p>
      <Field
        label="Where the levels come from"
        placeholder="Laser scan of 2024, city survey"
        error={faults.source}
        value={words.source}
        maxLength={200}
        onChange={({ target }) => {
          write({ source: target.value });
        }}
      />
      <Field
        label="EPSG number of its points"
        hint={`Leave it empty where they are in the scheme’s own grid, ${schemeCrs}.`}
        frameClassName="max-w-[260px]"
        inputMode="numeric"
        error={faults.crs}
        value={words.crs}
        onChange={({ target }) => {
          write({ crs: target.value });
        }}
      />
      <SendLevels schemeId={schemeId} originOf={originOf} />
    </div>
  );
}
