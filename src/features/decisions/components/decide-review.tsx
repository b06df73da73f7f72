import { useQuery } from '@tanstack/react-query';
import type { DecisionPreview } from '../../../../shared/schemas/decisions.ts';
import type { RegisterFilter } from '../../../../shared/schemas/register.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { slopeWords } from '../../../../shared/presentation/slope-words.ts';
import { millimetresFromMetres } from '../../../../shared/units/millimetres-from-metres.ts';
import { Button } from '../../../components/ui/button.tsx';
import { DamageChip } from '../../../components/ui/damage-chip.tsx';
import { Facts } from '../../../components/ui/facts.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { CATEGORIES } from '../../../../shared/damage/categories.ts';
import { usePrepareDecisions } from '../api/prepare-decisions.ts';
import { decisionPreviewQuery } from '../api/preview-decisions.ts';
import { KIND_WORDS } from '../../../../shared/presentation/decision-words.ts';
import type { Proposal } from './decide-form.tsx';

type DecideReviewProps = {
  readonly schemeId: string;
  readonly runId: string;
  readonly filter: RegisterFilter;
  readonly proposal: Proposal;
  readonly onBack: () => void;
  readonly onDone: (words: string) => void;
};

function Categories({ categories }: Pick<DecisionPreview, 'categories'>) {
  const some = CATEGORIES.filter(({ category }) => categories[category] > 0);
  if (some.length === 0) return 'none worked out: let go by screening';
  return (
    <span className="flex flex-wrap gap-x-3 gap-y-1">
      {some.map(({ category }) => (
        <span key={category} className="inline-flex items-center gap-1.5">
          <DamageChip category={category} /> {formatCount(categories[category])}
        </span>
      ))}
    </span>
  );
}

function Summary({ preview }: { readonly preview: DecisionPreview }) {
  const { settlement, slope, sensitive, assumed, listed, refused } = preview;
  return (
    <>
      <Facts
        facts={[
          ['Can have it', `${formatCount(preview.allowed)} of ${formatCount(preview.meant)}`],
          [
            'Largest of them',
            settlement === null || slope === null
              ? '–'
              : `${millimetresFromMetres(settlement).toFixed(2)} mm, ${slopeWords(slope)}`,
          ],
          ['Category, central', <Categories key="c" categories={preview.categories} />],
          ['Sensitive', formatCount(sensitive)],
          ['With assumed values', formatCount(assumed)],
          ['Listed', formatCount(listed)],
        ]}
      />
      {refused.length > 0 && (
        <>
          <p className="text-small font-semibold">Left out, and why</p>
          <ul tabIndex={0} aria-label="Left out" className="max-h-40 overflow-auto text-small">
            {refused.map(({ why, count }) => (
              <li key={why} className="flex gap-2 border-b border-hairline py-1 last:border-0">
                <span className="w-14 text-right tabular-nums">{formatCount(count)}</span>
                <span>{why}</span>
              </li>
            ))}
          </ul>
        </>
      )}
    </>
  );
}

/** What a decision comes to, before it is prepared. */
export function DecideReview(props: DecideReviewProps) {
  const { schemeId, runId, filter, proposal, onBack, onDone } = props;
  const { kind, category, reason } = proposal;
  const proposed = {
    ...{ runId, filter, kind, reason },
    ...(category !== null && { category }),
  };
  const { data: preview, error } = useQuery(decisionPreviewQuery(schemeId, proposed));
  const allowed = preview?.allowed ?? 0;
  const prepare = usePrepareDecisions(schemeId, () => {
    const what = KIND_WORDS[kind].toLowerCase();
    onDone(`${formatCount(allowed)} prepared: ${what}. Somebody else checks them.`);
  });
  return (
    <div className="grid gap-3">
      <p className="text-lead">{KIND_WORDS[kind]}</p>
      <MutationError failed="This could not be looked at." error={error} />
      <MutationError failed="Nothing was prepared." error={prepare.error} />
      {preview === undefined ? (
        <p className="appear-late text-small text-ink-2">Looking at them.</p>
      ) : (
        <Summary preview={preview} />
      )}
      <div className="flex gap-2">
        <Button
          kind="main"
          busy={prepare.isPending}
          disabled={allowed === 0}
          onClick={() => {
            prepare.mutate({ ...proposed, expected: allowed });
          }}
        >
          {`Prepare ${formatCount(allowed)} for check`}
        </Button>
        <Button onClick={onBack}>Back</Button>
      </div>
    </div>
  );
}
