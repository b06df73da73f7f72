import type { ReactNode } from 'react';
import type { Decision } from '../../../../shared/schemas/decision-answers.ts';
import { Facts } from '../../../components/ui/facts.tsx';
import { StateMark, type State } from '../../../components/ui/state-mark.tsx';
import { ValueChanges } from '../../../components/ui/value-changes.tsx';
import { classNames } from '../../../lib/class-names.ts';
import { formatMoment } from '../../../lib/format-date.ts';
import { decisionTitle } from '../../../../shared/presentation/decision-words.ts';
import { basisLines, changeLines } from '../basis-words.ts';

const MARKS: Readonly<Record<Decision['state'], { shape: State; words: string }>> = {
  'waiting for check': { shape: 'waiting', words: 'Waiting for check' },
  returned: { shape: 'in-hand', words: 'Returned' },
  withdrawn: { shape: 'not-started', words: 'Withdrawn' },
  checked: { shape: 'done', words: 'Checked' },
  superseded: { shape: 'done', words: 'Superseded' },
};

function Cell({
  word,
  isOpen = false,
  children,
}: {
  readonly word: string;
  readonly isOpen?: boolean;
  readonly children: ReactNode;
}) {
  return (
    <div className={classNames('min-w-0 px-2.5 py-1.5', isOpen && 'bg-clay-wash')}>
      <p className="text-cap text-ink-2">{word}</p>
      {children}
    </div>
  );
}

function Checked({ decision }: { readonly decision: Decision }) {
  const { state, checkedBy, checkedAt } = decision;
  const { shape, words } = MARKS[state];
  return (
    <Cell word="Checked" isOpen={state === 'waiting for check'}>
      <StateMark state={shape}>{words}</StateMark>
      {checkedBy !== null && <p>{checkedBy.name}</p>}
      {checkedAt !== null && <p className="text-ink-2">{formatMoment(checkedAt)}</p>}
    </Cell>
  );
}

/** What was changed since, so that the decision has to be looked at again. */
function Changed({ decision }: { readonly decision: Decision }) {
  const { changes, changedBy } = decision;
  if (changes.length === 0 || changedBy === null) return null;
  return (
    <div className="border-t border-hairline bg-clay-wash px-2.5 py-1.5">
      <p className="font-semibold">
        What this rests on has changed: run {changedBy.run}, rules version {changedBy.rulesVersion}.
      </p>
      <ValueChanges label="What has changed" changes={changeLines(changes)} />
    </div>
  );
}

/** One decision: what, by whom, checked by whom, and what it rests on. */
export function DecisionBlock({
  decision,
  children,
}: {
  readonly decision: Decision;
  /** What can be done, and why not. */
  readonly children?: ReactNode;
}) {
  const { reason, preparedBy, preparedAt, run, rulesVersion, comment, batch } = decision;
  return (
    <article
      aria-label={decisionTitle(decision)}
      className="mt-2 border border-ink text-small print:break-inside-avoid"
    >
      <div className="px-2.5 py-2">
        <p className="font-semibold">{decisionTitle(decision)}</p>
        {reason !== '' && <p className="mt-1 break-words whitespace-pre-line">{reason}</p>}
      </div>
      <div className="grid grid-cols-2 border-t border-hairline [&>*+*]:border-l [&>*+*]:border-hairline">
        <Cell word="Prepared">
          <p>{preparedBy.name}</p>
          <p className="text-ink-2">
            {formatMoment(preparedAt)}, on run {run.number}
          </p>
        </Cell>
        <Checked decision={decision} />
      </div>
      {comment !== null && (
        <p className="border-t border-hairline px-2.5 py-1.5 break-words whitespace-pre-line">
          “{comment}”
        </p>
      )}
      <Changed decision={decision} />
      <details className="border-t border-hairline px-2.5 py-1.5">
        <summary className="cursor-pointer">What it rests on, as it was prepared</summary>
        <Facts
          facts={[
            ...basisLines(decision.basis),
            ['Rules', `version ${rulesVersion}`],
            ...(batch.size > 1 ? [['Prepared with', `${batch.size - 1} others`] as const] : []),
          ]}
        />
      </details>
      {children !== undefined && (
        <div className="border-t border-hairline px-2.5 py-1.5">{children}</div>
      )}
    </article>
  );
}
