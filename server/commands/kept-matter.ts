import type { Sequelize, Transaction } from 'sequelize';
import { AppError } from '../errors.ts';
import type { MovedMatter } from '../models/matter-changes.ts';
import { findMatterThreads, type FoundMatter } from '../models/matters.ts';
import { Person } from '../models/person.ts';
import type { Actor } from '../policies/actor.ts';
import type { Scheme } from '../models/scheme.ts';
import { recordChange } from './record-change.ts';

/** A matter of a scheme; of another scheme, or of none of these parties, it is not there. */
export async function readMatter(
  database: Sequelize,
  schemeId: string,
  which: { readonly id: string; readonly parties?: readonly string[] },
  transaction: Transaction | null = null,
): Promise<FoundMatter> {
  const [found] = await findMatterThreads(database, schemeId, which, transaction);
  if (found === undefined) throw new AppError('not-found');
  return found;
}

/** A matter at the version that was seen; an older one is refused. */
export async function readSeenMatter(
  database: Sequelize,
  schemeId: string,
  { id, version }: { readonly id: string; readonly version: number },
  transaction: Transaction,
): Promise<FoundMatter> {
  const found = await readMatter(database, schemeId, { id }, transaction);
  if (found.version !== version) throw new AppError('conflict');
  return found;
}

/** Refuses to write where the party was erased: the owner no longer looks in, and the team cannot read it. */
export function requireReader({ isErased }: FoundMatter): void {
  if (!isErased) return;
  const message = 'The personal data of this party have been erased. Nobody would read it.';
  throw new AppError('conflict', message);
}

/** Where a matter stands now, to be changed in part. */
export function standingOf({ state, due, assignedTo, suggestion }: FoundMatter): MovedMatter {
  return { state, due, assignedTo: assignedTo?.id ?? null, suggestion };
}

/** The person who brought a matter up, if mail may reach them. */
export async function readerOf(
  { isMailed, openedBy }: FoundMatter,
  transaction: Transaction,
): Promise<{ name: string; email: string } | null> {
  if (!isMailed) return null;
  const { name, email } = await Person.findByPk(openedBy, { transaction, rejectOnEmpty: true });
  return { name, email };
}

/** Tells the trail of a matter, without what people wrote. */
export async function recordMatter(
  by: Actor,
  scheme: Scheme,
  told: { readonly id: string; readonly action: string; before?: object; after?: object },
  transaction: Transaction,
): Promise<void> {
  const { id, ...change } = told;
  const subject = { kind: 'matter', id };
  await recordChange({ by, schemeId: scheme.id, subject, ...change }, transaction);
}
