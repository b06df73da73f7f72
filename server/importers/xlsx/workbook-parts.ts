import { AppError } from '../../errors.ts';
import { unpackChunks } from '../unpack-entry.ts';
import type { ZipEntry } from '../zip-entries.ts';
import { readXml, type XmlEvent } from './read-xml.ts';

export type Sheet = { readonly name: string; readonly entry: ZipEntry };

/** The files of a workbook: its archive and what lies in it. */
export type Parts = { readonly bytes: Buffer; readonly entries: readonly ZipEntry[] };

const WORKBOOK = 'xl/workbook.xml';

/** The pieces of XML of a part by its name; nothing where there is none. */
export async function* eventsOf({ bytes, entries }: Parts, name: string): AsyncGenerator<XmlEvent> {
  const entry = entries.find((one) => one.name.toLowerCase() === name.toLowerCase());
  if (entry === undefined) return;
  for await (const events of readXml(name, unpackChunks(bytes, entry))) yield* events;
}

/** Files of parts by the names that the workbook gives them. */
async function targets(parts: Parts): Promise<ReadonlyMap<string, string>> {
  const found = new Map<string, string>();
  for await (const event of eventsOf(parts, 'xl/_rels/workbook.xml.rels')) {
    if (event.kind !== 'open' || event.name !== 'Relationship') continue;
    const { Id: id, Target: target } = event.attributes;
    if (id !== undefined && target !== undefined) {
      found.set(id, target.startsWith('/') ? target.slice(1) : `xl/${target}`);
    }
  }
  return found;
}

function relationOf(attributes: Readonly<Record<string, string>>): string {
  return Object.entries(attributes).find(([name]) => /(^|:)id$/.test(name))?.[1] ?? '';
}

/** The sheets that are not hidden, in the order of the workbook, and whether it counts days from 1904. */
export async function sheetsOf(parts: Parts): Promise<{ sheets: Sheet[]; from1904: boolean }> {
  const files = await targets(parts);
  const sheets: Sheet[] = [];
  let from1904 = false;
  for await (const event of eventsOf(parts, WORKBOOK)) {
    if (event.kind !== 'open') continue;
    const { name, attributes } = event;
    if (name === 'workbookPr') from1904 = /^(1|true)$/.test(attributes.date1904 ?? '');
    const isHidden = /hidden/i.test(attributes.state ?? '');
    if (name !== 'sheet' || isHidden) continue;
    const file = files.get(relationOf(attributes));
    const entry = parts.entries.find((one) => one.name.toLowerCase() === file?.toLowerCase());
    if (entry !== undefined) sheets.push({ name: attributes.name ?? '', entry });
  }
  if (sheets.length === 0) {
    throw new AppError('unreadable', 'The workbook cannot be read: it has no sheet to be seen.');
  }
  return { sheets, from1904 };
}
