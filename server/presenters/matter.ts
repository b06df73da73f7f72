import {
  matterLineSchema,
  matterSchema,
  ownMatterSchema,
  type Matter,
  type MatterLine,
  type OwnMatter,
} from '../../shared/schemas/matter-answers.ts';
import type { FoundMatter, FoundMatterLine } from '../models/matters.ts';

type Person = { readonly id: string; readonly name: string };

function presentHead(matter: FoundMatter | FoundMatterLine) {
  const { id, kind, title, suggestion, state, due, openedAt, changedAt } = matter;
  return {
    ...{ id, kind, title, suggestion, state, due },
    openedAt: openedAt.toISOString(),
    changedAt: changedAt.toISOString(),
  };
}

function presentForTeam(matter: FoundMatter | FoundMatterLine) {
  const { number, party, assignedTo, isOverdue, version } = matter;
  return { ...presentHead(matter), number, party, assignedTo, isOverdue, version };
}

function presentMessage(message: Matter['messages'][number]) {
  const { id, text, writtenAt, photographs } = message;
  return { id, text, writtenAt: new Date(writtenAt).toISOString(), photographs };
}

/** What leaves the server of a matter to the inbox. */
export function presentMatterLine(matter: FoundMatterLine): MatterLine {
  const { building, messages } = matter;
  return matterLineSchema.parse({ ...presentForTeam(matter), building, messages });
}

/** What leaves the server of a matter to the team. */
export function presentMatter(matter: FoundMatter, assessors: readonly Person[]): Matter {
  const { building, isMailed, messages } = matter;
  return matterSchema.parse({
    ...presentForTeam(matter),
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
