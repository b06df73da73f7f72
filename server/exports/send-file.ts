import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import type { Response } from 'express';
import type { EXPORT_FORMATS } from '../../shared/schemas/register.ts';
import { Person } from '../models/person.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import type { ExportAbout, ExportFile } from './export-file.ts';
import { momentWords } from './moment-words.ts';
import { csvText } from './write-csv.ts';
import { geojsonText } from './write-geojson.ts';
import { writeXlsx } from './write-xlsx.ts';
import { dayOf } from '../days.ts';

type Format = (typeof EXPORT_FORMATS)[number];

/** Who asks for a file of a scheme, and where it goes. */
export type FileCall = {
  readonly services: Services;
  readonly actor: Actor;
  readonly scheme: Scheme;
  readonly res: Response;
};

const TYPES = {
  xlsx: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
  csv: 'text/csv; charset=utf-8',
  geojson: 'application/geo+json; charset=utf-8',
} as const;

/** What every file says of itself: of which scheme, when and by whom it was asked for. */
export async function aboutFile({ actor, scheme }: FileCall): Promise<ExportAbout> {
  const person = await Person.findByPk(actor.id);
  return [
    ['Scheme', scheme.name],
    ['Exported', momentWords(new Date())],
    ['By', person?.name ?? ''],
  ];
}

function fileName({ scheme }: FileCall, what: string, format: Format): string {
  const name = scheme.name
    .normalize('NFD')
    .replaceAll(/\p{M}/gu, '')
    .replace(/[^a-z0-9]+/gi, '-')
    .toLowerCase();
  const day = dayOf(new Date());
  return `${name.replace(/^-+|-+$/g, '').slice(0, 60) || 'scheme'}-${what}-${day}.${format}`;
}

async function write<Row>(file: ExportFile<Row>, format: Format, res: Response): Promise<void> {
  if (format === 'xlsx') return writeXlsx(file, res);
  const text = format === 'csv' ? csvText(file) : geojsonText(file);
  await pipeline(Readable.from(text), res);
}

/** Sends a file written while it is read, called by what it holds; a reader who leaves ends it. */
export async function sendFile<Row>(
  call: FileCall,
  { what, format }: { readonly what: string; readonly format: Format },
  file: ExportFile<Row>,
): Promise<void> {
  const { services, res } = call;
  res.set('Cache-Control', 'no-store');
  res
    .type(TYPES[format])
    .attachment(fileName(call, what, format))
    .type(TYPES[format]);
  try {
    await write(file, format, res);
  } catch (error) {
    // what was sent cannot be taken back: a broken transfer tells that the file is not whole
    if (!res.destroyed) services.logger.error({ err: error }, 'an export broke off');
    res.destroy();
  }
}
