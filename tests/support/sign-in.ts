import { Agent, type Server } from 'node:http';
import request, { type Test } from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import { sessionSchema } from '../../shared/schemas/session.ts';
import type { Person } from '../../server/models/person.ts';
import { PASSWORD } from './factories.ts';

/** Connections stay open from one request to the next, as those of browsers do. */
const CONNECTIONS = new Agent({ keepAlive: true });

/** Somebody with a session and its CSRF token, not signed in. */
export async function visitor(app: Server): Promise<TestAgent> {
  const agent = request.agent(app);
  agent.use((asked: Test) => asked.agent(CONNECTIONS));
  const answer = await agent.get('/api/session');
  agent.set('X-CSRF-Token', sessionSchema.parse(answer.body).csrfToken);
  return agent;
}

/** A person signed in through the front door, with the session and its CSRF token. */
export async function signIn(
  app: Server,
  { email }: Pick<Person, 'email'>,
  password = PASSWORD,
): Promise<TestAgent> {
  const agent = await visitor(app);
  const answer = await agent.post('/api/session').send({ email, password });
  if (answer.status !== 200) throw new Error(`Signing in was answered by ${answer.status}.`);
  agent.set('X-CSRF-Token', sessionSchema.parse(answer.body).csrfToken);
  return agent;
}
