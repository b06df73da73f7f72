import { useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import { ownMatterSchema, type OwnMatter } from '../../../../shared/schemas/matter-answers.ts';
import type { NewMatter, OwnMessage } from '../../../../shared/schemas/matters.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { apiUpload } from '../../../lib/api-upload.ts';
import type { AddedPhotograph } from '../hooks/use-photographs.ts';
import { ownKey } from './get-own.ts';

const photographAnswerSchema = z.object({ id: z.uuid() });

/** The address of a photograph of a matter. */
export function matterPhotographPath(
  schemeId: string,
  matterId: string,
  photographId: string,
): string {
  return apiPath`/api/schemes/${schemeId}/own/matters/${matterId}/photographs/${photographId}`;
}

/** Files follow one by one, so that on a weak network nothing is sent twice that has arrived. */
async function sendFiles(
  schemeId: string,
  matterId: string,
  photographs: readonly AddedPhotograph[],
): Promise<void> {
  for (const { id, file } of photographs) {
    await apiUpload({
      path: matterPhotographPath(schemeId, matterId, id),
      file: new File([file], 'photograph', { type: file.type }),
      schema: photographAnswerSchema,
      signal: new AbortController().signal,
      onProgress: () => undefined,
    });
  }
}

type Written = {
  readonly matter: NewMatter | (OwnMessage & { readonly matterId: string });
  readonly photographs: readonly AddedPhotograph[];
};

async function send(schemeId: string, { matter, photographs }: Written): Promise<OwnMatter> {
  const path = apiPath`/api/schemes/${schemeId}/own/matters`;
  if (!('matterId' in matter)) {
    const opened = await apiSend('POST', path, ownMatterSchema, matter);
    await sendFiles(schemeId, opened.id, photographs);
    return opened;
  }
  const { matterId, ...message } = matter;
  const to = `${path}${apiPath`/${matterId}/messages`}`;
  const answered = await apiSend('POST', to, ownMatterSchema, message);
  await sendFiles(schemeId, matterId, photographs);
  return answered;
}

/** Brings something up, or adds to it, with its photographs. Sent again it is there once. */
export function useSendMatter(schemeId: string, onDone: (matter: OwnMatter) => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (written: Written) => send(schemeId, written),
    onSuccess: onDone,
    onSettled: () => client.invalidateQueries({ queryKey: ownKey(schemeId) }),
  });
}
