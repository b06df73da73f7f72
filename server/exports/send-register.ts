import type { z } from 'zod';
import type { registerExportQuerySchema } from '../../shared/schemas/register.ts';
import { registerOf } from '../register/register-of.ts';
import { registerOrder } from '../register/register-order.ts';
import type { ExportAbout } from './export-file.ts';
import { exportedBuildings } from './exported-buildings.ts';
import { filterInWords } from './filter-in-words.ts';
import { exportedColumn, headingOf } from './register-columns.ts';
import { aboutFile, sendFile, type FileCall } from './send-file.ts';

type RegisterCall = FileCall & { readonly query: z.infer<typeof registerExportQuerySchema> };

async function about(call: RegisterCall, count: number): Promise<ExportAbout> {
  const { scheme, query } = call;
  const { filter, sort } = query;
  return [
    ...(await aboutFile(call)),
    ['Buildings', String(count)],
    ['Filter', filterInWords(filter)],
    ['Order', `${headingOf(sort.column)}, ${sort.descending ? 'descending' : 'ascending'}`],
    ['Grid', `EPSG:${scheme.crs}; levels in metres above the scheme’s datum`],
  ];
}

/** Sends what a filter of the register means as a file. */
export async function sendRegister(call: RegisterCall): Promise<void> {
  const { services, scheme, query } = call;
  const { columns, format } = query;
  const register = await registerOf(services, scheme);
  const order = await registerOrder(services, register, query);
  await sendFile(
    call,
    { what: 'register', format },
    {
      title: 'Register',
      columns: columns.map(exportedColumn),
      rows: exportedBuildings(services, register, order, format === 'geojson'),
      aboutTitle: 'About',
      about: await about(call, order.count),
      beside: [],
    },
  );
}
