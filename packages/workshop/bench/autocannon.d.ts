/** The part of autocannon's programming interface that the benchmark uses; the package brings no types. */
declare module 'autocannon' {
  interface Options {
    url: string;
    method?: 'GET' | 'POST';
    headers?: Record<string, string>;
    body?: string;
    /** How many connections at once. */
    connections: number;
    /** Seconds. */
    duration: number;
  }
  interface Result {
    requests: { average: number; total: number };
    /** Milliseconds. */
    latency: { p50: number; p99: number };
    errors: number;
    timeouts: number;
    non2xx: number;
  }
  const autocannon: (options: Options) => Promise<Result>;
  export { autocannon as default };
}
