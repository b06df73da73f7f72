import { useState, type SubmitEvent } from 'react';
import type { Measure } from '../../../../shared/schemas/measures.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useKeepMeasure } from '../api/keep-measure.ts';
import { draftOfMeasure, NO_MEASURE, readMeasure, type MeasureDraft } from '../measure-draft.ts';
import { MeasureFields } from './measure-fields.tsx';

type MeasureDialogProps = {
  readonly schemeId: string;
  /** The measure that is changed; null for a new one. */
  readonly measure: Measure | null;
  readonly buildingIds: readonly number[];
  /** Where along the line the building stands, for a limit to begin with. */
  readonly chainage: number | null;
  readonly onClose: () => void;
};

/** Adds or changes a protective measure. */
export function MeasureDialog(props: MeasureDialogProps) {
  const { schemeId, measure, buildingIds, chainage, onClose } = props;
  const [draft, setDraft] = useState(measure === null ? NO_MEASURE : draftOfMeasure(measure));
  const [faults, setFaults] = useState<Readonly<Record<string, string>>>({});
  const keep = useKeepMeasure(schemeId, measure, onClose);
  function set(change: Partial<MeasureDraft>) {
    setDraft({ ...draft, ...change });
  }
  function save(event: SubmitEvent) {
    event.preventDefault();
    const read = readMeasure(draft, buildingIds);
    setFaults('faults' in read ? read.faults : {});
    if ('values' in read) keep.mutate(read.values);
  }
  const title = measure === null ? 'Add a protective measure' : 'Change the measure';
  return (
    <Dialog open title={title} onClose={onClose}>
      <form onSubmit={save} noValidate className="grid gap-3">
        <MutationError failed="Nothing was kept." error={keep.error} />
        <MeasureFields {...{ draft, faults, chainage }} onChange={set} />
        <div className="flex gap-2">
          <Button kind="main" type="submit" busy={keep.isPending}>
            {measure === null ? 'Add it' : 'Keep it'}
          </Button>
          <Button onClick={onClose}>Leave it</Button>
        </div>
      </form>
    </Dialog>
  );
}
