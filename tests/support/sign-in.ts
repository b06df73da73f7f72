import type { Express } from 'express';
import request from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import { sessionSchema } from '../../shared/schemas/session.ts';
import type { Person } from '../../server/models/person.ts';
import { PASSWORD } from './factories.ts';

/** Somebody with a session and its CSRF token, not signed in. */
export async function visitor(app: Express): Promise<TestAgent> {
  const agent = request.agent(app);
  const answer = await agent.get('/api/session');
  agent.set('X-CSRF-Token', sessionSchema.parse(answer.body).csrfToken);
  return agent;
}

/** A person signed in through the front door, with the session and its CSRF token. */
export async function signIn(
  app: Express,
  { email }: Pick<Person, 'email'>,
  password = PASSWORD,
): Promise<TestAgent> {
  const agent = await visitor(app);
  const answer = await agent.post('/api/session').send({ email, password });
  if (answer.status !== 200) throw new Error(`Signing in was answered by ${answer.status}.`);
  agent.set('X-CSRF-Token', sessionSchema.parse(answer.body).csrfToken);
  return agent;
}
