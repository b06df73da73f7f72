import type { BuildingAttributes } from '../../../../shared/schemas/building-fields.ts';
import type { RegisterFilter } from '../../../../shared/schemas/register.ts';
import type { RegisterChange } from '../../../../shared/schemas/register-changes.ts';
import { Button } from '../../../components/ui/button.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { useChangeMany } from '../../buildings/api/change-many.ts';
import { lineWords } from '../bulk-summary.ts';
import { useBulkLines } from '../hooks/use-bulk-lines.ts';

type BulkReviewProps = {
  readonly schemeId: string;
  readonly filter: RegisterFilter;
  readonly count: number;
  readonly attributes: BuildingAttributes;
  readonly onDone: (change: RegisterChange) => void;
  readonly onBack: () => void;
};

/** What will be set for how many, before it is. */
export function BulkReview(props: BulkReviewProps) {
  const { schemeId, filter, count, attributes, onDone, onBack } = props;
  const { lines, error } = useBulkLines(schemeId, filter, attributes);
  const change = useChangeMany(schemeId);
  return (
    <>
      <MutationError failed="What they have now was not counted." error={error} />
      {lines === undefined && error === null && <LoadingRows what="what they have now" rows={2} />}
      <ul className="text-body">
        {lines?.map((line) => (
          <li key={line.field} className="border-b border-hairline py-1.5">
            {lineWords(line, count)}
          </li>
        ))}
      </ul>
      <p className="mt-2 text-small text-ink-2">
        It can be undone as long as nobody goes on from it.
      </p>
      <div className="mt-2">
        <MutationError failed="Nothing was set." error={change.error} />
      </div>
      <div className="mt-3 flex gap-2">
        <Button
          kind="main"
          data-first-in-focus
          busy={change.isPending}
          onClick={() => {
            change.mutate({ filter, expected: count, attributes }, { onSuccess: onDone });
          }}
        >
          Set for {formatCount(count)}
        </Button>
        <Button onClick={onBack}>Back</Button>
      </div>
    </>
  );
}
