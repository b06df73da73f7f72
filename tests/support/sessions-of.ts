import { QueryTypes } from 'sequelize';
import type { Person } from '../../server/models/person.ts';
import type { Services } from '../../server/services.ts';

type SessionRow = {
  readonly sid: string;
  readonly sess: { readonly signedInAt?: number; readonly csrfToken?: string };
};

/** The sessions in the database that are a person's. */
export function sessionsOf({ database }: Services, { id }: Person): Promise<SessionRow[]> {
  return database.query<SessionRow>(
    `select sid, sess from sessions where sess #>> '{passport,user}' = $id`,
    { bind: { id }, type: QueryTypes.SELECT },
  );
}
