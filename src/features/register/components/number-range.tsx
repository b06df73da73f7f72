import { useState, type SubmitEvent } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { numberOf } from '../../../lib/number-of.ts';
import type { ColumnFilter } from '../filter-parts.ts';

type NumberRangeProps = {
  readonly unit: string | undefined;
  /** Whether there are buildings of which it is not known. */
  readonly mayBeUnknown: boolean;
  readonly chosen: ColumnFilter;
  readonly onChoose: (chosen: ColumnFilter) => void;
};

function asText(value: number | undefined): string {
  return value === undefined ? '' : String(value);
}

/** The end of a range as it is written: nothing for an open one, null for what is no number. */
function endOf(text: string): number | undefined | null {
  return text.trim() === '' ? undefined : numberOf(text);
}

/** From a figure to a figure, each of which may be left open, or only where it is not known. */
export function NumberRange({ unit, mayBeUnknown, chosen, onChoose }: NumberRangeProps) {
  const [from, setFrom] = useState(asText(chosen.range?.from));
  const [to, setTo] = useState(asText(chosen.range?.to));
  const [fault, setFault] = useState<string>();
  const suffix = unit === undefined ? {} : { unit };

  function choose(event: SubmitEvent) {
    event.preventDefault();
    const [least, most] = [endOf(from), endOf(to)];
    if (least === null || most === null) setFault('Write numbers.');
    else if (least !== undefined && most !== undefined && least > most) {
      setFault('From is more than to.');
    } else {
      setFault(undefined);
      onChoose({ range: { from: least, to: most } });
    }
  }
  return (
    <form noValidate onSubmit={choose} className="w-[220px]">
      <div className="grid grid-cols-2 gap-3">
        <Field
          label="From"
          {...suffix}
          error={fault}
          inputMode="decimal"
          value={from}
          onChange={({ target }) => {
            setFrom(target.value);
          }}
        />
        <Field
          label="To"
          {...suffix}
          inputMode="decimal"
          value={to}
          onChange={({ target }) => {
            setTo(target.value);
          }}
        />
      </div>
      <Button type="submit" className="mt-3">
        Show these
      </Button>
      {mayBeUnknown && (
        <div className="mt-3 border-t border-hairline pt-2">
          <Checkbox
            label="Only where it is not known"
            checked={chosen.unknown === true}
            onChange={({ target }) => {
              onChoose({ unknown: target.checked });
            }}
          />
        </div>
      )}
    </form>
  );
}
