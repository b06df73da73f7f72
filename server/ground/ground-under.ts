import type { Transaction } from 'sequelize';
import { footprintMiddle } from '../../shared/building/footprint-middle.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import { SchemeGround } from '../models/scheme-ground.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Sampler } from './ground.ts';
import { unpackGround } from './pack-ground.ts';
import { samplerOf } from './sampler.ts';

const MILLIMETRES = 1000;

/** The last ground that was read: a person who draws draws several buildings. */
let last: { readonly key: string; readonly sampler: Sampler } | undefined;

async function openGround(scheme: Scheme, transaction: Transaction): Promise<Sampler | undefined> {
  const where = { schemeId: scheme.id };
  const kept = await SchemeGround.findOne({ where, attributes: ['at'], transaction });
  if (kept === null) return undefined;
  const key = `${scheme.id} ${kept.at.toISOString()}`;
  if (last?.key === key) return last.sampler;
  const { content } = await SchemeGround.findOne({ where, transaction, rejectOnEmpty: true });
  const sampler = await samplerOf(await unpackGround(content), scheme.crs);
  last = { key, sampler };
  return sampler;
}

/** The level at the middle of a building to the millimetre, and whether it is only that of the nearest point. */
export function sampleUnder(
  sampler: Sampler,
  footprint: FootprintRings,
): { level: number; isNearest: boolean } | null {
  const sample = sampler(footprintMiddle(footprint));
  if (sample === null) return null;
  return { ...sample, level: Math.round(sample.level * MILLIMETRES) / MILLIMETRES };
}

/** Asks for the level of a scheme's ground under a footprint; the ground is read when it is first asked for. */
export function groundUnder(
  scheme: Scheme,
  transaction: Transaction,
): (footprint: FootprintRings) => Promise<number | null> {
  let opened: Promise<Sampler | undefined> | undefined;
  return async (footprint) => {
    opened ??= openGround(scheme, transaction);
    const sampler = await opened;
    return sampler === undefined ? null : (sampleUnder(sampler, footprint)?.level ?? null);
  };
}
