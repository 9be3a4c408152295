export { answerOf, createApiClient, type ApiClient, type ApiClientOptions } from './client.js';
export { Problem, problemFrom, type ProblemBody } from './problem.js';
export type { components, operations, paths } from './schema.generated.js';
