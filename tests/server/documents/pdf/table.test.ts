import { expect, test } from 'vitest';
import { Flow } from '../../../../server/documents/pdf/flow.ts';
import { bytesOf, openPaper } from '../../../../server/documents/pdf/paper.ts';
import { flowTable } from '../../../../server/documents/pdf/table.ts';
import { pagesOfPdf } from '../../../support/pdf-tools.ts';

const COLUMNS = [
  { heading: 'Name', width: 100 },
  { heading: 'Figure', width: 60, align: 'right' },
] as const;

test('a table goes on over pages with its heads on each, no row cut or lost', async () => {
  const at = new Date('2026-12-02T09:00:00Z');
  const paper = openPaper({ size: 'A4', title: 'T', author: 'A', subject: 'S', at });
  const flow = new Flow({ left: 40, top: 40, bottom: 200 }, () => {
    paper.doc.addPage();
  });
  const rows = Array.from({ length: 30 }, (_, k) => ({
    cells: [`row ${k} first\nand second line`, String(k)],
  }));
  flowTable(flow, paper, COLUMNS, rows);
  const pages = pagesOfPdf(await bytesOf(paper));
  expect(pages.length).toBeGreaterThan(3);
  for (const page of pages) {
    expect(page).toMatch(/Name\s+Figure/);
    expect(page.match(/row \d+ first/g)).toHaveLength(page.match(/and second line/g)?.length ?? 0);
  }
  for (const { cells } of rows) expect(pages.join(' ')).toContain(cells[0]?.split('\n')[0]);
});
