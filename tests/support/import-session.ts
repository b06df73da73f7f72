import type TestAgent from 'supertest/lib/agent.js';
import {
  importRowsSchema,
  importSchema,
  type ImportAnswer,
  type ImportOptions,
  type ImportRow,
} from '../../shared/schemas/imports.ts';
import type { Scheme } from '../../server/models/scheme.ts';
import type { Services } from '../../server/services.ts';

/** An assessor who imports into a scheme, step by step; each step waits until the server is done. */
export function importSession(agent: TestAgent, scheme: Scheme, services: Services) {
  const base = `/api/schemes/${scheme.id}/imports`;

  async function settled(id: string): Promise<ImportAnswer> {
    await services.jobs.idle();
    return importSchema.parse((await agent.get(`${base}/${id}`)).body);
  }

  async function sent(file: string | Buffer, name = 'town.geojson'): Promise<ImportAnswer> {
    const answer = await agent.post(base).attach('file', Buffer.from(file), name);
    if (answer.status !== 201) throw new Error(`Sending was answered by ${answer.status}.`);
    return importSchema.parse(answer.body);
  }

  return {
    base,
    settled,
    sent,
    send: async (file: string | Buffer, name?: string) => settled((await sent(file, name)).id),
    choose: async (row: ImportAnswer, options: Partial<ImportOptions>): Promise<ImportAnswer> => {
      const body = { version: row.version, options: { ...row.options, ...options } };
      const answer = await agent.patch(`${base}/${row.id}`).send(body);
      if (answer.status !== 200) throw new Error(`${answer.status}: ${answer.text}`);
      return settled(row.id);
    },
    confirm: async (row: ImportAnswer): Promise<ImportAnswer> => {
      const answer = await agent.post(`${base}/${row.id}/confirm`).send({ version: row.version });
      if (answer.status !== 200) throw new Error(`${answer.status}: ${answer.text}`);
      return settled(row.id);
    },
    rows: async (row: ImportAnswer, outcome?: string): Promise<ImportRow[]> => {
      const query = outcome === undefined ? '' : `?outcome=${outcome}`;
      return importRowsSchema.parse((await agent.get(`${base}/${row.id}/rows${query}`)).body).rows;
    },
  };
}
