import { expect, it } from 'vitest';
import { importsOf, type Import } from '../support/imports.ts';
import { parsed, sourcesIn } from '../support/source-files.ts';

const KNOWS_THE_MAP = 'src/features/map/';

/** What outside of the map's own folder imports its library. */
function strangers(imports: readonly Import[]): string[] {
  return imports
    .filter(({ package: name }) => name === 'maplibre-gl')
    .filter(({ from }) => !from.startsWith(KNOWS_THE_MAP))
    .map(({ place }) => place);
}

it('one folder knows the map library', () => {
  const stranger = parsed('src/app/x.tsx', `import type { Map } from 'maplibre-gl';`);
  expect(strangers(importsOf(stranger))).toHaveLength(1);
  expect(strangers(sourcesIn('shared', 'server', 'src', 'scripts').flatMap(importsOf))).toEqual([]);
});
