import type { SourceSpecification } from 'maplibre-gl';
import type { SourcesByName } from '../style/sources-of-plan.ts';
import { isSame } from './is-same.ts';

/** How the sources of one plan become those of another. */
export type SourceChanges = {
  readonly removed: readonly string[];
  readonly added: readonly (readonly [string, SourceSpecification])[];
  /** The same tiles at another address: layers and marks stay. */
  readonly readdressed: readonly (readonly [string, string[]])[];
};

function newAddress(before: SourceSpecification, after: SourceSpecification): string[] | null {
  if (before.type !== 'vector' || after.type !== 'vector' || after.tiles === undefined) return null;
  return isSame({ ...before, tiles: after.tiles }, after) ? after.tiles : null;
}

/** What has to be done to the sources of a map. */
export function sourceChanges(before: SourcesByName, after: SourcesByName): SourceChanges {
  const removed: string[] = Object.keys(before).filter((name) => after[name] === undefined);
  const added: [string, SourceSpecification][] = [];
  const readdressed: [string, string[]][] = [];
  for (const [name, source] of Object.entries(after)) {
    const old = before[name];
    const address = old === undefined ? null : newAddress(old, source);
    if (old === undefined) added.push([name, source]);
    else if (isSame(old, source)) continue;
    else if (address !== null) readdressed.push([name, address]);
    else {
      removed.push(name);
      added.push([name, source]);
    }
  }
  return { removed, added, readdressed };
}
