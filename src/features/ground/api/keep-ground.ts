import type { QueryClient } from '@tanstack/react-query';
import type { GroundAnswer } from '../../../../shared/schemas/ground.ts';
import { refreshRegister } from '../../buildings/api/refresh-register.ts';
import { groundQuery } from './get-ground.ts';

/** Puts the ground as the server has just answered it in place; buildings took new levels from it. */
export function keepGround(
  client: QueryClient,
  schemeId: string,
  answer: GroundAnswer,
): Promise<void> {
  client.setQueryData(groundQuery(schemeId).queryKey, answer);
  return refreshRegister(client, schemeId);
}
