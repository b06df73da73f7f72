import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { LetterWords } from '../../../../shared/presentation/letter-text.ts';
import type { BatchPreview } from '../../../../shared/schemas/letter-batches.ts';
import {
  heldLetterSettingsSchema,
  type LetterKind,
  type LetterSettings,
} from '../../../../shared/schemas/letter-settings.ts';
import {
  previewedTemplateSchema,
  templateSchema,
  templatesSchema,
} from '../../../../shared/schemas/letter-templates.ts';
import { apiGet, apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { lettersKey } from './letters-key.ts';

/** What letters say, kind by kind. */
export function templatesQuery(schemeId: string) {
  return queryOptions({
    queryKey: [...lettersKey(schemeId), 'templates'],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/letter-templates`, templatesSchema, signal),
  });
}

type Written = LetterWords & { readonly partyId: string | null };

/** What is being written, as one of those who get it would read it. */
export function previewQuery(
  schemeId: string,
  { kind, leftOut, chosen }: BatchPreview,
  written: Written,
) {
  const asked = { ...written, leftOut, chosen };
  return queryOptions({
    queryKey: [...lettersKey(schemeId), 'look', kind, asked],
    queryFn: () =>
      apiSend(
        'POST',
        apiPath`/api/schemes/${schemeId}/letter-templates/${kind}/preview`,
        previewedTemplateSchema,
        asked,
      ),
    placeholderData: (before) => before,
  });
}

/** Keeps the next version of a template. */
export function useKeepTemplate(schemeId: string, kind: LetterKind, onDone: () => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (written: { basedOn: number; subject: string; body: string }) =>
      apiSend(
        'PUT',
        apiPath`/api/schemes/${schemeId}/letter-templates/${kind}`,
        templateSchema,
        written,
      ),
    onSuccess: onDone,
    onSettled: () => client.invalidateQueries({ queryKey: lettersKey(schemeId) }),
  });
}

/** What letters go by. */
export function letterSettingsQuery(schemeId: string) {
  return queryOptions({
    queryKey: [...lettersKey(schemeId), 'settings'],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/letter-settings`, heldLetterSettingsSchema, signal),
  });
}

/** Keeps the next version of what letters go by. */
export function useKeepLetterSettings(schemeId: string, onDone: () => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (asked: { basedOn: number; settings: LetterSettings }) =>
      apiSend(
        'POST',
        apiPath`/api/schemes/${schemeId}/letter-settings`,
        heldLetterSettingsSchema,
        asked,
      ),
    onSuccess: onDone,
    onSettled: () => client.invalidateQueries({ queryKey: lettersKey(schemeId) }),
  });
}
