import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import type { Response } from 'express';
import type { z } from 'zod';
import type { registerExportQuerySchema } from '../../shared/schemas/register.ts';
import { Person } from '../models/person.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { registerOrder } from '../register/register-order.ts';
import type { Services } from '../services.ts';
import { headingOf, type ExportJob } from './export-job.ts';
import { exportedBuildings } from './exported-buildings.ts';
import { filterInWords } from './filter-in-words.ts';
import { csvText } from './write-csv.ts';
import { geojsonText } from './write-geojson.ts';
import { writeXlsx } from './write-xlsx.ts';

type ExportCall = {
  readonly services: Services;
  readonly actor: Actor;
  readonly scheme: Scheme;
  readonly query: z.infer<typeof registerExportQuerySchema>;
  readonly res: Response;
};

const TYPES = {
  xlsx: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
  csv: 'text/csv; charset=utf-8',
  geojson: 'application/geo+json; charset=utf-8',
} as const;

async function about(
  { actor, scheme, query }: ExportCall,
  count: number,
): Promise<ExportJob['about']> {
  const { filter, sort } = query;
  const person = await Person.findByPk(actor.id);
  return [
    ['Scheme', scheme.name],
    ['Exported', `${new Date().toISOString().slice(0, 16).replace('T', ' ')} UTC`],
    ['By', person?.name ?? ''],
    ['Buildings', String(count)],
    ['Filter', filterInWords(filter)],
    ['Order', `${headingOf(sort.column)}, ${sort.descending ? 'descending' : 'ascending'}`],
    ['Grid', `EPSG:${scheme.crs}; levels in metres above the scheme’s datum`],
  ];
}

function fileName({ scheme, query }: ExportCall): string {
  const name = scheme.name
    .normalize('NFD')
    .replaceAll(/\p{M}/gu, '')
    .replace(/[^a-z0-9]+/gi, '-')
    .toLowerCase();
  const day = new Date().toISOString().slice(0, 10);
  return `${name.replace(/^-+|-+$/g, '').slice(0, 60) || 'scheme'}-register-${day}.${query.format}`;
}

async function write(job: ExportJob, { query, res }: ExportCall): Promise<void> {
  if (query.format === 'xlsx') return writeXlsx(job, res);
  const text = query.format === 'csv' ? csvText(job) : geojsonText(job);
  await pipeline(Readable.from(text), res);
}

/** Sends what a filter means as a file, written while it is read; a reader who leaves ends it. */
export async function sendExport(call: ExportCall): Promise<void> {
  const { services, scheme, query, res } = call;
  const { columns, format } = query;
  const order = await registerOrder(services, scheme, query);
  const buildings = exportedBuildings(services, order, format === 'geojson');
  const job = { columns, buildings, about: await about(call, order.count) };
  res.set('Cache-Control', 'no-store');
  res.type(TYPES[format]).attachment(fileName(call)).type(TYPES[format]);
  try {
    await write(job, call);
  } catch (error) {
    // what was sent cannot be taken back: a broken transfer tells that the file is not whole
    if (!res.destroyed) services.logger.error({ err: error }, 'an export broke off');
    res.destroy();
  }
}
