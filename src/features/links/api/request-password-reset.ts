import { useMutation } from '@tanstack/react-query';
import { z } from 'zod';
import { apiSend } from '../../../lib/api-client.ts';

/** Asks for a link that sets a new password. The answer does not say whether the address is known. */
export function useRequestPasswordReset() {
  return useMutation({
    mutationFn: (body: { readonly email: string }) =>
      apiSend('POST', '/api/password-resets', z.unknown(), body),
  });
}
