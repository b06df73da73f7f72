import type { z } from 'zod';
import type { takeSuggestionSchema } from '../../shared/schemas/matters.ts';
import { AppError } from '../errors.ts';
import { updateMatter } from '../models/matter-changes.ts';
import type { FoundMatter } from '../models/matters.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { sendAnswer } from './answer-matter.ts';
import { changeRegister } from './change-register.ts';
import {
  readMatter,
  readSeenMatter,
  recordMatter,
  requireReader,
  standingOf,
} from './kept-matter.ts';
import { lockScheme } from './lock-scheme.ts';
import { numberedByOthers } from './same-message.ts';

type Asked = z.infer<typeof takeSuggestionSchema> & { readonly id: string };

/** What a matter suggests and has not been taken over yet. */
function openSuggestion(matter: FoundMatter) {
  requireReader(matter);
  const { suggestion, building } = matter;
  if (suggestion === null) throw new AppError('not-found');
  if (suggestion.isTakenOver) {
    throw new AppError('already-exists', 'The register has taken this over already.');
  }
  if (!building.isInRegister) {
    throw new AppError('not-found', 'The building has been taken out of the register.');
  }
  return suggestion;
}

/**
 * Takes what an owner suggests over into the register, answers them and closes the matter, all of it or nothing.
 * Refused where the matter or the building has changed since they were seen.
 */
export async function takeSuggestion(
  services: Services,
  by: Actor,
  scheme: Scheme,
  { id, version, buildingVersion, message }: Asked,
): Promise<FoundMatter> {
  const { database } = services;
  return numberedByOthers(database, async (transaction) => {
    await lockScheme(scheme, transaction);
    const matter = await readSeenMatter(database, scheme.id, { id, version }, transaction);
    const suggestion = openSuggestion(matter);
    const { field, value } = suggestion;
    const { number, building } = matter;
    const cause = { kind: 'edit', by, source: `Owner’s correction, matter ${number}` } as const;
    const changed = [{ id: building.id, version: buildingVersion, attributes: { [field]: value } }];
    const edits = { changed };
    const { changeId } = await changeRegister(database, scheme, cause, edits, transaction);
    await sendAnswer(services, by, scheme, { matter, message }, transaction);
    const standing = { ...standingOf(matter), state: 'closed' } as const;
    const taken = { ...suggestion, isTakenOver: true };
    await updateMatter(database, id, { ...standing, suggestion: taken }, transaction);
    const after = { number, field, registerChange: changeId };
    await recordMatter(by, scheme, { id, action: 'take suggestion over', after }, transaction);
    return readMatter(database, scheme.id, { id }, transaction);
  });
}
