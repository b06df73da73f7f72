import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { buildingFeatures } from './building-features.ts';
import type { Feature } from './features.ts';
import {
  crossingFeatures, gardenFeatures, landFeatures, openFeatures, quayFeatures, streetFeatures, treeFeatures, wallFeatures, waterFeatures,
} from './map-features.ts'; // prettier-ignore
import { partiesText } from './parties.ts';
import { spotHeights } from './spot-heights.ts';
import type { Town } from './town.ts';

const crs = { type: 'name', properties: { name: 'urn:ogc:def:crs:EPSG::32631' } };

/** One feature to a line, so that a difference between two towns can be read. */
function geojsonText(name: string, features: readonly Feature[]): string {
  const head = `{"type":"FeatureCollection","name":${JSON.stringify(name)},"crs":${JSON.stringify(crs)},"features":[\n`;
  return `${head}${features.map((feature) => JSON.stringify(feature)).join(',\n')}\n]}\n`;
}

/** Everything the town is written as, by file name. */
export function townFiles(town: Town, seed: number): Map<string, () => string> {
  const layers: [string, () => Feature[]][] = [
    ['buildings', () => buildingFeatures(town, seed)],
    ['streets', () => streetFeatures(town)],
    ['water', () => waterFeatures(town)],
    ['land', () => landFeatures(town)],
    ['quays', () => quayFeatures(town)],
    ['parks', () => openFeatures(town)],
    ['gardens', () => gardenFeatures(town)],
    ['garden-walls', () => wallFeatures(town)],
    ['trees', () => treeFeatures(town)],
    ['crossing', crossingFeatures],
  ];
  const files = new Map<string, () => string>();
  for (const [name, features] of layers)
    files.set(`${name}.geojson`, () => geojsonText(name, features()));
  files.set('ground.csv', () => spotHeights(town, seed));
  files.set('parties.csv', () => partiesText(buildingFeatures(town, seed), seed));
  return files;
}

export function writeTown(town: Town, seed: number, folder: string): void {
  mkdirSync(folder, { recursive: true });
  for (const [name, text] of townFiles(town, seed)) writeFileSync(join(folder, name), text());
}
