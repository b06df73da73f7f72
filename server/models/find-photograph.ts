import { AppError } from '../errors.ts';
import { Visit } from './visit.ts';
import { VisitPhotograph } from './visit-photograph.ts';

type Place = { readonly visitId: string; readonly photographId: string };

export type FoundPhotograph = { readonly visit: Visit; readonly photograph: VisitPhotograph };

/** A photograph that a visit of a scheme told of, with the visit; any other one is not there. */
export async function findPhotograph(
  schemeId: string,
  { visitId, photographId }: Place,
): Promise<FoundPhotograph> {
  const [visit, photograph] = await Promise.all([
    Visit.findOne({ where: { id: visitId, schemeId } }),
    VisitPhotograph.findOne({ where: { id: photographId, visitId } }),
  ]);
  if (visit === null || photograph === null) throw new AppError('not-found');
  return { visit, photograph };
}
