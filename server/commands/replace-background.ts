import type { BackgroundLayer } from '../../shared/schemas/background.ts';
import type { BackgroundRow } from '../importers/read-background.ts';
import { BackgroundFeature } from '../models/background-feature.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { insertBackgroundRows } from '../models/insert-background-rows.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';
import { refuseFarBackground } from './refuse-far-background.ts';

const AT_ONCE = 5000;

/** Puts these features into a layer of a scheme's background in place of what was there; none removes it. */
export async function replaceBackground(
  { database }: Services,
  actor: Actor,
  scheme: Scheme,
  { layer, rows }: { readonly layer: BackgroundLayer; readonly rows: readonly BackgroundRow[] },
): Promise<Scheme> {
  await refuseFarBackground(scheme, rows);
  const of = { schemeId: scheme.id, layer };
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const before = { features: await BackgroundFeature.destroy({ where: of, transaction }) };
    for (let first = 0; first < rows.length; first += AT_ONCE) {
      const some = rows.slice(first, first + AT_ONCE);
      await insertBackgroundRows(database, of, some, transaction);
    }
    const backgroundVersion = scheme.backgroundVersion + 1;
    await scheme.update({ backgroundVersion }, { transaction });
    const subject = { kind: 'background', id: layer };
    const after = { features: rows.length };
    await recordChange(
      { by: actor, schemeId: scheme.id, action: 'replace background', subject, before, after },
      transaction,
    );
    return scheme;
  });
}
