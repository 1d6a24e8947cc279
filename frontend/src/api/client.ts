import createClient from 'openapi-fetch';
import { asProblem, problemFrom } from './problem';
import type { paths } from './schema';

/** The server's client, typed by its OpenAPI document. Anything but a 2xx answer throws a `Problem`. */
export const api = createClient<paths>({
  baseUrl: globalThis.location?.origin ?? '',
  credentials: 'same-origin',
  fetch: (request) => globalThis.fetch(request),
});

api.use({
  async onResponse({ response }) {
    if (!response.ok) throw await problemFrom(response);
  },
  onError: ({ error }) => asProblem(error),
});

/**
 * The body of an answer: `await answer(api.GET('/api/parts'))`.
 * @throws Problem when the server refused or did not answer
 */
export async function answer<T>(call: Promise<{ data?: T }>): Promise<T> {
  try {
    return (await call).data as T;
  } catch (error) {
    throw asProblem(error);
  }
}
