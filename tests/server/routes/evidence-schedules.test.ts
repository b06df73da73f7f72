import { describe, expect, test } from 'vitest';
import { CAUTIONS } from '../../../shared/cautions.ts';
import { layoutSchema, printSchema } from '../../../shared/schemas/evidence.ts';
import type { EvidenceLayout } from '../../../shared/schemas/evidence.ts';
import { findRunOrder, findRunRows } from '../../../server/models/find-run-rows.ts';
import { packedIds } from '../../../server/register/packed-ids.ts';
import { decide, twoAssessors } from '../../support/decisions.ts';
import { aSchedule } from '../../support/evidence.ts';
import { aMember, anAlignment, aPerson, aScheme } from '../../support/factories.ts';
import { bookmarksOfPdf, factsOfPdf, fontsOfPdf, pagesOfPdf, textOfPdf } from '../../support/pdf-tools.ts'; // prettier-ignore
import { box, change, drawn } from '../../support/register.ts';
import { aRun, aTownToRun, someSchemeRules, UNDER_TOWN } from '../../support/runs.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const tested = testApp();
const { app, services } = tested;

type Ran = {
  readonly scheme: Parameters<typeof aRun>[1];
  readonly run: { readonly id: string };
};

async function printed({ scheme, run }: Ran, layout: EvidenceLayout) {
  const agent = await signIn(app(), await aMember(scheme, 'witness'));
  const base = `/api/schemes/${scheme.id}`;
  const asked = await agent.post(`${base}/runs/${run.id}/prints`).send({ name: 'List', layout });
  expect([asked.status, asked.body]).toMatchObject([201, {}]);
  await services().jobs.idle();
  const { id } = printSchema.parse(asked.body);
  const print = printSchema.parse((await agent.get(`${base}/prints/${id}`)).body);
  expect(print).toMatchObject({ state: 'done', fault: null, done: print.sheets });
  const file: unknown = (await agent.get(`${base}/prints/${id}/file`).responseType('blob')).body;
  if (!Buffer.isBuffer(file)) throw new Error('There is no file.');
  return { pdf: file, print };
}

async function rowsOfRun({ run }: Ran) {
  const { database } = services();
  const ids = packedIds(await findRunOrder(database, run.id)).slice(0, 1000);
  return findRunRows(database, { runId: run.id, ids, isDrawn: false });
}

/** The references of a schedule in order, of those that are there. */
function referencesIn(pdf: Uint8Array, all: readonly string[]): string[] {
  const lines = pagesOfPdf(pdf).flatMap((page) => page.split('\n'));
  const first = lines.map((line) => line.trim().split(/\s/)[0] ?? '');
  return first.filter((word) => all.includes(word));
}

describe('a schedule', () => {
  test('has the buildings in order, on lying paper, with its heads, notes and title block', async () => {
    const { scheme, option } = await aTownToRun();
    const edit = { address: `1 Quay, ${'the very long terrace, '.repeat(8)}Port`, listedGrade: `listed ${'x'.repeat(200)}` }; // prettier-ignore
    const more = Array.from({ length: 60 }, (_, k) => drawn(`Z${k}`, { footprint: box(130, 20 * k) })); // prettier-ignore
    await change(scheme, { created: [drawn('A9', { attributes: edit }), ...more] });
    const run = await aRun(tested, scheme, option);
    const { fields } = aSchedule();
    const revision = { revision: 'P2', date: '2026-12-02', change: 'First issue', by: 'AB', checked: 'CD' }; // prettier-ignore
    const layout = aSchedule({ fields: { ...fields, title: 'All houses', number: 'GS-7', revisions: [revision] } }); // prettier-ignore
    const { pdf, print } = await printed({ scheme, run }, layout);
    const rows = await rowsOfRun({ scheme, run });
    const references = rows.map(({ facts }) => facts.reference);
    expect(references).toHaveLength(84);
    expect(referencesIn(pdf, references)).toEqual(references);
    const facts = factsOfPdf(pdf);
    expect(facts).toMatchObject({ Title: 'All houses', Author: scheme.name, Pages: String(print.sheets) }); // prettier-ignore
    expect(facts['Page size']).toMatch(/^841\.\d+ x 595\.\d+ pts/);
    const pages = pagesOfPdf(pdf);
    expect(pages.length).toBeGreaterThan(2);
    for (const [k, page] of pages.entries()) {
      expect(page).toContain(`${k + 1} of ${pages.length}`);
      expect(page).toMatch(/GS-7\s+P2/);
      if (/^ *Z\d/m.test(page)) expect(page).toMatch(/Reference\s+Address\s+Listing/);
    }
    const text = textOfPdf(pdf);
    expect(text.match(/the very long terrace,/g)).toHaveLength(8);
    expect(text).toMatch(/listed x+…/);
    expect(text).toContain('First issue');
    for (const caution of CAUTIONS) expect(textOfPdf(pdf)).toContain(caution.slice(0, 60));
    expect(pages.at(-1)).toContain('Notes');
    expect(bookmarksOfPdf(pdf)[0]).toBe('Sheet 1, from A9');
    expect(fontsOfPdf(pdf).every(({ isEmbedded, isReadable }) => isEmbedded && isReadable)).toBe(true); // prettier-ignore
  });

  test('of what is affected leaves out what stage 1 lets go, and says so', async () => {
    const { scheme, option } = await aTownToRun();
    const run = await aRun(tested, scheme, option);
    const { pdf } = await printed({ scheme, run }, aSchedule({ rows: 'affected', paper: 'A3' }));
    const rows = await rowsOfRun({ scheme, run });
    const kept = rows.filter(({ result }) => result.stage > 1).map(({ facts }) => facts.reference);
    expect(kept.length).toBeGreaterThan(0);
    expect(kept.length).toBeLessThan(rows.length);
    const all = rows.map(({ facts }) => facts.reference);
    expect(referencesIn(pdf, all)).toEqual(kept);
    expect(textOfPdf(pdf)).toContain('that stage 1 does not let go');
    expect(factsOfPdf(pdf)['Page size']).toMatch(/^1190\.\d+ x 841\.\d+ pts/);
  });

  test('tells the decision on each building for the option of the run, and where it stands', async () => {
    const office = await twoAssessors(tested);
    const { address, secondAgent } = office;
    const adopted = await decide(office, 'T0-2', { kind: 'adopt a category', category: 2, reason: 'Seen.' }); // prettier-ignore
    const checked = await secondAgent.post(`${address}/decisions/${adopted}/check`).send({ verdict: 'checked' }); // prettier-ignore
    expect(checked.status).toBe(204);
    await decide(office, 'T0-3', { kind: 'go to stage 3', reason: 'Close to the line.' });
    const { pdf } = await printed(office, aSchedule({ paper: 'A3' }));
    const line = (reference: string) =>
      pagesOfPdf(pdf)
        .flatMap((page) => page.split('\n'))
        .find((one) => one.trim().startsWith(`${reference} `));
    expect(line('T0-2')).toMatch(/Category 2 adopted$/);
    expect(line('T0-3')).toMatch(/Go to stage 3, waiting for check$/);
    expect(line('T0-4')).toMatch(/To decide$/);
  });

  test('of what is affected says where that is nothing', async () => {
    const scheme = await aScheme();
    await someSchemeRules(scheme, (await aPerson()).id);
    await change(scheme, { created: [drawn('far', { footprint: box(0, 400) })] });
    const option = await anAlignment(scheme, { design: UNDER_TOWN });
    const run = await aRun(tested, scheme, option);
    const { pdf, print } = await printed({ scheme, run }, aSchedule({ rows: 'affected' }));
    expect(print.sheets).toBe(1);
    expect(textOfPdf(pdf)).toContain('Stage 1 lets every building of the run go.');
    expect(bookmarksOfPdf(pdf)).toEqual(['Sheet 1']);
  });

  test('is kept under a name as it was written', async () => {
    const scheme = await aScheme();
    const agent = await signIn(app(), await aMember(scheme, 'witness'));
    const layout = aSchedule({ rows: 'affected' });
    const made = await agent
      .post(`/api/schemes/${scheme.id}/layouts`)
      .send({ name: 'All', layout });
    expect(layoutSchema.parse(made.body).layout).toEqual(layout);
    const large = { ...layout, paper: 'A0' };
    const refused = await agent.post(`/api/schemes/${scheme.id}/layouts`).send({ name: 'B', layout: large }); // prettier-ignore
    expect(refused.status).toBe(422);
  });
});
