import { formatCount } from '../../../../shared/presentation/format-number.ts';
import type { PartyImport } from '../../../../shared/schemas/party-imports.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import type { useChangePartyImport } from '../api/change-party-import.ts';

type TakeOverBarProps = {
  readonly answer: PartyImport;
  readonly changes: ReturnType<typeof useChangePartyImport>;
};

function counted(count: number, one: string, many: string): string {
  return `${formatCount(count)} ${count === 1 ? one : many}`;
}

function sentence({ counts }: PartyImport): string {
  const { rows, partiesAdded, partiesCompleted, problem } = counts;
  if (rows === 0) return 'No row names anybody. Say which column is what, and check again.';
  if (partiesAdded + partiesCompleted === 0) return 'Nothing in this file can be taken over.';
  const parts = [
    partiesAdded > 0 && counted(partiesAdded, 'party is added', 'parties are added'),
    partiesCompleted > 0 &&
      counted(
        partiesCompleted,
        'that is there gets what it lacks',
        'that are there get what they lack',
      ),
    problem > 0 && counted(problem, 'row is left out', 'rows are left out'),
  ].filter((part) => part !== false);
  return `${parts.join(', ')}. Nothing that is there is overwritten.`;
}

/** Takes over what was checked, or gives it up. */
export function TakeOverBar({ answer, changes }: TakeOverBarProps) {
  const { takeOver, giveUp, check } = changes;
  const { counts } = answer;
  const isIdle = counts.partiesAdded + counts.partiesCompleted === 0;
  const busy = takeOver.isPending || giveUp.isPending || check.isPending;
  return (
    <div className="mt-3 grid gap-2 border-t border-ink pt-3">
      <MutationError failed="Nothing was taken over." error={takeOver.error} />
      <MutationError failed="It was not given up." error={giveUp.error} />
      <MutationError failed="It was not checked." error={check.error} />
      <p className="text-body">{sentence(answer)}</p>
      <div className="flex flex-wrap gap-2">
        {!isIdle && (
          <Button
            kind="main"
            busy={busy}
            onClick={() => {
              takeOver.mutate(counts);
            }}
          >
            Take over
          </Button>
        )}
        <Button
          busy={busy}
          onClick={() => {
            giveUp.mutate();
          }}
        >
          Give up
        </Button>
      </div>
    </div>
  );
}
