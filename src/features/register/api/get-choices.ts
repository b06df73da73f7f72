import { queryOptions } from '@tanstack/react-query';
import { registerChoicesSchema, type RegisterField } from '../../../../shared/schemas/register.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** The values that a field has in the register, the commonest first. */
export function registerChoicesQuery(schemeId: string, field: RegisterField) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'register', 'choices', field],
    queryFn: ({ signal }) =>
      apiGet(
        apiPath`/api/schemes/${schemeId}/register/choices/${field}`,
        registerChoicesSchema,
        signal,
      ),
  });
}
