import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import type { RegisterChange } from '../../../../shared/schemas/register-changes.ts';
import { isRefusal } from '../../../lib/api-error.ts';
import { buildingQuery } from '../../buildings/api/get-building.ts';
import { refreshRegister } from '../../buildings/api/refresh-register.ts';
import type { Draft } from '../drafts/draft.ts';
import { basesOf } from '../drafts/rebase.ts';
import { sendDraft } from '../send-draft.ts';

type Sent = { readonly draft: Draft; readonly reference: string };

/** Saves what was drawn; where somebody else came first, tells how the buildings are now. */
export function useSaveDraft(
  schemeId: string,
  onSaved: (change: RegisterChange, sent: Sent) => void,
) {
  const client = useQueryClient();
  const [fresh, setFresh] = useState<readonly BuildingAnswer[] | null>(null);

  async function compare(error: Error, draft: Draft): Promise<void> {
    if (!isRefusal(error, 'conflict')) return;
    const bases = basesOf(draft);
    const now = await Promise.all(
      bases.map(({ id }) => client.query({ ...buildingQuery(schemeId, id), staleTime: 0 })),
    );
    const isNewer = now.some(({ version }, k) => version !== bases[k]?.version);
    if (isNewer) setFresh(now);
  }
  const save = useMutation({
    mutationFn: ({ draft, reference }: Sent) => sendDraft(schemeId, draft, reference),
    onSuccess: async (change, sent) => {
      await refreshRegister(client, schemeId);
      onSaved(change, sent);
    },
    onError: (error, { draft }) => compare(error, draft),
  });
  return {
    isPending: save.isPending,
    error: fresh === null ? save.error : null,
    /** The buildings as somebody else left them; null where nobody did. */
    fresh,
    save: (draft: Draft, reference: string) => {
      setFresh(null);
      save.mutate({ draft, reference });
    },
    forget: () => {
      setFresh(null);
      save.reset();
    },
  };
}
