import { auditQuerySchema, type AuditPageAnswer } from '../../shared/schemas/audit.ts';
import { findAuditPage } from '../models/find-audit-page.ts';
import { presentAuditEntry } from '../presenters/audit-entry.ts';
import { defineRoute } from './define-route.ts';

export const auditRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/audit',
    access: 'administrator',
    query: auditQuerySchema,
    handle: async ({ query }): Promise<AuditPageAnswer> => {
      const { records, next } = await findAuditPage(query);
      return { entries: records.map(presentAuditEntry), next };
    },
  }),
];
