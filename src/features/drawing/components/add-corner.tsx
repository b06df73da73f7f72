import { useRef, useState, type SubmitEvent } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { numberOf } from '../../../lib/number-of.ts';
import type { GridPlace } from '../../map/place/grid-projection.ts';

type AddCornerProps = {
  /** A corner of an outline, or a point of a line. */
  readonly what: 'corner' | 'point';
  readonly onAdd: (place: GridPlace) => void;
};

/** The next corner in figures. */
export function AddCorner({ what, onAdd }: AddCornerProps) {
  const [east, setEast] = useState('');
  const [north, setNorth] = useState('');
  const [fault, setFault] = useState<string | undefined>(undefined);
  const first = useRef<HTMLInputElement>(null);

  function add(event: SubmitEvent): void {
    event.preventDefault();
    const [x, y] = [numberOf(east), numberOf(north)];
    if (x === null || y === null) {
      setFault('Write both in metres of the grid.');
      return;
    }
    setFault(undefined);
    onAdd([x, y]);
    setEast('');
    setNorth('');
    first.current?.focus();
  }
  return (
    <form
      noValidate
      aria-label={`Add a ${what}`}
      className="mt-3 grid grid-cols-[1fr_1fr_auto] items-end gap-1.5"
      onSubmit={add}
    >
      <Field
        ref={first}
        label="Easting"
        inputMode="decimal"
        autoComplete="off"
        value={east}
        onChange={({ target }) => {
          setEast(target.value);
        }}
      />
      <Field
        label="Northing"
        inputMode="decimal"
        autoComplete="off"
        value={north}
        onChange={({ target }) => {
          setNorth(target.value);
        }}
      />
      <Button type="submit">Add {what}</Button>
      {fault !== undefined && (
        <p role="alert" className="col-span-3 text-small font-medium text-clay-deep">
          {fault}
        </p>
      )}
    </form>
  );
}
