import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { LetterWords } from '../../../shared/presentation/letter-text.ts';
import type { LetterKind } from '../../../shared/schemas/letter-settings.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { templatesQuery } from './api/letter-templates.ts';

/**
 * What is written for a batch of free text: what somebody typed, or what an earlier batch said, or what the
 * template begins with.
 */
export function useOwnText(kind: LetterKind, earlier: LetterWords | null) {
  const [typed, setTyped] = useState<LetterWords | null>(null);
  const { data, error, refetch } = useQuery(templatesQuery(useScheme().id));
  const template = data?.find((one) => one.kind === 'free text');
  const first = template && { subject: template.subject, body: template.body };
  const isFree = kind === 'free text';
  return {
    ...{ isFree, setTyped },
    error: isFree ? error : null,
    refetch: () => void refetch(),
    text: isFree ? (typed ?? earlier ?? first ?? null) : null,
    hasWritten: isFree && typed !== null,
  };
}
