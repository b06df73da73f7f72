import type { NextFunction, Request, RequestHandler, Response } from 'express';
import type { z } from 'zod';
import { AppError } from '../errors.ts';
import { loadScheme } from '../middleware/load-scheme.ts';
import type { RateLimitName } from '../middleware/rate-limits.ts';
import { requireActor } from '../middleware/require-actor.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor, SchemeActor } from '../policies/actor.ts';
import { changesScheme, schemePolicy, type SchemeAction } from '../policies/scheme-policy.ts';
import type { Services } from '../services.ts';

/**
 * Who may call a route: anyone, any signed-in person, the administrator, or whoever the scheme policy
 * lets do one thing. There is no route without one.
 */
export type Access = 'anyone' | 'signed-in' | 'administrator' | { readonly scheme: SchemeAction };

/** What people write is short; outlines have thousands of corners. */
export type BodyLimit = '256kb' | '1mb';

type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

type Schemas<Params, Query, Body> = {
  readonly params?: z.ZodType<Params>;
  readonly query?: z.ZodType<Query>;
  readonly body?: z.ZodType<Body>;
};

type ContextOf<A extends Access> = A extends 'anyone'
  ? object
  : A extends 'signed-in' | 'administrator'
    ? { readonly actor: Actor }
    : { readonly actor: SchemeActor; readonly scheme: Scheme };

export type Call<A extends Access, Params, Query, Body> = ContextOf<A> & {
  readonly services: Services;
  readonly params: Params;
  readonly query: Query;
  readonly body: Body;
  readonly req: Request;
  readonly res: Response;
};

/** A route as the list of routes holds it. */
export type Route = {
  readonly method: Method;
  readonly path: string;
  readonly access: Access;
  /** How often it may be called. */
  readonly limit: RateLimitName | undefined;
  /** How long a body of JSON may be. */
  readonly bodyLimit: BodyLimit;
  readonly respond: (services: Services) => (req: Request, res: Response) => Promise<void>;
};

function parsed<T>(schema: z.ZodType<T> | undefined, value: unknown, part: string): T {
  if (schema === undefined) return undefined as T;
  const result = schema.safeParse(value);
  if (result.success) return result.data;
  // An id that cannot exist answers like one that does not.
  if (part === 'params') throw new AppError('not-found');
  const fields = result.error.issues.map((issue) => ({
    path: issue.path.join('.'),
    message: issue.message,
  }));
  throw new AppError('invalid-input', undefined, fields);
}

/** A body that is no JSON has not been read, and would look like one that is empty. */
function requireJson(req: Request): void {
  if (req.is('json') !== false) return;
  throw new AppError(
    'wrong-content-type',
    'Send this as JSON, with Content-Type application/json.',
  );
}

async function contextOf(access: Access, services: Services, req: Request): Promise<object> {
  if (access === 'anyone') return {};
  const actor = requireActor(req);
  if (access === 'signed-in') return { actor };
  if (access === 'administrator') {
    if (!actor.isAdministrator) throw new AppError('not-allowed');
    return { actor };
  }
  const loaded = await loadScheme(services, actor, req.params.schemeId);
  if (!schemePolicy[access.scheme](loaded.actor)) throw new AppError('not-allowed');
  if (loaded.scheme.archivedAt !== null && changesScheme(access.scheme)) {
    throw new AppError('archived');
  }
  return loaded;
}

/**
 * Declares a route: who, what shape, then what is done. What `handle` returns is the answer, 204 for
 * nothing; a handler that answers by itself (a tile, a file) ends `res` and returns undefined.
 */
export function defineRoute<
  const A extends Access,
  Params = undefined,
  Query = undefined,
  Body = undefined,
>(
  definition: {
    method: Method;
    path: string;
    access: A;
    limit?: RateLimitName;
    bodyLimit?: BodyLimit;
    status?: number;
    handle: (call: Call<A, Params, Query, Body>) => unknown;
  } & Schemas<Params, Query, Body>,
): Route {
  const { method, path, access, limit, status = 200, handle } = definition;
  const { bodyLimit = '256kb' } = definition;
  return {
    method,
    path,
    access,
    limit,
    bodyLimit,
    respond: (services) => async (req, res) => {
      const context = await contextOf(access, services, req);
      if (definition.body !== undefined) requireJson(req);
      const call = {
        ...context,
        services,
        params: parsed(definition.params, req.params, 'params'),
        query: parsed(definition.query, req.query, 'query'),
        body: parsed(definition.body, req.body, 'body'),
        req,
        res,
      };
      const answer = await handle(call as Call<A, Params, Query, Body>);
      if (res.headersSent || res.writableEnded) return;
      if (answer === undefined) res.status(204).end();
      else res.status(status).json(answer);
    },
  };
}

/** Express wants a function that never rejects unseen; version 5 passes rejections to the handler of errors. */
export function handlerOf(route: Route, services: Services): RequestHandler {
  const respond = route.respond(services);
  return (req: Request, res: Response, next: NextFunction) => {
    respond(req, res).catch(next);
  };
}
