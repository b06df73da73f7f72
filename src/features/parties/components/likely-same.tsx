import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { capital } from '../../../../shared/presentation/capital.ts';
import type { LikelySame as Groups } from '../../../../shared/schemas/party-answers.ts';
import { Button } from '../../../components/ui/button.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { likelySameQuery } from '../api/list-parties.ts';
import { MergeDialog } from './merge-dialog.tsx';
import { PartyName } from './party-name.tsx';

type Group = Groups[number];
type Pair = { readonly partyId: string; readonly otherId: string };

function OneGroup({
  group,
  onMerge,
  onOpen,
}: {
  readonly group: Group;
  readonly onMerge: ((pair: Pair) => void) | undefined;
  readonly onOpen: (id: string) => void;
}) {
  const [first, second] = group.parties;
  return (
    <li className="border-b border-hairline py-2.5">
      <div className="flex flex-wrap items-baseline justify-between gap-2">
        <h2 className="text-small font-semibold">{capital(group.because)}</h2>
        {onMerge !== undefined && first !== undefined && second !== undefined && (
          <Button
            onClick={() => {
              onMerge({ partyId: first.id, otherId: second.id });
            }}
          >
            {group.parties.length > 2 ? 'Merge the first two…' : 'Merge…'}
          </Button>
        )}
      </div>
      <ul className="text-small">
        {group.parties.map(({ id, name, address, email }) => (
          <li key={id} className="min-w-0 py-0.5 break-words">
            <button
              type="button"
              className="cursor-pointer text-left break-words text-clay-deep underline max-sm:min-h-11"
              onClick={() => {
                onOpen(id);
              }}
            >
              <PartyName name={name} />
            </button>{' '}
            <bdi className="text-ink-2">{[...address, email ?? 'no e-mail'].join(', ')}</bdi>
          </li>
        ))}
      </ul>
    </li>
  );
}

/** Parties that are likely one and the same, to be merged by somebody who knows. */
export function LikelySame({ onOpen }: { readonly onOpen: (id: string) => void }) {
  const scheme = useScheme();
  const [pair, setPair] = useState<Pair | null>(null);
  const { data, error, refetch } = useQuery(likelySameQuery(scheme.id));
  const close = () => {
    setPair(null);
  };
  return (
    <>
      {error !== null && (
        <QueryError what="The list" error={error} onRetry={() => void refetch()} />
      )}
      {error === null && data === undefined && <LoadingRows what="the list" />}
      {data?.length === 0 && (
        <p className="py-3 text-body text-ink-2">
          No two parties have the same e-mail, or the same name and address.
        </p>
      )}
      <ul>
        {data?.map((group) => (
          <OneGroup
            key={group.parties.map(({ id }) => id).join()}
            group={group}
            onMerge={can(scheme, 'updateParties') ? setPair : undefined}
            onOpen={onOpen}
          />
        ))}
      </ul>
      {pair !== null && (
        <MergeDialog schemeId={scheme.id} {...pair} onMerged={close} onClose={close} />
      )}
    </>
  );
}
