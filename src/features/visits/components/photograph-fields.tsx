import { useState } from 'react';
import { VISIT_LIMITS } from '../../../../shared/schemas/visits.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { Field } from '../../../components/ui/field.tsx';
import type { KeptPhotograph } from '../draft/kept-visit.ts';
import { placeNow } from '../photographs/place-now.ts';
import { KeptPicture } from './kept-picture.tsx';

type PhotographFieldsProps = {
  readonly photograph: KeptPhotograph;
  readonly number: number;
  readonly onChange: (part: Partial<KeptPhotograph>) => void;
  readonly onRemove: () => void;
};

/** One photograph: its caption, and whether where it was taken may be kept. */
export function PhotographFields(props: PhotographFieldsProps) {
  const { photograph, number, onChange, onRemove } = props;
  const [isUnplaced, setUnplaced] = useState(false);
  async function keepPlace(keeps: boolean): Promise<void> {
    setUnplaced(false);
    onChange({ keepsPlace: keeps, place: null });
    if (!keeps) return;
    const place = await placeNow();
    if (place === null) setUnplaced(true);
    onChange({ keepsPlace: place !== null, place });
  }
  return (
    <fieldset className="flex gap-4 border-b border-hairline py-3">
      <legend className="sr-only">Photograph {number}</legend>
      <KeptPicture id={photograph.id} alt={photograph.caption || `Photograph ${number}`} />
      <div className="min-w-0 flex-1">
        <Field
          label="Caption"
          autoComplete="off"
          maxLength={VISIT_LIMITS.caption}
          value={photograph.caption}
          onChange={({ target }) => {
            onChange({ caption: target.value });
          }}
        />
        <Checkbox
          label="Keep where this was taken"
          checked={photograph.keepsPlace}
          onChange={({ target }) => void keepPlace(target.checked)}
        />
        <p role="status" className="text-small text-ink-2">
          {isUnplaced && 'This phone does not say where it is.'}
        </p>
        <Button aria-label={`Remove photograph ${number}`} onClick={onRemove}>
          Remove
        </Button>
      </div>
    </fieldset>
  );
}
