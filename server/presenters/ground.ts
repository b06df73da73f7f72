import type { GroundAnswer } from '../../shared/schemas/ground.ts';
import { countLevels } from '../models/find-ground.ts';
import { Person } from '../models/person.ts';
import { SchemeGround } from '../models/scheme-ground.ts';
import type { Scheme } from '../models/scheme.ts';

/** A scheme's ground and how many buildings took their level from it. */
export async function presentGround(scheme: Scheme): Promise<GroundAnswer> {
  const [kept, buildings] = await Promise.all([
    SchemeGround.findByPk(scheme.id, { attributes: { exclude: ['content'] } }),
    countLevels(scheme.sequelize, scheme.id),
  ]);
  if (kept === null) return { ground: null, buildings };
  const { kind, source, at, points, lowest, highest } = kept;
  const person = kept.personId === null ? null : await Person.findByPk(kept.personId);
  const by = person?.name ?? null;
  return { ground: { kind, source, by, at: at.toISOString(), points, lowest, highest }, buildings };
}
