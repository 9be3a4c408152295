import { ApiProblem } from './api-problem';
import type { ProblemBody } from './types';

type Method = 'GET' | 'POST' | 'PUT' | 'DELETE';

async function request(
  method: Method,
  path: string,
  body?: unknown,
  headers: Record<string, string> = {},
): Promise<Response> {
  try {
    return await fetch(path, {
      method,
      credentials: 'same-origin',
      headers: {
        accept: 'application/json, application/problem+json',
        ...(body === undefined ? {} : { 'content-type': 'application/json' }),
        ...headers,
      },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
  } catch {
    throw ApiProblem.unreachable();
  }
}

async function problemOf(response: Response): Promise<ApiProblem> {
  const fallback: ProblemBody = { title: `The server answered ${response.status}` };
  const body: unknown = await response.json().catch(() => fallback);
  const isProblem =
    typeof body === 'object' && body !== null && 'title' in body && typeof body.title === 'string';
  return new ApiProblem(response.status, isProblem ? (body as ProblemBody) : fallback);
}

/** SWR's fetcher: the key is the path. */
export async function getJson<T>(path: string): Promise<T> {
  const response = await request('GET', path);
  if (!response.ok) throw await problemOf(response);
  return (await response.json()) as T;
}

/** Sends a change; an answer without a body comes back as undefined. */
export async function sendJson<T>(
  method: Exclude<Method, 'GET'>,
  path: string,
  body?: unknown,
  headers?: Record<string, string>,
): Promise<T> {
  const response = await request(method, path, body, headers);
  if (!response.ok) throw await problemOf(response);
  return (response.status === 204 ? undefined : await response.json()) as T;
}

/** A path with the query parameters that have a value. */
export function withQuery(path: string, query: Record<string, string | number | null | undefined>): string {
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries(query))
    if (value !== undefined && value !== null && value !== '') search.set(name, String(value));
  const text = search.toString();
  return text ? `${path}?${text}` : path;
}
