import { buildingParamsSchema } from '../../shared/schemas/buildings.ts';
import {
  changeParamsSchema,
  drawBuildingSchema,
  editBuildingSchema,
  editManySchema,
  joinBuildingsSchema,
  previewManySchema,
  removeBuildingSchema,
  removeManySchema,
  splitBuildingSchema,
} from '../../shared/schemas/register-changes.ts';
import { drawBuilding } from '../commands/draw-building.ts';
import { editBuilding } from '../commands/edit-building.ts';
import { editBuildings } from '../commands/edit-buildings.ts';
import { joinBuildings } from '../commands/join-buildings.ts';
import { removeBuilding } from '../commands/remove-building.ts';
import { removeBuildings } from '../commands/remove-buildings.ts';
import { splitBuilding } from '../commands/split-building.ts';
import { undoChange } from '../commands/undo-change.ts';
import { countValues } from '../models/count-values.ts';
import { findBuilding, findBuildingEverKept } from '../models/find-building.ts';
import { findHistory } from '../models/find-building-changes.ts';
import { registerCondition } from '../models/register-condition.ts';
import { registerIds } from '../register/register-order.ts';
import { registerOf } from '../register/register-of.ts';
import { schemeAbilities } from '../policies/scheme-policy.ts';
import { presentHistory } from '../presenters/building-history.ts';
import { defineRoute } from './define-route.ts';

export const registerChangeRoutes = [
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/buildings',
    access: { scheme: 'updateRegister' },
    body: drawBuildingSchema,
    bodyLimit: '1mb',
    status: 201,
    handle: ({ services, actor, scheme, body }) => drawBuilding(services, actor, scheme, body),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/buildings/edits',
    access: { scheme: 'updateRegister' },
    body: editManySchema,
    handle: ({ services, actor, scheme, body }) => editBuildings(services, actor, scheme, body),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/buildings/edits/preview',
    access: { scheme: 'updateRegister' },
    body: previewManySchema,
    handle: async ({ services, scheme, body: { filter, attributes } }) => {
      const register = await registerOf(services, scheme);
      const ids = [...(await registerIds(services, register, filter))];
      return countValues(services.database, registerCondition(register, { ids }), attributes);
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/buildings/removals',
    access: { scheme: 'updateRegister' },
    body: removeManySchema,
    handle: ({ services, actor, scheme, body }) => removeBuildings(services, actor, scheme, body),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/buildings/joins',
    access: { scheme: 'updateRegister' },
    body: joinBuildingsSchema,
    handle: ({ services, actor, scheme, body }) => joinBuildings(services, actor, scheme, body),
  }),
  defineRoute({
    method: 'patch',
    path: '/api/schemes/:schemeId/buildings/:buildingId',
    access: { scheme: 'updateRegister' },
    params: buildingParamsSchema,
    body: editBuildingSchema,
    bodyLimit: '1mb',
    handle: async ({ services, actor, scheme, params, body }) => {
      const { id } = await findBuilding(scheme.id, params.buildingId);
      return editBuilding(services, actor, scheme, { id, ...body });
    },
  }),
  defineRoute({
    method: 'delete',
    path: '/api/schemes/:schemeId/buildings/:buildingId',
    access: { scheme: 'updateRegister' },
    params: buildingParamsSchema,
    body: removeBuildingSchema,
    handle: async ({ services, actor, scheme, params, body }) => {
      const { id } = await findBuilding(scheme.id, params.buildingId);
      return removeBuilding(services, actor, scheme, { id, ...body });
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/buildings/:buildingId/split',
    access: { scheme: 'updateRegister' },
    params: buildingParamsSchema,
    body: splitBuildingSchema,
    handle: async ({ services, actor, scheme, params, body }) => {
      const { id } = await findBuilding(scheme.id, params.buildingId);
      return splitBuilding(services, actor, scheme, { id, ...body });
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/buildings/:buildingId/history',
    access: { scheme: 'readRegister' },
    params: buildingParamsSchema,
    handle: async ({ services, actor, scheme, params }) => {
      const { id } = await findBuildingEverKept(scheme.id, params.buildingId);
      const mayUndo = schemeAbilities(actor, scheme.archivedAt !== null).updateRegister;
      return presentHistory(await findHistory(services.database, id), mayUndo);
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/register-changes/:changeId/undo',
    access: { scheme: 'updateRegister' },
    params: changeParamsSchema,
    handle: ({ services, actor, scheme, params }) =>
      undoChange(services, actor, scheme, params.changeId),
  }),
];
