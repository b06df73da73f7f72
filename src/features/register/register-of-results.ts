import type { RegisterFilter } from '../../../shared/schemas/register.ts';
import { registerPath } from '../../config/paths.ts';
import { withFilter } from './register-address.ts';

/** The address of the register with only those buildings in it of which a run found something. */
export function registerOfResults(
  schemeId: string,
  found: Pick<RegisterFilter, 'any' | 'ranges' | 'unknown'>,
): string {
  return `${registerPath(schemeId)}?${withFilter(new URLSearchParams(), found).toString()}`;
}
