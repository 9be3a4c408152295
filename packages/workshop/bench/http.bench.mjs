import autocannon from 'autocannon';
import { serveForTests } from '../serve-for-tests.mjs';
import { approvedSheet, signIn } from './demo-office.mjs';

const seconds = 6;
const connections = 8;

/**
 * @param {string} what
 * @param {{ url: string, method?: 'GET' | 'POST', headers?: Record<string, string>, body?: string }} request
 */
const load = async (what, request) => {
  await autocannon({ ...request, connections, duration: 1 });
  const result = await autocannon({ ...request, connections, duration: seconds });
  const bad = result.errors + result.timeouts + result.non2xx;
  if (bad > 0)
    throw new Error(`${what}: ${String(bad)} of ${String(result.requests.total)} answers were no success.`);
  return result;
};

/** @returns {Promise<import('./bench-table.mjs').BenchTable>} */
export const run = async () => {
  const office = await serveForTests();
  try {
    const cookie = await signIn(office.origin);
    const { slug, duty } = await approvedSheet(office.origin, cookie);
    const health = await load('health', { url: `${office.origin}/api/health` });
    const evaluations = await load('evaluations', {
      url: `${office.origin}/api/correlations/${slug}/evaluations`,
      method: 'POST',
      headers: { cookie, 'content-type': 'application/json' },
      body: JSON.stringify(duty),
    });
    return {
      title: 'Over HTTP',
      rows: [
        { what: 'health route', value: health.requests.average, unit: '1/s' },
        { what: 'health route, 99th percentile', value: health.latency.p99, unit: 'ms' },
        { what: `evaluations, kept (${slug})`, value: evaluations.requests.average, unit: '1/s' },
        { what: 'evaluations, 99th percentile', value: evaluations.latency.p99, unit: 'ms' },
        {
          what: 'health : evaluation',
          value: health.requests.average / evaluations.requests.average,
          unit: '×',
        },
      ],
      notes: [
        `${String(connections)} connections for ${String(seconds)} s each, load and server on this machine;`,
        'each evaluation is signed in, computed with all steps and stored with fsync.',
      ],
    };
  } finally {
    await office.stop();
  }
};
