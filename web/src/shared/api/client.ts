import { answerOf, createApiClient } from '@merestone/api-client';
import { asApiProblem } from './api-problem';

/** The server as its contract describes it: paths, bodies and answers are typed from there. */
export const api = createApiClient({ fetch: (request) => globalThis.fetch(request) });

/** The answer of a call to `api`; everything else is thrown as an `ApiProblem`. */
export async function ask<T>(call: Parameters<typeof answerOf<T>>[0]): Promise<T> {
  try {
    return await answerOf(call);
  } catch (thrown) {
    throw asApiProblem(thrown);
  }
}
