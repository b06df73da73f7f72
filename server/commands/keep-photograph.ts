import type { Scheme } from '../models/scheme.ts';
import { VisitPhotographFile } from '../models/visit-photograph-file.ts';
import type { VisitPhotograph } from '../models/visit-photograph.ts';
import type { Services } from '../services.ts';
import { keepPhotographOnce } from './keep-photograph-once.ts';

/** Keeps the file of a photograph that a visit told of; the visit's line in the audit trail counts it. */
export function keepPhotograph(
  services: Services,
  scheme: Scheme,
  { id: photographId, keepsPlace }: VisitPhotograph,
  sent: Buffer,
): Promise<VisitPhotographFile> {
  return keepPhotographOnce(services, scheme, {
    sent,
    keepsPlace,
    write: async (file, transaction) =>
      (await VisitPhotographFile.findByPk(photographId, { transaction })) ??
      VisitPhotographFile.create({ photographId, ...file }, { transaction }),
  });
}
