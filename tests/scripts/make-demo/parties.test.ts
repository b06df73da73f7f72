import { expect, it } from 'vitest';
import { buildingFeatures } from '../../../scripts/make-demo/building-features.ts';
import { partiesText } from '../../../scripts/make-demo/parties.ts';
import { makeTown } from '../../../scripts/make-demo/town.ts';
import { planImport } from '../../../server/parties/plan-import.ts';
import { guessPartyColumns } from '../../../server/parties/read-table.ts';

it('writes parties for the houses nearest to the line; all but three rows can be taken over', async () => {
  const features = buildingFeatures(makeTown(2000, 7), 7);
  const text = partiesText(features, 7);
  const [columns = [], ...lines] = text.trimEnd().split('\n').map((line) => line.split(',')); // prettier-ignore
  const rows = lines.map((values, index) => ({ row: index + 2, fault: null, values }));
  const table = { columns, rows };
  const buildings = features.map(({ properties: { reference, address } }, index) => {
    return { id: index + 1, reference: String(reference), address: String(address) };
  });
  const plan = await planImport(table, guessPartyColumns(table), { buildings, parties: [] });
  expect(plan.counts).toMatchObject({ problem: 3, noted: 0, 'there already': 0 });
  const problems = plan.lines.filter(({ outcome }) => outcome === 'problem');
  expect(problems.map(({ remarks }) => remarks.length)).toEqual([1, 1, 1]);
  expect(new Set(plan.interests.map(({ buildingId }) => buildingId)).size).toBe(250);
  expect(plan.counts.partiesAdded).toBeGreaterThan(150);
  expect(plan.added.filter(({ channel }) => channel === 'post').length).toBeGreaterThan(30);
  const mails = text.match(/[\w.-]+@[\w.-]+/g) ?? [];
  expect(mails.every((mail) => mail.endsWith('@example.org'))).toBe(true);
});
