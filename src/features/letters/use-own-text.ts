import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { LetterWords } from '../../../shared/presentation/letter-text.ts';
import type { LetterKind } from '../../../shared/schemas/letter-settings.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { batchQuery } from './api/letter-batches.ts';
import { templatesQuery } from './api/letter-templates.ts';

/**
 * What is written for a batch of free text: what somebody typed, or what an earlier batch said, or what the
 * template begins with.
 */
export function useOwnText(kind: LetterKind, earlierId: string | null) {
  const scheme = useScheme();
  const [typed, setTyped] = useState<LetterWords | null>(null);
  const templates = useQuery(templatesQuery(scheme.id));
  const earlier = useQuery({
    ...batchQuery(scheme.id, earlierId ?? ''),
    enabled: earlierId !== null,
  });
  const template = templates.data?.find((one) => one.kind === 'free text');
  const first = template && { subject: template.subject, body: template.body };
  const begun = earlierId === null ? first : earlier.data && (earlier.data.text ?? first);
  const isFree = kind === 'free text';
  return {
    ...{ isFree, setTyped },
    earlier: isFree ? earlier.data?.batch : undefined,
    error: isFree ? (templates.error ?? earlier.error) : null,
    refetch: () => {
      void templates.refetch();
      if (earlierId !== null) void earlier.refetch();
    },
    text: isFree ? (typed ?? begun ?? null) : null,
    hasWritten: isFree && typed !== null,
  };
}
