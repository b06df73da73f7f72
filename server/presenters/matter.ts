import {
  matterLineSchema,
  matterSchema,
  ownMatterSchema,
  type Matter,
  type MatterLine,
  type OwnMatter,
} from '../../shared/schemas/matter-answers.ts';
import type { FoundMatter, FoundMatterLine } from '../models/matters.ts';
import type { Actor } from '../policies/actor.ts';
import { isHiddenFrom } from '../policies/is-hidden-from.ts';

type Person = { readonly id: string; readonly name: string };

function presentHead(matter: FoundMatter | FoundMatterLine) {
  const { id, kind, title, suggestion, state, due, openedAt, changedAt } = matter;
  return {
    ...{ id, kind, title, suggestion, state, due },
    openedAt: openedAt.toISOString(),
    changedAt: changedAt.toISOString(),
  };
}

function presentForTeam(matter: FoundMatter | FoundMatterLine, actor: Actor) {
  const { number, party, assignedTo, isOverdue, isErased, version } = matter;
  return {
    ...presentHead(matter),
    ...(isHiddenFrom(actor, matter.isErased) && { title: '', suggestion: null }),
    ...{ number, party, assignedTo, isOverdue, isErased, version },
  };
}

function presentMessage(message: Matter['messages'][number]) {
  const { id, text, writtenAt, photographs } = message;
  return { id, text, writtenAt: new Date(writtenAt).toISOString(), photographs };
}

/** What leaves the server of a matter to the inbox. */
export function presentMatterLine(matter: FoundMatterLine, actor: Actor): MatterLine {
  const { building, messages } = matter;
  return matterLineSchema.parse({ ...presentForTeam(matter, actor), building, messages });
}

/** What leaves the server of a matter to the team. */
export function presentMatter(
  matter: FoundMatter,
  assessors: readonly Person[],
  actor: Actor,
): Matter {
  const { building, isMailed } = matter;
  const messages = isHiddenFrom(actor, matter.isErased) ? [] : matter.messages;
  return matterSchema.parse({
    ...presentForTeam(matter, actor),
    ...{ building, isMailed, assessors },
    messages: messages.map((message) => ({
      ...presentMessage(message),
      side: message.side,
      by: message.by,
    })),
  });
}

/** What leaves the server of a matter to its owner: no notes, and nobody of the team by name. */
export function presentOwnMatter(matter: FoundMatter): OwnMatter {
  const { id, reference, name, address } = matter.building;
  return ownMatterSchema.parse({
    ...presentHead(matter),
    building: { id, reference, name, address },
    messages: matter.messages
      .filter(({ side }) => side !== 'note')
      .map((message) => ({ ...presentMessage(message), side: message.side })),
  });
}
