import { vi } from 'vitest';

/** One answer of the pretended server. */
export interface Answer {
  status?: number;
  body?: unknown;
}

export interface SentRequest {
  method: string;
  path: string;
  body: unknown;
}

type Handler = (request: SentRequest) => Answer | undefined;

/**
 * Puts a pretended server in place of `fetch`: `answers['GET /api/parts']` is asked first by method and path. What was
 * sent is kept in `sent`. Anything without an answer gets a 404 in the server's own shape.
 */
export function pretendServer(answers: Record<string, Answer | Handler>): { sent: SentRequest[] } {
  const sent: SentRequest[] = [];
  vi.stubGlobal('fetch', async (request: Request) => {
    const { pathname, search } = new URL(request.url);
    const text = await request.clone().text();
    const seen: SentRequest = {
      method: request.method,
      path: pathname + search,
      body: text === '' ? undefined : (JSON.parse(text) as unknown),
    };
    sent.push(seen);
    const found = answers[`${request.method} ${pathname}`];
    const answer = typeof found === 'function' ? found(seen) : found;
    const { status = 200, body } = answer ?? {
      status: 404,
      body: { statusCode: 404, code: 'not-found', message: `Nothing at ${pathname}.`, requestId: 'test' },
    };
    return new Response(status === 204 ? null : JSON.stringify(body), {
      status,
      headers: { 'content-type': 'application/json' },
    });
  });
  return { sent };
}

/** A person with these permissions, as `/api/auth/me` tells. */
export function me(permissions: readonly string[]): Answer {
  return {
    body: { id: '1', name: 'Test Person', email: 'test@brackenbay.example', roles: ['viewer'], permissions },
  };
}

/** A refusal in the server's shape. */
export function refusal(status: number, code: string, message: string, more: object = {}): Answer {
  return { status, body: { statusCode: status, code, message, requestId: 'test', ...more } };
}
