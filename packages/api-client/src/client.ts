import createFetchClient, { type Client } from 'openapi-fetch';
import { problemFrom } from './problem.js';
import type { paths } from './schema.generated.js';

export type ApiClient = Client<paths>;

/** Where the server is, and with what to ask; in a browser its own origin and `fetch`. */
export interface ApiClientOptions {
  readonly baseUrl?: string;
  readonly fetch?: (request: Request) => Promise<Response>;
  readonly headers?: Readonly<Record<string, string>>;
}

/** A fetch that knows the server's paths, bodies and answers. Nothing is retried and nothing is cached. */
export function createApiClient({ baseUrl = '', fetch, headers }: ApiClientOptions = {}): ApiClient {
  return createFetchClient<paths>({
    baseUrl,
    credentials: 'same-origin',
    ...(fetch === undefined ? {} : { fetch }),
    ...(headers === undefined ? {} : { headers }),
  });
}

/** The answer of a call, or its refusal thrown as a `Problem`. */
export async function answerOf<T>(
  call: Promise<{ data?: T; error?: unknown; response: Response }>,
): Promise<T> {
  const { data, error, response } = await call.catch((cause: unknown) => {
    throw problemFrom(0, cause);
  });
  if (!response.ok) throw problemFrom(response.status, error);
  // A 204 has no data, and its type says so.
  return data as T;
}
