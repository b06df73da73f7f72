import {
  keepPhotographFile,
  type MatterPhotograph,
  type PhotographFile,
} from '../models/matter-photographs.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Services } from '../services.ts';
import { keepPhotographOnce } from './keep-photograph-once.ts';

/**
 * Keeps the file of a photograph that an owner's message announced, without the place where it was taken; the
 * message's line in the audit trail counts it.
 */
export function keepMatterPhotograph(
  services: Services,
  scheme: Scheme,
  { id }: MatterPhotograph,
  sent: Buffer,
): Promise<PhotographFile> {
  return keepPhotographOnce(services, scheme, {
    sent,
    keepsPlace: false,
    write: (file, transaction) => keepPhotographFile(services.database, id, file, transaction),
  });
}
