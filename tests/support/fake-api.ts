import { vi } from 'vitest';

type Call = { readonly route: string; readonly body: unknown; readonly headers: Headers };

/** Answers of a server that is not there, by method and path, as `GET /api/people`. */
type Answers = Readonly<Record<string, unknown>>;

/** A refusal among the answers. */
export class Refusal {
  readonly status: number;
  readonly error: { code: string; message: string; fields: { path: string; message: string }[] };

  constructor(
    status: number,
    code: string,
    message = '',
    fields: { path: string; message: string }[] = [],
  ) {
    this.status = status;
    this.error = { code, message, fields };
  }
}

function bodyOf(init: RequestInit | undefined): unknown {
  return typeof init?.body === 'string' ? JSON.parse(init.body) : undefined;
}

function asResponse(answer: unknown): Response {
  if (answer === undefined) return new Response(null, { status: 204 });
  if (!(answer instanceof Refusal)) return Response.json(answer);
  return Response.json({ error: answer.error }, { status: answer.status });
}

function makesAnswer(answer: unknown): answer is (body: unknown) => unknown {
  return typeof answer === 'function';
}

/**
 * Puts answers in place of the server's; a function among them makes its own of the body, or of the words of
 * the query where the answer stands under the path alone. What is asked for and not there is a fault of the
 * test.
 */
export function fakeApi(answers: Answers): { readonly calls: Call[] } {
  const calls: Call[] = [];
  vi.stubGlobal('fetch', (path: string, init?: RequestInit) => {
    const route = `${init?.method ?? 'GET'} ${path}`;
    const [alone = '', words] = route.split('?');
    const known = route in answers ? route : alone;
    if (!(known in answers)) return Promise.reject(new Error(`Nobody answers ${route}.`));
    const body = bodyOf(init);
    calls.push({ route, body, headers: new Headers(init?.headers) });
    const answer = answers[known];
    const asked = known === route ? body : new URLSearchParams(words);
    return Promise.resolve(asResponse(makesAnswer(answer) ? answer(asked) : answer));
  });
  return { calls };
}
