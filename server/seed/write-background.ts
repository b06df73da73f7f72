import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import type { Transaction } from 'sequelize';
import { readBackground } from '../importers/read-background.ts';
import { insertBackgroundRows } from '../models/insert-background-rows.ts';
import type { Scheme } from '../models/scheme.ts';

const LAYERS = ['water', 'parks', 'streets'] as const;

/**
 * The ground of the demo town, for sheets on paper. The map shows the demo's own, finer one: its version stays
 * as if nothing had been brought in.
 */
export async function writeBackground(
  scheme: Scheme,
  townFolder: string,
  transaction: Transaction,
): Promise<void> {
  for (const layer of LAYERS) {
    const file = path.join(townFolder, `${layer}.geojson`);
    if (!existsSync(file)) continue;
    const rows = await readBackground(readFileSync(file), layer);
    await insertBackgroundRows(scheme.sequelize, { schemeId: scheme.id, layer }, rows, transaction);
  }
}
