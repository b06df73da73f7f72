import type { Transaction } from 'sequelize';
import type { RegisterChange } from '../../shared/schemas/register-changes.ts';
import { sampleUnder } from '../ground/ground-under.ts';
import { groundFacts, type Ground, type Sampler } from '../ground/ground.ts';
import { packGround } from '../ground/pack-ground.ts';
import { samplerOf } from '../ground/sampler.ts';
import { findLevelled } from '../models/find-ground.ts';
import { SchemeGround } from '../models/scheme-ground.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { ChangedBuilding } from '../register/register-edits.ts';
import type { Services } from '../services.ts';
import { changeRegister } from './change-register.ts';
import { lockScheme } from './lock-scheme.ts';

type Levels = { readonly changed: ChangedBuilding[]; readonly nearest: number };

/** The levels that a ground gives to buildings; without one, those from before go. */
async function levels(
  scheme: Scheme,
  sampler: Sampler | undefined,
  transaction: Transaction,
): Promise<Levels> {
  const changed: ChangedBuilding[] = [];
  let nearest = 0;
  for await (const building of findLevelled(scheme.sequelize, scheme.id, transaction)) {
    const { id, version, footprint } = building;
    const sample = sampler === undefined ? null : sampleUnder(sampler, footprint);
    if (sample?.isNearest === true) nearest += 1;
    const groundLevel = sample?.level ?? null;
    if (groundLevel !== building.groundLevel)
      changed.push({ id, version, attributes: { groundLevel } });
  }
  return { changed, nearest };
}

/** Where levels come from, with how many are only those of the nearest point. */
function told(source: string, nearest: number): string {
  if (nearest === 0) return source;
  return `${source} (${nearest} outside it took the nearest level)`;
}

/**
 * Takes a ground for a scheme in place of the one before, and gives its levels to buildings that have
 * none or had theirs from the ground; what a file or a hand said stays.
 */
export async function setGround(
  { database }: Services,
  by: Actor,
  scheme: Scheme,
  { ground, source }: { readonly ground: Ground; readonly source: string },
): Promise<RegisterChange> {
  const [content, sampler] = [await packGround(ground), await samplerOf(ground, scheme.crs)];
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    await SchemeGround.destroy({ where: { schemeId: scheme.id }, transaction });
    const { kind } = ground;
    const row = { schemeId: scheme.id, kind, source, personId: by.id, content };
    await SchemeGround.create({ ...row, ...groundFacts(ground) }, { transaction });
    const { changed, nearest } = await levels(scheme, sampler, transaction);
    const cause = { kind: 'ground', by, source: told(source, nearest) } as const;
    return changeRegister(database, scheme, cause, { changed }, transaction);
  });
}

/** Takes a scheme's ground away, and with it the levels that buildings had from it. */
export async function removeGround(
  { database }: Services,
  by: Actor,
  scheme: Scheme,
): Promise<RegisterChange> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    await SchemeGround.destroy({ where: { schemeId: scheme.id }, transaction });
    const cause = { kind: 'ground', by, source: 'The ground was removed' } as const;
    const { changed } = await levels(scheme, undefined, transaction);
    return changeRegister(database, scheme, cause, { changed }, transaction);
  });
}
