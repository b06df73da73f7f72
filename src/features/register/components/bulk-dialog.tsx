import { useState } from 'react';
import type { BuildingAttributes } from '../../../../shared/schemas/building-fields.ts';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { doneWords } from '../bulk-summary.ts';
import type { Marks } from '../hooks/use-marks.ts';
import { BulkForm, NO_VALUES } from './bulk-form.tsx';
import { BulkReview } from './bulk-review.tsx';
import type { Done } from './done-line.tsx';

type BulkDialogProps = {
  readonly schemeId: string;
  readonly marks: Pick<Marks, 'filter' | 'count'>;
  readonly onClose: () => void;
  readonly onDone: (done: Done) => void;
};

/** Sets values for all buildings that are marked: what, then what that means, then done. */
export function BulkDialog({ schemeId, marks, onClose, onDone }: BulkDialogProps) {
  // what was marked when it was opened
  const [{ filter, count }] = useState(marks);
  const [draft, setDraft] = useState(NO_VALUES);
  const [attributes, setAttributes] = useState<BuildingAttributes | null>(null);
  const many = count === 1 ? 'one building' : `${formatCount(count)} buildings`;
  return (
    <Dialog open title={`Set values for ${many}`} onClose={onClose}>
      {attributes === null ? (
        <BulkForm
          draft={draft}
          onClose={onClose}
          onReview={(values, written) => {
            setDraft(written);
            setAttributes(values);
          }}
        />
      ) : (
        <BulkReview
          {...{ schemeId, filter, count, attributes }}
          onBack={() => {
            setAttributes(null);
          }}
          onDone={({ changeId }) => {
            onDone({ words: doneWords(attributes, count), changeIds: [changeId] });
            onClose();
          }}
        />
      )}
    </Dialog>
  );
}
