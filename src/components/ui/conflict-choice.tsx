import { useState } from 'react';
import type { ValueChange } from '../../lib/changes-between.ts';
import { Button } from './button.tsx';
import { ValueChanges } from './value-changes.tsx';

type ConflictChoiceProps = {
  /** What the other person changed. */
  readonly changes: readonly ValueChange[];
  /** Takes their change in under what has been written here. */
  readonly onKeepMine: () => void;
};

/** Somebody else was faster: see what they changed, and go on from there without losing a word. */
export function ConflictChoice({ changes, onKeepMine }: ConflictChoiceProps) {
  const [isOpen, setOpen] = useState(false);
  return (
    <div className="grid gap-2">
      <div className="flex flex-wrap gap-2">
        <Button
          aria-expanded={isOpen}
          onClick={() => {
            setOpen(!isOpen);
          }}
        >
          {isOpen ? 'Close their change' : 'See their change'}
        </Button>
        <Button onClick={onKeepMine}>Keep mine on top of it</Button>
      </div>
      {isOpen && <ValueChanges label="Their change" changes={changes} />}
    </div>
  );
}
