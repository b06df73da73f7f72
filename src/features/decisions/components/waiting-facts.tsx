import { formatCount } from '../../../../shared/presentation/format-number.ts';
import type { WaitingDecisions } from '../../../../shared/schemas/decisions.ts';
import { Facts } from '../../../components/ui/facts.tsx';
import { KIND_WORDS } from '../../../../shared/presentation/decision-words.ts';

/** What waits for a check, line by line. */
export function WaitingFacts({ waiting }: { readonly waiting: WaitingDecisions }) {
  const { kinds, may, own, changed } = waiting;
  return (
    <Facts
      facts={[
        ...kinds.map(({ kind, count }) => [KIND_WORDS[kind], formatCount(count)] as const),
        ['For you to check', formatCount(may)],
        ['You prepared', own === 0 ? 'none' : `${formatCount(own)}: someone else checks`],
        ...(changed > 0
          ? [['Basis changed', `${formatCount(changed)}: open and return them`] as const]
          : []),
      ]}
    />
  );
}
