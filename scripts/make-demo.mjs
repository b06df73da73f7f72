import { parseArgs } from 'node:util';
import { installPackages, requireNode } from './packages.mjs';

requireNode();
installPackages();
const { Refusal, withSentences } = await import('./start/refusal.mjs');
const { townFolder } = await import('./start/folders.mjs');
const { ensureTown } = await import('./start/town.mjs');

await withSentences(async () => {
  const { values } = parseArgs({ options: { buildings: { type: 'string', default: '2000' } } });
  const buildings = Number(values.buildings);
  if (!Number.isInteger(buildings) || buildings < 1500) {
    throw new Refusal(
      'Give a number of buildings, 1500 or more: npm run make-demo -- --buildings 2000',
    );
  }
  const { said } = await ensureTown(townFolder(), { buildings });
  console.log(`${said}, in ${townFolder()} and public/tiles`);
});
